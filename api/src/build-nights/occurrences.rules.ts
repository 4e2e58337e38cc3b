import { RRule } from 'rrule';
import { Temporal } from 'temporal-polyfill';
import { instantOf, type WallTime } from '../common/wall-clock';

export interface Recurrence {
  /** DTSTART, on the club's wall. */
  start: WallTime;
  /** The value of an RRULE, without the name. */
  rule: string;
  zone: string;
}

/**
 * When a rule falls, as wall times in the order of time: 19:30 stays 19:30 whatever the clocks do. COUNT counts before
 * anything is left out, and UNTIL is compared as an instant.
 *
 * @param isLeftOut - EXDATE.
 * @param limit - no more than so many; a rule without an end stops there.
 * @see RFC 5545, 3.8.5.3, "Recurrence Rule"
 */
export function occurrencesOf(
  { start, rule, zone }: Recurrence,
  isLeftOut: (wall: WallTime) => boolean,
  limit: number,
): WallTime[] {
  const { until, ...repeats } = RRule.parseString(rule);
  const kept: WallTime[] = [];
  // The library counts in days and hours without any zone; it is given the wall's time as if it were UTC.
  new RRule({ ...repeats, dtstart: floating(start) }).all((date) => {
    const wall = fromFloating(date);
    if (until && instantOf(wall, zone) > until) return false;
    if (!isLeftOut(wall)) kept.push(wall);
    return kept.length < limit;
  });
  return kept;
}

const floating = (wall: WallTime): Date => new Date(wall.toZonedDateTime('UTC').epochMilliseconds);

const fromFloating = (date: Date): WallTime => Temporal.PlainDateTime.from(date.toISOString().slice(0, -1));
