import { describe, expect, it } from 'vitest';
import { minutesBetween } from '../../../lib/club-time';
import { daysFrom, segmentsOf } from './segments';

// The United Kingdom put clocks forward on 29 March 2026 at 01:00 UTC and puts them back on 25 October 2026 at 01:00 UTC.
describe('where a booking stands in the lanes', () => {
  const week = (monday: string) => daysFrom(monday, 7);

  it('stands at its wall times on its day: summer’s 13:00 UTC is 14:00', () => {
    expect(segmentsOf('2026-10-17T13:00:00Z', '2026-10-17T15:30:00Z', week('2026-10-12'))).toEqual([
      { date: '2026-10-17', top: 840, bottom: 990 },
    ]);
  });

  it('keeps a weekly 19:30 at 19:30 in the weeks on both sides of a change of clock', () => {
    const before = segmentsOf('2026-10-22T18:30:00Z', '2026-10-22T20:30:00Z', week('2026-10-19'));
    const after = segmentsOf('2026-10-29T19:30:00Z', '2026-10-29T21:30:00Z', week('2026-10-26'));
    expect([before[0]?.top, after[0]?.top]).toEqual([1170, 1170]);
  });

  it('is split at midnight, and leaves nothing on a day that begins as it ends', () => {
    expect(segmentsOf('2026-01-16T22:00:00Z', '2026-01-17T01:00:00Z', week('2026-01-12'))).toEqual([
      { date: '2026-01-16', top: 1320, bottom: 1440 },
      { date: '2026-01-17', top: 0, bottom: 60 },
    ]);
    expect(segmentsOf('2026-01-16T22:00:00Z', '2026-01-17T00:00:00Z', week('2026-01-12'))).toHaveLength(1);
  });

  it('shows only the part that lies in the days shown', () => {
    expect(segmentsOf('2026-01-11T22:00:00Z', '2026-01-12T02:00:00Z', week('2026-01-12'))).toEqual([
      { date: '2026-01-12', top: 0, bottom: 120 },
    ]);
    expect(segmentsOf('2026-02-01T10:00:00Z', '2026-02-01T12:00:00Z', week('2026-01-12'))).toEqual([]);
  });

  it('in spring is an hour taller than long across the hour the wall skips', () => {
    const [starts, ends] = ['2026-03-29T00:30:00Z', '2026-03-29T02:00:00Z'];
    expect(segmentsOf(starts, ends, week('2026-03-23'))).toEqual([
      { date: '2026-03-29', top: 30, bottom: 180 },
    ]);
    expect(minutesBetween(starts, ends)).toBe(90);
  });

  it('in autumn is an hour shorter than long across the hour the wall shows twice', () => {
    const [starts, ends] = ['2026-10-24T23:30:00Z', '2026-10-25T02:00:00Z'];
    expect(segmentsOf(starts, ends, week('2026-10-19'))).toEqual([
      { date: '2026-10-25', top: 30, bottom: 120 },
    ]);
    expect(minutesBetween(starts, ends)).toBe(150);
  });

  it('in autumn stays as tall as long when the wall shows it ending before it begins', () => {
    // 01:30 summer time to 01:15 winter time: 45 minutes.
    expect(segmentsOf('2026-10-25T00:30:00Z', '2026-10-25T01:15:00Z', week('2026-10-19'))).toEqual([
      { date: '2026-10-25', top: 90, bottom: 135 },
    ]);
  });

  it('has seven days in the weeks of both changes', () => {
    expect(week('2026-03-23').at(-1)).toBe('2026-03-29');
    expect(week('2026-10-19').at(-1)).toBe('2026-10-25');
  });
});
