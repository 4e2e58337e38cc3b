import { Temporal } from 'temporal-polyfill';
import { MONTHS, wallOf } from './wall-clock';

/** The day on the club's wall at an instant, `2026-10-15`. */
export function clubDay(instant: Date, zone: string): string {
  return wallOf(instant, zone).toPlainDate().toString();
}

/** The instant at which a day of the club is over: midnight on the wall, whatever the clocks do. */
export function endOfDay(day: string, zone: string): Date {
  const next = Temporal.PlainDate.from(day).add({ days: 1 });
  return new Date(next.toZonedDateTime(zone).epochMilliseconds);
}

/** Whole days from one day to another; negative when the second is earlier. */
export function daysBetween(from: string, to: string): number {
  return Temporal.PlainDate.from(from).until(Temporal.PlainDate.from(to), { largestUnit: 'days' }).days;
}

export function addDays(day: string, days: number): string {
  return Temporal.PlainDate.from(day).add({ days }).toString();
}

/** A day in a sentence, with its year: `9 Dec 2026`. */
export function dateWords(day: string): string {
  const { day: date, month, year } = Temporal.PlainDate.from(day);
  return `${date} ${MONTHS[month - 1]} ${year}`;
}

/** `Sat 31 October 2026`, for letters and problem texts. */
export function writeDay(day: string): string {
  const date = new Date(`${day}T00:00:00Z`);
  const parts = new Intl.DateTimeFormat('en-GB', {
    weekday: 'short',
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  }).formatToParts(date);
  const part = (type: string) => parts.find((one) => one.type === type)?.value ?? '';
  return `${part('weekday')} ${part('day')} ${part('month')} ${part('year')}`;
}
