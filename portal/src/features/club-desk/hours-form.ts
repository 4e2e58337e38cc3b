import { readClock } from '../../lib/club-time';
import { clockText } from '../../lib/club-time-text';
import type { OpenDay } from '../../lib/opening-hours';

/** The hours as typed, Monday first; both empty on a day that is closed. */
export interface HoursValues {
  days: { from: string; to: string }[];
}

export const WEEKDAYS = [
  'Monday',
  'Tuesday',
  'Wednesday',
  'Thursday',
  'Friday',
  'Saturday',
  'Sunday',
] as const;

export const valuesOf = (week: readonly OpenDay[]): HoursValues => ({
  days: WEEKDAYS.map((_name, index) => {
    const day = week.find(({ weekday }) => weekday === index + 1);
    return day ? { from: clockText(day.opensMinute), to: clockText(day.closesMinute) } : { from: '', to: '' };
  }),
});

const TIME_WORDS = 'A time of day, such as 19:00.';

/** What is wrong with the start of a day, in words for under the field. */
export function fromProblem({ from, to }: HoursValues['days'][number]): string | undefined {
  if (from.trim() === '') return to.trim() === '' ? undefined : 'From when? Leave both empty when closed.';
  return readClock(from) === undefined ? TIME_WORDS : undefined;
}

/** What is wrong with the end of a day beside its start. */
export function toProblem({ from, to }: HoursValues['days'][number]): string | undefined {
  if (to.trim() === '') return from.trim() === '' ? undefined : 'Until when? Leave both empty when closed.';
  const [opens, closes] = [readClock(from), readClock(to)];
  if (closes === undefined) return TIME_WORDS;
  return opens !== undefined && closes <= opens ? 'It closes when it opens, or before.' : undefined;
}

/** The open days of a form without faults. */
export const weekOf = ({ days }: HoursValues): OpenDay[] =>
  days.flatMap(({ from, to }, index) => {
    const [opensMinute, closesMinute] = [readClock(from), readClock(to)];
    if (opensMinute === undefined || closesMinute === undefined) return [];
    return [{ weekday: index + 1, opensMinute, closesMinute }];
  });
