const MINUTE = 60_000;

/** A letter is tried for about a day: at once, then after 1, 5, 30 minutes, 3 and 12 hours. */
const DELAYS_MS = [1, 5, 30, 180, 720].map((minutes) => minutes * MINUTE);

/** @returns when to try again after `tries` failures, or undefined to give up. */
export function nextTry(tries: number, now: Date): Date | undefined {
  const delay = DELAYS_MS[tries - 1];
  return delay === undefined ? undefined : new Date(now.getTime() + delay);
}

/** Whether the server said that trying again is of no use: a reply of 5yz, RFC 5321, 4.2.1. */
export function isRefusedForGood(error: unknown): boolean {
  if (typeof error !== 'object' || error === null || !('responseCode' in error)) return false;
  return typeof error.responseCode === 'number' && error.responseCode >= 500;
}
