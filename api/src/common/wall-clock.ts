import { Temporal } from 'temporal-polyfill';

const DAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

const two = (value: number): string => String(value).padStart(2, '0');

function onTheWall(instant: Date, zone: string): Temporal.ZonedDateTime {
  return Temporal.Instant.fromEpochMilliseconds(instant.getTime()).toZonedDateTimeISO(zone);
}

/** The day the club's wall shows at an instant, `2026-10-15`. */
export function dayAt(instant: Date, zone: string): string {
  return onTheWall(instant, zone).toPlainDate().toString();
}

/** The instant at which a day of the club is over: midnight on the wall, whatever the clocks do. */
export function endOfDay(day: string, zone: string): Date {
  const next = Temporal.PlainDate.from(day).add({ days: 1 });
  return new Date(next.toZonedDateTime(zone).epochMilliseconds);
}

/** A day so many days later. */
export function daysLater(day: string, days: number): string {
  return Temporal.PlainDate.from(day).add({ days }).toString();
}

/** A day in a sentence, with its year: `9 Dec 2026`. */
export function dateWords(day: string): string {
  const { day: date, month, year } = Temporal.PlainDate.from(day);
  return `${date} ${MONTHS[month - 1]} ${year}`;
}

/** A stretch of time as the wall shows it: `Thu 15 Oct, 14:00 to 16:30`; names the second day when it is another. */
export function spanWords({ startsAt, endsAt }: { startsAt: Date; endsAt: Date }, zone: string): string {
  const [from, to] = [onTheWall(startsAt, zone), onTheWall(endsAt, zone)];
  const sameDay = from.toPlainDate().equals(to.toPlainDate());
  return `${dayWords(from)}, ${timeWords(from)} to ${sameDay ? '' : `${dayWords(to)}, `}${timeWords(to)}`;
}

function dayWords(at: Temporal.ZonedDateTime): string {
  return `${DAYS[at.dayOfWeek - 1]} ${at.day} ${MONTHS[at.month - 1]}`;
}

function timeWords(at: Temporal.ZonedDateTime): string {
  return `${two(at.hour)}:${two(at.minute)}`;
}
