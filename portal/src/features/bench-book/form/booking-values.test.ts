import { describe, expect, it } from 'vitest';
import {
  closedWords,
  endProblem,
  readTimes,
  startingValues,
  timesOf,
  wishOf,
  type BookingValues,
} from './booking-values';

const values = (overrides: Partial<BookingValues> = {}): BookingValues => ({
  benchId: 'b3',
  day: '2026-10-17',
  from: '14:00',
  to: '16:30',
  groupId: '',
  checkId: '',
  instrumentIds: ['i31'],
  ...overrides,
});

describe('the times of the form', () => {
  it('are the club’s wall times: 14:00 in October is 13:00 UTC', () => {
    expect(readTimes(values())).toEqual({
      startsAt: '2026-10-17T13:00:00Z',
      endsAt: '2026-10-17T15:30:00Z',
      minutes: 150,
    });
  });

  it('count true minutes over a change of clock', () => {
    expect(readTimes(values({ day: '2026-10-25', from: '00:30', to: '03:00' }))?.minutes).toBe(210);
    expect(readTimes(values({ day: '2026-03-29', from: '00:30', to: '03:00' }))?.minutes).toBe(90);
  });

  it('are read as people type them, and not at all while half typed', () => {
    expect(readTimes(values({ from: '1400', to: '16.30' }))?.minutes).toBe(150);
    expect(readTimes(values({ to: '16:' }))).toBeUndefined();
    expect(readTimes(values({ day: '' }))).toBeUndefined();
  });

  it('say what is wrong with the end', () => {
    expect(endProblem(values({ to: '13:00' }))).toBe('It ends before it has begun. Choose a later end.');
    expect(endProblem(values({ to: '14:00' }))).toBeDefined();
    expect(endProblem(values({ to: 'late' }))).toBe('A time of day, such as 14:00.');
    expect(endProblem(values({ to: '24:00' }))).toBeUndefined();
  });

  it('start with the next full hour, and with tomorrow evening when today is nearly over', () => {
    expect(startingValues([], new Date('2026-10-15T12:12:00Z'))).toMatchObject({
      day: '2026-10-15',
      from: '14:00',
      to: '16:00',
    });
    expect(startingValues([], new Date('2026-10-15T21:30:00Z'))).toMatchObject({
      day: '2026-10-16',
      from: '19:00',
    });
  });

  it('start while the workshop is open: when it opens today, else on the next evening it is', () => {
    // Thursdays and Saturdays; the 15th is a Thursday, its wall an hour ahead of UTC.
    const hours = [
      { weekday: 4, opensMinute: 720, closesMinute: 1320 },
      { weekday: 6, opensMinute: 600, closesMinute: 1200 },
    ];
    const starts = (now: string) => {
      const { day, from } = startingValues(hours, new Date(now));
      return `${day} ${from}`;
    };
    expect(starts('2026-10-15T07:00:00Z')).toBe('2026-10-15 12:00');
    expect(starts('2026-10-15T12:12:00Z')).toBe('2026-10-15 14:00');
    expect(starts('2026-10-15T19:30:00Z')).toBe('2026-10-17 10:00');
    expect(starts('2026-10-17T18:30:00Z')).toBe('2026-10-22 19:00');
  });

  it('say when nobody opens the workshop then, and nothing while they cannot be read', () => {
    const hours = [{ weekday: 6, opensMinute: 600, closesMinute: 1200 }];
    const words = 'The workshop is closed at that time. Agree with an organiser who opens it.';
    expect(closedWords(values(), hours)).toBeUndefined();
    expect(closedWords(values({ to: '20:15' }), hours)).toBe(words);
    expect(closedWords(values({ day: '2026-10-18' }), hours)).toBe(words);
    expect(closedWords(values({ day: '2026-10-18' }), [])).toBeUndefined();
    expect(closedWords(values({ to: '20:' }), hours)).toBeUndefined();
  });

  it('take over a free time that was offered, its midnight as 24:00', () => {
    expect(timesOf({ startsAt: '2026-10-17T15:00:00Z', endsAt: '2026-10-17T17:30:00Z' })).toEqual({
      day: '2026-10-17',
      from: '16:00',
      to: '18:30',
    });
    const late = { startsAt: '2026-01-17T22:00:00Z', endsAt: '2026-01-18T00:00:00Z' };
    expect(timesOf(late)).toMatchObject({ from: '22:00', to: '24:00' });
  });
});

describe('what the form sends', () => {
  it('names the bench and the instruments, and leaves out what was not chosen', () => {
    expect(wishOf(values())).toEqual({
      resourceIds: ['b3', 'i31'],
      startsAt: '2026-10-17T13:00:00Z',
      endsAt: '2026-10-17T15:30:00Z',
    });
    expect(wishOf(values({ groupId: 'g', checkId: 'c' }))).toMatchObject({ groupId: 'g', checkId: 'c' });
  });

  it('is nothing while nothing is chosen or a time is missing', () => {
    expect(wishOf(values({ benchId: '', instrumentIds: [] }))).toBeUndefined();
    expect(wishOf(values({ to: '' }))).toBeUndefined();
    expect(wishOf(values({ to: '14:00' }))).toBeUndefined();
  });
});
