import { openDayOf, type OpenDay } from '../../../lib/opening-hours';

/** From which minute of a day to which the lanes are drawn, on whole hours. */
export interface Extent {
  from: number;
  to: number;
}

const WHOLE_DAY: Extent = { from: 0, to: 24 * 60 };
const [USUAL_FIRST, EARLIEST] = [12 * 60, 6 * 60];

/**
 * The hours a week is drawn with: from its earliest opening to its latest closing, and further where something stands
 * outside. The whole day when the club gives no hours or is closed all week.
 */
export function extentOf(
  dates: readonly string[],
  week: readonly OpenDay[],
  standing: readonly Extent[],
): Extent {
  const open = dates.flatMap((date) => openDayOf(week, date) ?? []);
  if (open.length === 0) return WHOLE_DAY;
  const from = Math.min(...open.map(({ opensMinute }) => opensMinute), ...standing.map((one) => one.from));
  const to = Math.max(...open.map(({ closesMinute }) => closesMinute), ...standing.map((one) => one.to));
  return { from: Math.floor(from / 60) * 60, to: Math.ceil(to / 60) * 60 };
}

/** What is at the top when the lanes open: noon, or earlier when something stands before it. */
export function firstSeen({ from }: Extent, standing: readonly Extent[]): number {
  const first = Math.min(USUAL_FIRST, ...standing.map((one) => one.from));
  return Math.max(from, EARLIEST, Math.floor(first / 60) * 60);
}
