import { accessLifeMs, refreshDecision, sessionLifeMs, waitBeforeTry } from './auth.rules';

const NOW = new Date('2026-01-15T12:00:00Z');
const SECOND = 1000;
const MINUTE = 60 * SECOND;
const ago = (milliseconds: number): Date => new Date(NOW.getTime() - milliseconds);

describe('an access token', () => {
  it.each([true, false])('leaves most of the session to renew it in (shared device: %s)', (isShared) => {
    expect(accessLifeMs(isShared)).toBeLessThanOrEqual(sessionLifeMs(isShared) / 4);
  });
});

describe('a presented refresh token', () => {
  const decide = (tokenHash: string, secondsSinceRotation: number) =>
    refreshDecision(
      { tokenHash, rotatedAt: ago(secondsSinceRotation * SECOND) },
      { presentedHash: 'presented', successorHash: 'its successor' },
      NOW,
    );

  it.each([
    ['is exchanged when it is the one in force', 'presented', 9999, 'rotate'],
    ['is answered again when it was replaced just now', 'its successor', 60, 'repeat'],
    ['ends the session when it was replaced longer ago', 'its successor', 61, 'end'],
    ['ends the session when its successor is out of force too', 'another', 0, 'end'],
  ])('%s', (_rule, tokenHash, seconds, decision) => {
    expect(decide(tokenHash, seconds)).toBe(decision);
  });
});

describe('the wait before a try', () => {
  const attempt = { email: 'a@larkmoor.example', address: '10.0.0.1' };
  const failed = (count: number, secondsAgo: number, changes: Partial<typeof attempt> = {}) =>
    Array.from({ length: count }, (_, n) => ({
      ...attempt,
      ...changes,
      failedAt: ago((secondsAgo + n) * SECOND),
    }));
  const secondsAfter = (failures: ReturnType<typeof failed>): number =>
    waitBeforeTry(attempt, failures, NOW) / SECOND;

  it.each([
    ['none after four', failed(4, 0), 0],
    ['until the fifth last is a minute old', failed(5, 10), 46],
    ['none for five longer ago than a minute', failed(5, 60), 0],
    ['until the twentieth last is a quarter of an hour old', failed(20, 70), 811],
    ['none for nine at the email from elsewhere', failed(9, 0, { address: '10.0.0.2' }), 0],
    ['a minute at most for ten at the email from elsewhere', failed(10, 0, { address: '10.0.0.2' }), 51],
    [
      'none for any number at the email from elsewhere a minute ago',
      failed(90, 60, { address: '10.0.0.2' }),
      0,
    ],
    [
      'half a minute and more for thirty from the address at others',
      failed(30, 0, { email: 'b@larkmoor.example' }),
      31,
    ],
    [
      'ten minutes at most for a hundred from the address',
      failed(100, 61, { email: 'b@larkmoor.example' }),
      440,
    ],
  ])('lasts: %s', (_rule, failures, seconds) => {
    expect(secondsAfter(failures)).toBe(seconds);
  });

  it('never looks further back than failures are kept', () => {
    expect(secondsAfter(failed(500, (15 * MINUTE) / SECOND))).toBe(0);
  });
});
