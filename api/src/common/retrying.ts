import { QueryFailedError } from 'typeorm';

/** Serialization failure, deadlock, lock not granted in time: PostgreSQL asks for another try, nothing is wrong. */
const TRY_AGAIN = new Set(['40001', '40P01', '55P03']);

/** Runs `work`, and once more when the database gave it up for the sake of somebody else's. */
export async function retryingOnce<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (!wantsAnotherTry(error)) throw error;
    return work();
  }
}

/** Whether the database gave the work up although nothing is wrong with it. */
export function wantsAnotherTry(error: unknown): boolean {
  if (!(error instanceof QueryFailedError)) return false;
  const { code } = error.driverError as { code?: unknown };
  return typeof code === 'string' && TRY_AGAIN.has(code);
}
