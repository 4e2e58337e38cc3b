import { Temporal } from 'temporal-polyfill';

/** A day of the week on which the workshop is open, by the club's wall: minutes since midnight, up to 1440. */
export interface OpenDay {
  /** ISO 8601: Monday is 1, Sunday 7. */
  weekday: number;
  opensMinute: number;
  closesMinute: number;
}

interface Stretch {
  from: number;
  to: number;
}

const DAY_MINUTES = 24 * 60;

/** The hours of a calendar day, or undefined when it is closed. */
export function openDayOf(week: readonly OpenDay[], date: string): OpenDay | undefined {
  const { dayOfWeek } = Temporal.PlainDate.from(date);
  return week.find(({ weekday }) => weekday === dayOfWeek);
}

/**
 * When the workshop is closed on a calendar day, in minutes since its midnight.
 *
 * | week | answer |
 * |---|---|
 * | empty: the club gives no hours | none |
 * | without that day | the whole day |
 */
export function closedStretches(week: readonly OpenDay[], date: string): Stretch[] {
  if (week.length === 0) return [];
  const day = openDayOf(week, date);
  if (!day) return [{ from: 0, to: DAY_MINUTES }];
  const around = [
    { from: 0, to: day.opensMinute },
    { from: day.closesMinute, to: DAY_MINUTES },
  ];
  return around.filter(({ from, to }) => from < to);
}

/** Whether the workshop is closed at any time between two minutes of a day. */
export const isClosedIn = (week: readonly OpenDay[], date: string, { from, to }: Stretch): boolean =>
  closedStretches(week, date).some((closed) => from < closed.to && to > closed.from);

/** Whether nobody opens the workshop on a day at all. */
export const closedAllDay = (week: readonly OpenDay[], date: string): boolean =>
  week.length > 0 && openDayOf(week, date) === undefined;
