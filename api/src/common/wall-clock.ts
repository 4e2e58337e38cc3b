import { Temporal } from 'temporal-polyfill';

export type WallTime = Temporal.PlainDateTime;

const DAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
export const MONTHS = [
  ...['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun'],
  ...['Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'],
];

/** What the club's wall shows at an instant. */
export function wallOf(instant: Date, zone: string): WallTime {
  return Temporal.Instant.fromEpochMilliseconds(instant.getTime()).toZonedDateTimeISO(zone).toPlainDateTime();
}

/**
 * The instant at which the wall shows this time.
 *
 * | wall time | answer |
 * |---|---|
 * | skipped in spring | read with the offset before the change, so one hour later on the wall |
 * | twice in autumn | the first of the two |
 *
 * @see RFC 5545, 3.3.5, "DATE-TIME", form 3
 */
export function instantOf(wall: WallTime, zone: string): Date {
  return new Date(wall.toZonedDateTime(zone, { disambiguation: 'compatible' }).epochMilliseconds);
}

/** `19:30` */
export function timeWords(instant: Date, zone: string): string {
  return clock(wallOf(instant, zone));
}

/** `Thu 22 Oct` */
export function dayWords(instant: Date, zone: string): string {
  return day(wallOf(instant, zone));
}

interface Span {
  startsAt: Date;
  endsAt: Date;
}

/** The hours of a day that is named already: `19:00 to 22:00`; names the second day when it is another. */
export function hoursWords({ startsAt, endsAt }: Span, zone: string): string {
  const [from, to] = [wallOf(startsAt, zone), wallOf(endsAt, zone)];
  const isSameDay = from.toPlainDate().equals(to.toPlainDate());
  return `${clock(from)} to ${isSameDay ? '' : `${day(to)}, `}${clock(to)}`;
}

/** A stretch of time: `Thu 15 Oct, 14:00 to 16:30`, or `Thu 15 Oct, 22:00 to Fri 16 Oct, 00:30`. */
export function spanWords(span: Span, zone: string): string {
  return `${dayWords(span.startsAt, zone)}, ${hoursWords(span, zone)}`;
}

function clock(wall: WallTime): string {
  return wall.toPlainTime().toString({ smallestUnit: 'minute' });
}

function day(wall: WallTime): string {
  return `${DAYS[wall.dayOfWeek - 1]} ${wall.day} ${MONTHS[wall.month - 1]}`;
}
