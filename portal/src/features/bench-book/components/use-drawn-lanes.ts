import { useEffect, useLayoutEffect, useMemo, useRef, type RefObject } from 'react';
import type { OpenDay } from '../../../lib/opening-hours';
import type { Booking } from '../api/bench-book';
import { blocksOf } from '../lanes/blocks';
import { extentOf, firstSeen } from '../lanes/extent';
import type { Lane } from '../lanes/lane';
import { MINUTE_PX, SLOT_PX } from '../lanes/lane-sizes';
import type { Wish } from './lane-day';

interface Drawn {
  dates: readonly string[];
  /** The whole week, so that a phone's one day is as long as the others. */
  week: readonly string[];
  lanes: readonly Lane[];
  bookings: readonly Booking[];
  wishes: readonly Wish[];
  hours: readonly OpenDay[];
}

/** What stands in the lanes, which hours of the day they show, and the frame that scrolls over them. */
export function useDrawnLanes({ dates, week, lanes, bookings, wishes, hours }: Drawn) {
  const blocks = useMemo(() => blocksOf(bookings, lanes, dates), [bookings, lanes, dates]);
  const standing = blocks.map(({ top, bottom }) => ({ from: top, to: bottom }));
  const asked = wishes.filter(({ date }) => dates.includes(date));
  const extent = extentOf(week, hours, [...standing, ...asked]);
  const seen = firstSeen(extent, standing);
  const frame = useRef<HTMLDivElement>(null);
  useOpenedAt(frame, { from: seen - extent.from, day: dates[0] });
  useInSight(frame, asked[0] && asked[0].from - extent.from);
  return { blocks, extent, seen, frame };
}

type Frame = RefObject<HTMLDivElement | null>;

function scrollDown(element: HTMLElement, top: number): void {
  element.scrollTop = top;
}

/** Opens the day at the first minute worth seeing, counted from the top; where the person scrolls to afterwards is theirs. */
function useOpenedAt(frame: Frame, { from, day }: { from: number; day: string | undefined }): void {
  const opened = useRef<string>(undefined);
  useLayoutEffect(() => {
    if (!frame.current || opened.current === day) return;
    opened.current = day;
    scrollDown(frame.current, from * MINUTE_PX - 10);
  }, [frame, from, day]);
}

/** Room the heads take of the frame, at most. */
const HEADS_PX = 84;

/** What the form asks for is scrolled to when it is not in sight; `from` in minutes from the top. */
function useInSight(frame: Frame, from: number | undefined): void {
  useEffect(() => {
    if (!frame.current || from === undefined) return;
    const { scrollTop, clientHeight } = frame.current;
    const top = from * MINUTE_PX;
    const isSeen = top >= scrollTop && top + HEADS_PX + 2 * SLOT_PX <= scrollTop + clientHeight;
    if (!isSeen) scrollDown(frame.current, top - SLOT_PX);
  }, [frame, from]);
}
