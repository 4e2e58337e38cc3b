import { isRefusedForGood, nextTry } from './mail.rules';

const NOW = new Date('2026-01-15T12:00:00Z');

describe('trying a letter again', () => {
  it.each([
    [1, 1],
    [2, 5],
    [3, 30],
    [4, 180],
    [5, 720],
  ])('waits after failure %i for %i minutes', (tries, minutes) => {
    expect(nextTry(tries, NOW)).toEqual(new Date(NOW.getTime() + minutes * 60_000));
  });

  it('gives up after the sixth', () => {
    expect(nextTry(6, NOW)).toBeUndefined();
  });

  // RFC 5321, 4.2.1: a reply of 4yz may succeed when tried again, one of 5yz will not.
  it.each([
    [421, false],
    [452, false],
    [550, true],
    [552, true],
    [undefined, false],
  ])('takes reply %s for good: %s', (code, isForGood) => {
    expect(isRefusedForGood({ responseCode: code })).toBe(isForGood);
    expect(isRefusedForGood(new Error('no answer'))).toBe(false);
  });
});
