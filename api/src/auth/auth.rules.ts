const SECOND = 1000;
const MINUTE = 60 * SECOND;
const DAY = 24 * 60 * MINUTE;

/**
 * Two tabs that refresh in the same moment send the same token, and a device whose answer was lost on the way sends it
 * again; neither is theft.
 */
const ROTATION_GRACE_MS = MINUTE;

const OWN_DEVICE = { sessionMs: 30 * DAY, accessMs: 30 * MINUTE };
/** The access token is much the shorter: only a refresh makes the session longer, and only its end brings one on. */
const SHARED_DEVICE = { sessionMs: 10 * MINUTE, accessMs: 2 * MINUTE };

/** How long a session runs if nobody touches it again. */
export function sessionLifeMs(isSharedDevice: boolean): number {
  return (isSharedDevice ? SHARED_DEVICE : OWN_DEVICE).sessionMs;
}

export function sessionExpiry(now: Date, isSharedDevice: boolean): Date {
  return new Date(now.getTime() + sessionLifeMs(isSharedDevice));
}

/** How long an access token is good. Every request asks the database for the session anyway. */
export function accessLifeMs(isSharedDevice: boolean): number {
  return (isSharedDevice ? SHARED_DEVICE : OWN_DEVICE).accessMs;
}

interface Limit {
  failures: number;
  withinMs: number;
}

/**
 * How many wrong tries are too many. By address alone, so that one device cannot go through the members; by email alone,
 * so that many devices cannot go through one member's passwords. What a stranger can bring on somebody else is short: a
 * minute by the email, ten where they share an address.
 */
const LIMITS: Record<'both' | 'email' | 'address', readonly Limit[]> = {
  both: [
    { failures: 5, withinMs: MINUTE },
    { failures: 20, withinMs: 15 * MINUTE },
  ],
  email: [{ failures: 10, withinMs: MINUTE }],
  address: [
    { failures: 30, withinMs: MINUTE },
    { failures: 100, withinMs: 10 * MINUTE },
  ],
};

/** No limit looks further back. */
export const FAILURES_KEPT_MS = 15 * MINUTE;

export interface SignInTry {
  email: string;
  address: string;
}

/**
 * How long whoever is about to try must wait.
 *
 * @param failures - wrong tries with the same email or from the same address, in any order.
 * @returns milliseconds from `now`; 0 when the try may be made at once.
 */
export function waitBeforeTry(
  { email, address }: SignInTry,
  failures: readonly (SignInTry & { failedAt: Date })[],
  now: Date,
): number {
  const withEmail = failures.filter((one) => one.email === email);
  const fromAddress = failures.filter((one) => one.address === address);
  const both = withEmail.filter((one) => one.address === address);
  return Math.max(
    waitUnder(LIMITS.both, both, now),
    waitUnder(LIMITS.email, withEmail, now),
    waitUnder(LIMITS.address, fromAddress, now),
  );
}

function waitUnder(limits: readonly Limit[], failures: readonly { failedAt: Date }[], now: Date): number {
  const times = failures.map(({ failedAt }) => failedAt.getTime()).sort((a, b) => b - a);
  const waits = limits.map(({ failures: allowed, withinMs }) => {
    const oldestThatCounts = times[allowed - 1];
    return oldestThatCounts === undefined ? 0 : oldestThatCounts + withinMs - now.getTime();
  });
  return Math.max(0, ...waits);
}

export type RefreshDecision = 'rotate' | 'repeat' | 'end';

/**
 * What a presented refresh token means: the one in force is exchanged; the one just replaced is answered with its
 * successor once more, as long as that has not been exchanged itself; any other has been copied and ends the session.
 */
export function refreshDecision(
  session: { tokenHash: string; rotatedAt: Date },
  { presentedHash, successorHash }: { presentedHash: string; successorHash: string },
  now: Date,
): RefreshDecision {
  if (session.tokenHash === presentedHash) return 'rotate';
  const isFresh = now.getTime() - session.rotatedAt.getTime() <= ROTATION_GRACE_MS;
  return session.tokenHash === successorHash && isFresh ? 'repeat' : 'end';
}
