import { LevelsError } from '../src';

/** The error a call throws; fails the test when it throws none, or one that is not ours. */
export function errorOf(call: () => unknown): LevelsError {
  try {
    call();
  } catch (error) {
    if (error instanceof LevelsError) return error;
    throw error;
  }
  throw new Error('expected a LevelsError, nothing was thrown');
}
