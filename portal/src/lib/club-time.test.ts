import {
  addDays,
  clubDay,
  daysBetween,
  instantOf,
  minutesBetween,
  monthStart,
  readClock,
  wallOf,
  weekStart,
} from './club-time';

describe('an instant on the club’s wall', () => {
  it.each([
    ['summer time', '2026-10-15T18:30:00Z', '2026-10-15', 19 * 60 + 30],
    ['winter time', '2026-12-03T19:30:00Z', '2026-12-03', 19 * 60 + 30],
    ['already tomorrow there', '2026-07-01T23:15:00Z', '2026-07-02', 15],
    ['with an offset', '2026-10-15T20:30:00+02:00', '2026-10-15', 19 * 60 + 30],
  ])('reads %s', (_case, instant, date, minute) => {
    expect(wallOf(instant)).toEqual({ date, minute });
    expect(instantOf(date, minute)).toBe(new Date(instant).toISOString().replace('.000Z', 'Z'));
  });

  it('keeps 19:30 at 19:30 across the change of clock', () => {
    expect(instantOf('2026-10-22', 1170)).toBe('2026-10-22T18:30:00Z');
    expect(instantOf('2026-10-29', 1170)).toBe('2026-10-29T19:30:00Z');
  });

  // Dates of the changes: UK Summer Time Order 2002, last Sundays of March and October, 01:00 GMT.
  it('moves a time that spring skips forward, and takes the first of two in autumn', () => {
    expect(wallOf(instantOf('2026-03-29', 90))).toEqual({ date: '2026-03-29', minute: 150 });
    expect(instantOf('2026-10-25', 90)).toBe('2026-10-25T00:30:00Z');
  });

  it('counts the true length of a stretch across the change', () => {
    expect(minutesBetween(instantOf('2026-10-25', 0), instantOf('2026-10-26', 0))).toBe(25 * 60);
    expect(minutesBetween(instantOf('2026-03-29', 0), instantOf('2026-03-29', 1440))).toBe(23 * 60);
  });

  it('works in a zone far from ours', () => {
    expect(wallOf('2026-10-15T18:30:00Z', 'Pacific/Auckland')).toEqual({ date: '2026-10-16', minute: 450 });
    expect(instantOf('2026-10-16', 450, 'Pacific/Auckland')).toBe('2026-10-15T18:30:00Z');
  });
});

describe('days', () => {
  it('knows Monday, the month’s first day and distances', () => {
    expect(weekStart('2026-10-18')).toBe('2026-10-12');
    expect(weekStart('2026-10-12')).toBe('2026-10-12');
    expect(monthStart('2026-12-31', 1)).toBe('2027-01-01');
    expect(addDays('2026-02-28', 1)).toBe('2026-03-01');
    expect(daysBetween('2026-10-15', '2026-11-15')).toBe(31);
    expect(clubDay('2026-10-15T23:30:00Z')).toBe('2026-10-16');
  });
});

describe('a typed time of day', () => {
  it.each([
    ['19:30', 1170],
    ['7:05', 425],
    ['1930', 1170],
    ['19.30', 1170],
    ['24:00', 1440],
  ])('reads %s', (text, minute) => expect(readClock(text)).toBe(minute));

  it.each(['', '25:00', '19:60', '24:30', 'half past', '19'])('refuses "%s"', (text) =>
    expect(readClock(text)).toBeUndefined(),
  );
});
