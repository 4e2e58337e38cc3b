import { addDays, instantOf, minutesBetween, readClock, wallOf } from '../../../lib/club-time';
import { clockText } from '../../../lib/club-time-text';
import { isClosedIn, openDayOf, type OpenDay } from '../../../lib/opening-hours';
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

/** A whole calendar day, as a field of dates gives it. */
export const DAY = /^\d{4}-\d{2}-\d{2}$/;
const USUAL_MINUTES = 120;
const LAST_START = 22 * 60;
/** When people come after work. */
const USUAL_START = 19 * 60;

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

/** The two hours that come next, on the hour, while the workshop is open; on a later day when today has no room left. */
export function startingValues(hours: readonly OpenDay[] = [], now: Date = new Date()): BookingValues {
  const { date, minute } = wallOf(now);
  const next = Math.ceil(minute / 60) * 60;
  const today = startOn(date, Math.max(next, openDayOf(hours, date)?.opensMinute ?? 0), hours);
  const times = timesFrom(today ?? laterStart(date, hours));
  return { benchId: '', ...times, groupId: '', checkId: '', instrumentIds: [] };
}

/** Two hours of a day to come: its evening, or from when the workshop opens. */
export const startingTimes = (hours: readonly OpenDay[], day: string) =>
  timesFrom(eveningOf(day, hours) ?? { day, from: USUAL_START });

const timesFrom = ({ day, from }: Start) => ({
  day,
  from: clockText(from),
  to: clockText(from + USUAL_MINUTES),
});

interface Start {
  day: string;
  from: number;
}

function startOn(day: string, from: number, hours: readonly OpenDay[]): Start | undefined {
  const fits = from <= LAST_START && !isClosedIn(hours, day, { from, to: from + USUAL_MINUTES });
  return fits ? { day, from } : undefined;
}

const eveningOf = (day: string, hours: readonly OpenDay[]): Start | undefined =>
  startOn(day, USUAL_START, hours) ?? startOn(day, openDayOf(hours, day)?.opensMinute ?? 0, hours);

/** The first evening of the days ahead on which the workshop is open, or whenever it opens then. */
function laterStart(today: string, hours: readonly OpenDay[]): Start {
  const ahead = Array.from({ length: 7 }, (_, index) => addDays(today, index + 1));
  const starts = ahead.map((day) => eveningOf(day, hours));
  return starts.find((start) => start !== undefined) ?? { day: addDays(today, 1), from: USUAL_START };
}

/** Words for times in which nobody opens the workshop; undefined when it is open, or the times cannot be read. */
export function closedWords(
  { day, from, to }: Pick<BookingValues, 'day' | 'from' | 'to'>,
  hours: readonly OpenDay[],
): string | undefined {
  const [start, end] = [readClock(from), readClock(to)];
  if (!DAY.test(day) || start === undefined || end === undefined || end <= start) return undefined;
  if (!isClosedIn(hours, day, { from: start, to: end })) return undefined;
  return 'The workshop is closed at that time. Agree with an organiser who opens it.';
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
