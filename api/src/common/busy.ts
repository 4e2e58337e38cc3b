import { wantsAnotherTry } from './retrying';

/** What the pool says when nobody gives a connection back in time; its errors have neither a code nor a class. */
const NO_CONNECTION = [
  'timeout exceeded when trying to connect',
  'Connection terminated due to connection timeout',
];

/** Whether a request failed for nothing but too many others: the same one succeeds a moment later. */
export function isOutOfTurn(error: unknown): boolean {
  if (wantsAnotherTry(error)) return true;
  return error instanceof Error && NO_CONNECTION.includes(error.message);
}
