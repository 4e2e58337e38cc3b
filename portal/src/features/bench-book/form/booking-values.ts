import { addDays, clubDay, instantOf, minutesBetween, readClock, wallOf } from '../../../lib/club-time';
import { clockText } from '../../../lib/club-time-text';
import type { BookingWish, FreeTime } from '../api/bench-book';

/** What the form holds, as typed. */
export interface BookingValues {
  /** Empty for an instrument without a bench. */
  benchId: string;
  day: string;
  from: string;
  to: string;
  groupId: string;
  checkId: string;
  instrumentIds: string[];
}

export interface TypedTimes {
  startsAt: string;
  endsAt: string;
  minutes: number;
}

const DAY = /^\d{4}-\d{2}-\d{2}$/;
const USUAL_MINUTES = 120;
const LAST_START = 22 * 60;

/** The typed day and times as instants, or undefined while they cannot be read. */
export function readTimes({
  day,
  from,
  to,
}: Pick<BookingValues, 'day' | 'from' | 'to'>): TypedTimes | undefined {
  const [start, end] = [readClock(from), readClock(to)];
  if (!DAY.test(day) || start === undefined || end === undefined) return undefined;
  const [startsAt, endsAt] = [instantOf(day, start), instantOf(day, end)];
  return { startsAt, endsAt, minutes: minutesBetween(startsAt, endsAt) };
}

/** What is wrong with a typed time of day, in words for under the field. */
export const clockProblem = (text: string): string | undefined =>
  readClock(text) === undefined ? 'A time of day, such as 14:00.' : undefined;

/** What is wrong with a time that the wall never shows, because the clocks go forward over it. */
export function skippedProblem(day: string, text: string): string | undefined {
  const minute = readClock(text);
  if (!DAY.test(day) || minute === undefined || minute === 24 * 60) return undefined;
  const wall = wallOf(instantOf(day, minute));
  if (wall.minute === minute && wall.date === day) return undefined;
  return `The clocks go forward over ${clockText(minute)}. Choose another time.`;
}

/** What is wrong with the end beside the start. */
export function endProblem({ day, from, to }: BookingValues): string | undefined {
  const times = readTimes({ day, from, to });
  if (!times) return clockProblem(to);
  const skipped = skippedProblem(day, to);
  if (skipped) return skipped;
  if (times.minutes > 0) return undefined;
  return times.minutes === 0
    ? 'It ends as it begins. Choose a later end.'
    : 'It ends before it has begun. Choose a later end.';
}

/** The two hours that come next, on the hour; tomorrow's when today is nearly over. */
export function startingValues(now: Date = new Date()): BookingValues {
  const { date, minute } = wallOf(now);
  const next = Math.ceil(minute / 60) * 60;
  const isLate = next > LAST_START;
  const day = isLate ? addDays(clubDay(now), 1) : date;
  const from = isLate ? 19 * 60 : next;
  const times = { from: clockText(from), to: clockText(from + USUAL_MINUTES) };
  return { benchId: '', day, ...times, groupId: '', checkId: '', instrumentIds: [] };
}

/** What is sent, or undefined while something is missing or cannot be read. */
export function wishOf(values: BookingValues): BookingWish | undefined {
  const times = readTimes(values);
  const resourceIds = [values.benchId, ...values.instrumentIds].filter((id) => id !== '');
  if (!times || times.minutes <= 0 || resourceIds.length === 0) return undefined;
  return {
    resourceIds,
    startsAt: times.startsAt,
    endsAt: times.endsAt,
    ...(values.groupId && { groupId: values.groupId }),
    ...(values.checkId && { checkId: values.checkId }),
  };
}

/** A free time as the form writes it. */
export function timesOf({ startsAt, endsAt }: FreeTime): Pick<BookingValues, 'day' | 'from' | 'to'> {
  const [from, to] = [wallOf(startsAt), wallOf(endsAt)];
  const end = to.date === from.date ? to.minute : 24 * 60;
  return { day: from.date, from: clockText(from.minute), to: clockText(end) };
}
