import Box from '@mui/material/Box';
import { useId, useState, type KeyboardEvent } from 'react';
import { clubDay } from '../../../lib/club-time';
import type { OpenDay } from '../../../lib/opening-hours';
import { HALF_SHEET } from '../../../shared-ui/phone-sheet';
import type { Booking } from '../api/bench-book';
import { blockAt } from '../lanes/blocks';
import { moved, SLOT_MINUTES, slotsOf, type Cursor } from '../lanes/cursor';
import type { Lane } from '../lanes/lane';
import { CLOCK_PX } from '../lanes/lane-sizes';
import { cellId, LaneCells } from './lane-cells';
import { LaneClock } from './lane-clock';
import { LaneDay, type Picked, type Wish } from './lane-day';
import { LaneHeads } from './lane-heads';
import { useDrawnLanes } from './use-drawn-lanes';

interface WeekLanesProps {
  dates: readonly string[];
  lanes: readonly Lane[];
  bookings: readonly Booking[];
  /** What the form asks for, drawn dashed. */
  wishes: readonly Wish[];
  /** When the workshop is open. */
  hours: readonly OpenDay[];
  /** The whole week, so that a phone's one day is as long as the others. */
  week: readonly string[];
  hasDays: boolean;
  /** A phone's form stands over the lower part of the page. */
  isUnderSheet: boolean;
  /** A free stretch was chosen: by key, by a click or by dragging. */
  onPick: (picked: Picked) => void;
  onOpen: (booking: Booking) => void;
}

/**
 * Days by lanes on one clock. One tab stop: arrows move by half an hour and lane by lane, Shift stretches, N or Enter
 * picks, Enter on a booking opens it. Every cell says in words what stands there, so the drawing over it is silent.
 */
export function WeekLanes(props: WeekLanesProps) {
  const { dates, lanes, bookings, wishes, hours, week, hasDays, isUnderSheet, onPick, onOpen } = props;
  const id = useId();
  const today = clubDay();
  const { blocks, extent, seen, frame } = useDrawnLanes({ dates, week, lanes, bookings, wishes, hours });
  const { first, end } = slotsOf(extent);
  const [cursor, setCursor] = useState<Cursor>();
  const [hasFocus, setHasFocus] = useState(false);
  const columns = dates.length * lanes.length;
  const headRows = hasDays ? 2 : 1;
  const at: Cursor = cursor ?? {
    column: Math.max(0, dates.indexOf(today)) * lanes.length,
    slot: Math.min(end - 1, seen / SLOT_MINUTES + 4),
    length: 1,
  };
  const column = Math.min(at.column, columns - 1);
  const slot = Math.min(end - 1, Math.max(first, at.slot));
  const [date, lane] = [dates[Math.floor(column / lanes.length)] ?? today, column % lanes.length];

  const act = (): void => {
    const from = slot * SLOT_MINUTES;
    const block = blockAt(blocks, { date, lane, minute: from });
    const held = lanes[lane];
    if (block) onOpen(block.booking);
    else if (held) onPick({ date, lane: held, from, to: from + at.length * SLOT_MINUTES });
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = moved({ ...at, column, slot }, { key: event.key, isShift: event.shiftKey }, columns, extent);
    const isAct = event.key === 'Enter' || event.key === ' ' || event.key.toLowerCase() === 'n';
    if (!next && !isAct) return;
    event.preventDefault();
    if (next) setCursor(next);
    else act();
  };

  return (
    <Box ref={frame} sx={isUnderSheet ? ABOVE_SHEET : SCROLLER}>
      <Box
        role="grid"
        tabIndex={0}
        aria-label="Bench book, benches and instruments by day"
        aria-rowcount={end - first + headRows}
        aria-colcount={columns + 1}
        aria-activedescendant={cellId(id, column, slot)}
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
        <LaneClock {...extent} />
        {dates.map((day) => (
          <LaneDay
            key={day}
            date={day}
            lanes={lanes}
            blocks={blocks.filter((block) => block.date === day)}
            wishes={wishes.filter((wish) => wish.date === day)}
            cursor={hasFocus && day === date ? { lane, slot, length: at.length } : undefined}
            hours={hours}
            extent={extent}
            isWide={!hasDays}
            onPick={onPick}
            onOpen={onOpen}
          />
        ))}
        <LaneCells idPrefix={id} {...{ dates, lanes, blocks, today, hours, extent, headRows, slot }} />
      </Box>
    </Box>
  );
}

const SCROLLER = {
  overflowY: 'auto',
  overscrollBehavior: 'contain',
  // Down to the bar below on a phone, to the window's edge elsewhere.
  maxHeight: { xs: 'calc(100dvh - 250px)', md: 'calc(100dvh - 140px)' },
  mb: { xs: '-16px', md: '-30px' },
  minHeight: 320,
} as const;

const ABOVE_SHEET = {
  ...SCROLLER,
  minHeight: 0,
  mx: '-16px',
  maxHeight: `calc(100dvh - ${HALF_SHEET} - 176px)`,
} as const;
