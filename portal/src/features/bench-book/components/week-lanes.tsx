import Box from '@mui/material/Box';
import { useId, useLayoutEffect, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { clubDay } from '../../../lib/club-time';
import type { Booking } from '../api/bench-book';
import { blockAt, blocksOf } from '../lanes/blocks';
import { moved, SLOT_MINUTES, SLOTS, type Cursor } from '../lanes/cursor';
import { firstHour } from '../lanes/first-hour';
import type { Lane } from '../lanes/lane';
import { CLOCK_PX, SLOT_PX } from '../lanes/lane-sizes';
import { cellId, LaneCells } from './lane-cells';
import { LaneClock } from './lane-clock';
import { LaneDay, type Picked, type Wish } from './lane-day';
import { LaneHeads } from './lane-heads';

interface WeekLanesProps {
  dates: readonly string[];
  lanes: readonly Lane[];
  bookings: readonly Booking[];
  /** What the form asks for, drawn dashed. */
  wishes: readonly Wish[];
  hasDays: boolean;
  /** A free stretch was chosen: by key, by a click or by dragging. */
  onPick: (picked: Picked) => void;
  onOpen: (booking: Booking) => void;
}

/**
 * Days by lanes on one clock. One tab stop: arrows move by half an hour and lane by lane, Shift stretches, N or Enter
 * picks, Enter on a booking opens it. Every cell says in words what stands there, so the drawing over it is silent.
 */
export function WeekLanes({ dates, lanes, bookings, wishes, hasDays, onPick, onOpen }: WeekLanesProps) {
  const id = useId();
  const today = clubDay();
  const blocks = useMemo(() => blocksOf(bookings, lanes, dates), [bookings, lanes, dates]);
  const firstSlot = firstHour(blocks) * 2;
  const frame = useOpenedAt(firstSlot, dates[0]);
  const [cursor, setCursor] = useState<Cursor>();
  const [hasFocus, setHasFocus] = useState(false);
  const columns = dates.length * lanes.length;
  const headRows = hasDays ? 2 : 1;
  const at: Cursor = cursor ?? {
    column: Math.max(0, dates.indexOf(today)) * lanes.length,
    slot: firstSlot + 4,
    length: 1,
  };
  const column = Math.min(at.column, columns - 1);
  const [date, lane] = [dates[Math.floor(column / lanes.length)] ?? today, column % lanes.length];

  const act = (): void => {
    const from = at.slot * SLOT_MINUTES;
    const block = blockAt(blocks, { date, lane, minute: from });
    const held = lanes[lane];
    if (block) onOpen(block.booking);
    else if (held) onPick({ date, lane: held, from, to: from + at.length * SLOT_MINUTES });
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = moved({ ...at, column }, event.key, event.shiftKey, columns);
    const isAct = event.key === 'Enter' || event.key === ' ' || event.key.toLowerCase() === 'n';
    if (!next && !isAct) return;
    event.preventDefault();
    if (next) setCursor(next);
    else act();
  };

  return (
    <Box ref={frame} sx={SCROLLER}>
      <Box
        role="grid"
        tabIndex={0}
        aria-label="Bench book, benches and instruments by day"
        aria-rowcount={SLOTS + headRows}
        aria-colcount={columns + 1}
        aria-activedescendant={cellId(id, column, at.slot)}
        onKeyDown={onKeyDown}
        onFocus={(event) => setHasFocus(event.target === event.currentTarget)}
        onBlur={() => setHasFocus(false)}
        sx={{
          position: 'relative',
          isolation: 'isolate',
          display: 'grid',
          gridTemplateColumns: `${CLOCK_PX}px repeat(${columns}, minmax(0, 1fr))`,
          alignItems: 'stretch',
          '&:focus-visible': { outline: '2px solid', outlineColor: 'token.green', outlineOffset: -2 },
        }}
      >
        <LaneHeads dates={dates} lanes={lanes} hasDays={hasDays} />
        <LaneClock />
        {dates.map((day) => (
          <LaneDay
            key={day}
            date={day}
            lanes={lanes}
            blocks={blocks.filter((block) => block.date === day)}
            wishes={wishes.filter((wish) => wish.date === day)}
            cursor={hasFocus && day === date ? { lane, slot: at.slot, length: at.length } : undefined}
            isWide={!hasDays}
            onPick={onPick}
            onOpen={onOpen}
          />
        ))}
        <LaneCells idPrefix={id} {...{ dates, lanes, blocks, today, headRows }} slot={at.slot} />
      </Box>
    </Box>
  );
}

/** Opens the day at the first half hour worth seeing; where the person scrolls to afterwards is theirs. */
function useOpenedAt(slot: number, week: string | undefined) {
  const frame = useRef<HTMLDivElement>(null);
  const opened = useRef<string>(undefined);
  useLayoutEffect(() => {
    if (!frame.current || opened.current === week) return;
    opened.current = week;
    frame.current.scrollTop = slot * SLOT_PX - 10;
  }, [slot, week]);
  return frame;
}

const SCROLLER = {
  overflowY: 'auto',
  overscrollBehavior: 'contain',
  maxHeight: { xs: 'calc(100dvh - 300px)', md: 'calc(100dvh - 178px)' },
  minHeight: 320,
} as const;
