import type { Role } from '../common/actor';
import { cancellation, listProblems, mayCancel, searchWindow, timeProblems } from './bookings.rules';

const NOW = new Date('2026-10-15T12:12:30Z');
const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const span = (startInHours: number, hours: number) => ({
  startsAt: new Date(NOW.getTime() + startInHours * HOUR),
  endsAt: new Date(NOW.getTime() + (startInHours + hours) * HOUR),
});
const fields = (startInHours: number, hours: number) =>
  timeProblems(span(startInHours, hours), NOW).map(({ pointer }) => pointer);

describe('the times of a session', () => {
  it('takes an hour from now on, up to 12 hours and 180 days ahead', () => {
    expect(fields(0, 1)).toEqual([]);
    expect(fields(1, 12)).toEqual([]);
    expect(fields(180 * 24, 1)).toEqual([]);
  });

  it('takes the minute that is running, because a form knows no seconds', () => {
    const startsAt = new Date('2026-10-15T12:12:00Z');
    expect(timeProblems({ startsAt, endsAt: new Date('2026-10-15T13:00:00Z') }, NOW)).toEqual([]);
  });

  it('refuses times in the past', () => {
    expect(fields(-1, 2)).toEqual(['#/startsAt']);
  });

  it('refuses an end on the start or before it', () => {
    expect(fields(2, 0)).toEqual(['#/endsAt']);
    expect(fields(2, -1)).toEqual(['#/endsAt']);
  });

  it('refuses more than 12 hours', () => {
    expect(fields(1, 12.01)).toEqual(['#/endsAt']);
  });

  it('refuses a start more than 180 days ahead', () => {
    expect(fields(180 * 24 + 1, 1)).toEqual(['#/startsAt']);
  });

  it('names everything that is wrong at once', () => {
    expect(fields(-5, -1)).toEqual(['#/startsAt', '#/endsAt']);
  });
});

describe('the stretch of a list', () => {
  const list = (from: string, to: string) =>
    listProblems({ startsAt: new Date(from), endsAt: new Date(to) }).map(({ pointer }) => pointer);

  it('is at most 62 days, runs forward and lies in years that have a book', () => {
    expect(list('2026-10-01T00:00:00Z', '2026-12-02T00:00:00Z')).toEqual([]);
    expect(list('2026-10-01T00:00:00Z', '2026-12-02T00:00:01Z')).toEqual(['#/to']);
    expect(list('2026-10-02T00:00:00Z', '2026-10-02T00:00:00Z')).toEqual(['#/to']);
    expect(list('0001-01-01T00:00:00Z', '0001-01-02T00:00:00Z')).toEqual(['#/from']);
  });
});

describe('where free times are looked for', () => {
  it('reaches 14 days to both sides, but never into the past', () => {
    const window = searchWindow(span(100 * 24, 2), NOW, undefined);
    expect(window?.startsAt).toEqual(new Date(NOW.getTime() + 86 * DAY));
    expect(window?.endsAt).toEqual(new Date(NOW.getTime() + 114 * DAY + 2 * HOUR));
    expect(searchWindow(span(2, 1), NOW, undefined)?.startsAt).toEqual(new Date('2026-10-15T12:15:00Z'));
  });

  it('offers no start beyond the 180 days', () => {
    const window = searchWindow(span(179 * 24, 2), NOW, undefined);
    expect(window?.endsAt).toEqual(new Date(NOW.getTime() + 180 * DAY + 2 * HOUR));
  });

  it('ends with the calibration or clearance, and closes when the length no longer fits', () => {
    const until = new Date(NOW.getTime() + DAY);
    expect(searchWindow(span(2, 1), NOW, until)?.endsAt).toEqual(until);
    expect(searchWindow(span(2, 12), NOW, new Date(NOW.getTime() + 6 * HOUR))).toBeUndefined();
  });
});

describe('cancelling', () => {
  const actor = (...roles: Role[]) => ({ personId: 'me', name: 'Me', roles });

  it('is the person’s own, a mentor’s, a steward’s and an organiser’s', () => {
    expect(mayCancel({ kind: 'session', personId: 'me' }, actor('member'))).toBe(true);
    const others = { kind: 'session', personId: 'other' };
    expect(mayCancel(others, actor('member', 'treasurer'))).toBe(false);
    for (const role of ['mentor', 'steward', 'organiser'] as const)
      expect(mayCancel(others, actor('member', role))).toBe(true);
  });

  it('leaves what is held for a build night to the night', () => {
    expect(mayCancel({ kind: 'build night', personId: 'me' }, actor('member', 'mentor'))).toBe(false);
  });

  it('gives back all of it, the rest of it, or nothing any more', () => {
    expect(cancellation(span(0, 1), NOW)).toBe('whole');
    expect(cancellation(span(-1, 2), NOW)).toBe('rest');
    expect(cancellation(span(-2, 2), NOW)).toBe('over');
  });
});
