import { minutesBetween } from '../../../lib/club-time';
import type { Booking } from '../api/bench-book';
import type { Lane } from './lane';
import { segmentsOf, type Segment } from './segments';

/** A booking as drawn on one day: over one lane, or over several that stand beside each other. */
export interface Block extends Segment {
  key: string;
  booking: Booking;
  lane: number;
  lanes: number;
  /** Its true length, whatever the clocks did meanwhile. */
  minutes: number;
}

/** What stands on each day. A build night over neighbouring lanes is one block; sessions stay one for each lane. */
export function blocksOf(
  bookings: readonly Booking[],
  lanes: readonly Lane[],
  dates: readonly string[],
): Block[] {
  return bookings.flatMap((booking) => {
    const minutes = minutesBetween(booking.startsAt, booking.endsAt);
    const runs = runsOf(lanesOf(booking, lanes), booking.kind === 'build night');
    return segmentsOf(booking.startsAt, booking.endsAt, dates).flatMap((segment) =>
      runs.map((run) => ({
        ...segment,
        ...run,
        booking,
        minutes,
        key: `${booking.id}:${segment.date}:${run.lane}`,
      })),
    );
  });
}

/** The booking that holds a lane at a minute of a day, if one does. */
export function blockAt(
  blocks: readonly Block[],
  at: { date: string; lane: number; minute: number },
): Block | undefined {
  return blocks.find(
    ({ date, lane, lanes, top, bottom }) =>
      date === at.date && at.lane >= lane && at.lane < lane + lanes && at.minute >= top && at.minute < bottom,
  );
}

function lanesOf(booking: Booking, lanes: readonly Lane[]): number[] {
  const held = new Set(booking.resources.map(({ id }) => id));
  return lanes.flatMap(({ id }, index) => (held.has(id) ? [index] : []));
}

function runsOf(indexes: readonly number[], joins: boolean): { lane: number; lanes: number }[] {
  const runs: { lane: number; lanes: number }[] = [];
  for (const lane of indexes) {
    const last = runs.at(-1);
    if (joins && last && last.lane + last.lanes === lane) last.lanes += 1;
    else runs.push({ lane, lanes: 1 });
  }
  return runs;
}
