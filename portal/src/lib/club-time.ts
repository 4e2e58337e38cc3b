import { Temporal } from 'temporal-polyfill';
import { clubZone } from './club-zone';

/** An ISO 8601 instant with offset or Z, or a `Date`. */
export type Instant = string | Date;

/** What the club's wall shows: a day `2026-10-15` and minutes since that day's midnight, 0 to 1439. */
export interface Wall {
  date: string;
  minute: number;
}

const MINUTES_IN_HOUR = 60;

export function zoned(instant: Instant, zone = clubZone()): Temporal.ZonedDateTime {
  const iso = typeof instant === 'string' ? instant : instant.toISOString();
  return Temporal.Instant.from(iso).toZonedDateTimeISO(zone);
}

/**
 * The wall-clock day and minute of an instant.
 * @example wallOf('2026-10-15T18:30:00Z') //=> { date: '2026-10-15', minute: 1170 }
 */
export function wallOf(instant: Instant, zone = clubZone()): Wall {
  const at = zoned(instant, zone);
  return { date: at.toPlainDate().toString(), minute: at.hour * MINUTES_IN_HOUR + at.minute };
}

/**
 * The instant at which the wall shows this day and minute, as an ISO string in UTC.
 *
 * | wall time | answer |
 * |---|---|
 * | skipped in spring | as if the clock had not been put forward: 01:30 becomes 02:30 |
 * | twice in autumn | the first of the two |
 * | minute 1440 | midnight at the end of the day |
 */
export function instantOf(date: string, minute: number, zone = clubZone()): string {
  const wall = Temporal.PlainDate.from(date).toPlainDateTime().add({ minutes: minute });
  return wall.toZonedDateTime(zone, { disambiguation: 'compatible' }).toInstant().toString();
}

/** True length in minutes between two instants, whatever the clocks did meanwhile. */
export function minutesBetween(from: Instant, to: Instant): number {
  return (zoned(to).epochMilliseconds - zoned(from).epochMilliseconds) / 60_000;
}

/** The club's day of an instant (now, unless told), `2026-10-15`. */
export const clubDay = (instant: Instant = new Date(), zone = clubZone()): string =>
  wallOf(instant, zone).date;

/** A day so many days later, or earlier when negative. */
export const addDays = (date: string, days: number): string =>
  Temporal.PlainDate.from(date).add({ days }).toString();

/** First day of the month so many months away: `addMonths('2026-10-15', 1)` is `2026-11-01`. */
export const monthStart = (date: string, months = 0): string =>
  Temporal.PlainDate.from(date).with({ day: 1 }).add({ months }).toString();

/** Monday of the week a day lies in. */
export function weekStart(date: string): string {
  const day = Temporal.PlainDate.from(date);
  return day.subtract({ days: day.dayOfWeek - 1 }).toString();
}

/** Whole days from one day to another; negative when the second is earlier. */
export const daysBetween = (from: string, to: string): number =>
  Temporal.PlainDate.from(from).until(Temporal.PlainDate.from(to), { largestUnit: 'days' }).days;

/**
 * Minutes of a typed time of day.
 * @returns 0 to 1440, or undefined when it is not a time.
 * @example readClock('19:30') //=> 1170; also '19.30', '1930' and '7:05'
 */
export function readClock(text: string): number | undefined {
  const parts = /^(\d{1,2})[:.]?(\d{2})$/.exec(text.trim());
  if (!parts) return undefined;
  const [hour, minute] = [Number(parts[1]), Number(parts[2])];
  const total = hour * MINUTES_IN_HOUR + minute;
  return minute < MINUTES_IN_HOUR && total <= 24 * MINUTES_IN_HOUR ? total : undefined;
}

/** Whether the clocks change on a day of the club, and which way. */
export function clockChange(date: string, zone = clubZone()): 'forward' | 'back' | undefined {
  const hours = Temporal.PlainDate.from(date).toZonedDateTime(zone).hoursInDay;
  if (hours === 24) return undefined;
  return hours < 24 ? 'forward' : 'back';
}
