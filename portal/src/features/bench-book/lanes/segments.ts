import { addDays, minutesBetween, wallOf } from '../../../lib/club-time';

const DAY_MINUTES = 24 * 60;
/** So that a block can be seen and pressed, however short. */
const LEAST_MINUTES = 15;

/** The part of a stretch of time that lies on one day, by the club's wall clock: minutes since its midnight. */
export interface Segment {
  date: string;
  top: number;
  bottom: number;
}

/** The seven days of a week, or however many, from a day on. */
export const daysFrom = (date: string, count: number): string[] =>
  Array.from({ length: count }, (_, index) => addDays(date, index));

/**
 * Where a stretch of time stands in the lanes, day by day.
 *
 * | case | answer |
 * |---|---|
 * | ends at midnight | nothing on the day that begins there |
 * | over the hour skipped in spring | from wall time to wall time: an hour taller than it is long |
 * | over the hour repeated in autumn | from wall time to wall time; when the wall shows it ending before it begins, as tall as it is long |
 */
export function segmentsOf(startsAt: string, endsAt: string, dates: readonly string[]): Segment[] {
  const [from, to] = [wallOf(startsAt), wallOf(endsAt)];
  return dates.flatMap((date) => {
    if (date < from.date || date > to.date) return [];
    const top = date === from.date ? from.minute : 0;
    const wallBottom = date === to.date ? to.minute : DAY_MINUTES;
    if (wallBottom === 0) return [];
    const runsBackward = from.date === to.date && wallBottom <= top;
    const bottom = runsBackward ? top + minutesBetween(startsAt, endsAt) : wallBottom;
    return [{ date, top, bottom: Math.min(DAY_MINUTES, Math.max(bottom, top + LEAST_MINUTES)) }];
  });
}
