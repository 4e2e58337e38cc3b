import { QueryFailedError } from 'typeorm';

/** The name of the database rule an error broke, if it broke one. Names are ours, so they are safe to match. */
export function constraintOf(error: unknown): string | undefined {
  if (!(error instanceof QueryFailedError)) return undefined;
  const { constraint } = error.driverError as { constraint?: unknown };
  return typeof constraint === 'string' ? constraint : undefined;
}

/**
 * Runs `work` and turns the named broken rules into refusals. Stands outside the transaction, because after an error
 * a transaction takes nothing but a rollback.
 */
export async function translatingConstraints<T>(
  work: () => Promise<T>,
  refusals: Record<string, () => Error | Promise<Error>>,
): Promise<T> {
  try {
    return await work();
  } catch (error) {
    const refusal = refusals[constraintOf(error) ?? ''];
    if (!refusal) throw error;
    throw await refusal();
  }
}
