import { describe, expect, it } from 'vitest';
import { closedAllDay, closedStretches, isClosedIn } from './opening-hours';

/** Saturdays from ten to eight. */
const WEEK = [{ weekday: 6, opensMinute: 600, closesMinute: 1200 }];
const [SATURDAY, SUNDAY] = ['2026-10-17', '2026-10-18'];

describe('the workshop', () => {
  it('is closed before it opens, after it closes, and all of a day without hours', () => {
    expect(closedStretches(WEEK, SATURDAY)).toEqual([
      { from: 0, to: 600 },
      { from: 1200, to: 1440 },
    ]);
    expect(closedStretches(WEEK, SUNDAY)).toEqual([{ from: 0, to: 1440 }]);
  });

  it('is never said to be closed when the club gives no hours, nor on a day open from midnight to midnight', () => {
    expect(closedStretches([], SUNDAY)).toEqual([]);
    expect(closedStretches([{ weekday: 7, opensMinute: 0, closesMinute: 1440 }], SUNDAY)).toEqual([]);
  });

  it('is closed all day where other days have hours and this one has none', () => {
    expect([closedAllDay(WEEK, SATURDAY), closedAllDay(WEEK, SUNDAY)]).toEqual([false, true]);
    expect(closedAllDay([], SUNDAY)).toBe(false);
  });

  it('is open for a stretch that ends as it closes, and closed for one a minute longer', () => {
    expect(isClosedIn(WEEK, SATURDAY, { from: 600, to: 1200 })).toBe(false);
    expect(isClosedIn(WEEK, SATURDAY, { from: 600, to: 1201 })).toBe(true);
    expect(isClosedIn(WEEK, SATURDAY, { from: 599, to: 700 })).toBe(true);
    expect(isClosedIn(WEEK, SUNDAY, { from: 700, to: 701 })).toBe(true);
  });
});
