import { Temporal } from 'temporal-polyfill';

export type WallTime = Temporal.PlainDateTime;

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

/** The club's day of an instant, `2026-10-22`. */
export function dayOf(instant: Date, zone: string): string {
  return wallOf(instant, zone).toPlainDate().toString();
}
