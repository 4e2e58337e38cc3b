const SECOND = 1000;
const MINUTE = 60 * SECOND;
const DAY = 24 * 60 * MINUTE;

/** Short enough to forget a role soon; every request asks the database for the session anyway. */
export const ACCESS_LIFE_MS = 30 * MINUTE;
/** Two tabs that refresh in the same moment send the same token; that is not theft. */
export const ROTATION_GRACE_MS = 20 * SECOND;

const OWN_DEVICE_LIFE_MS = 30 * DAY;
const SHARED_DEVICE_LIFE_MS = 10 * MINUTE;

/** How long a session runs if nobody touches it again. */
export function sessionLifeMs(isSharedDevice: boolean): number {
  return isSharedDevice ? SHARED_DEVICE_LIFE_MS : OWN_DEVICE_LIFE_MS;
}

export function sessionExpiry(now: Date, isSharedDevice: boolean): Date {
  return new Date(now.getTime() + sessionLifeMs(isSharedDevice));
}

/** An access token never outlives the session's own limit. */
export function accessLifeMs(isSharedDevice: boolean): number {
  return isSharedDevice ? Math.min(ACCESS_LIFE_MS, SHARED_DEVICE_LIFE_MS) : ACCESS_LIFE_MS;
}

const TRIES = [
  { failures: 5, withinMs: MINUTE },
  { failures: 20, withinMs: 60 * MINUTE },
] as const;

export const FAILURES_KEPT_MS = 60 * MINUTE;

/**
 * How long somebody who guessed wrong must wait: five tries a minute, twenty an hour.
 *
 * @param failures - instants of the wrong tries, in any order.
 * @returns milliseconds from `now`; 0 when the next try may come at once.
 */
export function waitBeforeNextTry(failures: readonly Date[], now: Date): number {
  const times = failures.map((failure) => failure.getTime()).sort((a, b) => b - a);
  const waits = TRIES.map(({ failures: allowed, withinMs }) => {
    const oldestThatCounts = times[allowed - 1];
    return oldestThatCounts === undefined ? 0 : oldestThatCounts + withinMs - now.getTime();
  });
  return Math.max(0, ...waits);
}

export type RefreshDecision = 'rotate' | 'keep' | 'end';

/**
 * What a presented refresh token means: the one in force is exchanged, the one just replaced is let pass for a
 * moment, an older one has been copied and ends the session.
 */
export function refreshDecision(
  session: { tokenHash: string; previousTokenHash: string | null; rotatedAt: Date },
  presentedHash: string,
  now: Date,
): RefreshDecision {
  if (session.tokenHash === presentedHash) return 'rotate';
  const isFresh = now.getTime() - session.rotatedAt.getTime() <= ROTATION_GRACE_MS;
  return session.previousTokenHash === presentedHash && isFresh ? 'keep' : 'end';
}
