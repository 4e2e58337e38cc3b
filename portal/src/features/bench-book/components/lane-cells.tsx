import Box from '@mui/material/Box';
import { memo } from 'react';
import { clockText, dayText } from '../../../lib/club-time-text';
import type { Block } from '../lanes/blocks';
import { blockAt } from '../lanes/blocks';
import { SLOT_MINUTES, SLOTS } from '../lanes/cursor';
import { hatchOf } from '../lanes/hatches';
import type { Lane } from '../lanes/lane';
import { SLOT_PX } from '../lanes/lane-sizes';

interface LaneCellsProps {
  idPrefix: string;
  dates: readonly string[];
  lanes: readonly Lane[];
  blocks: readonly Block[];
  today: string;
}

export const cellId = (prefix: string, column: number, slot: number): string => `${prefix}-${column}-${slot}`;

/** Who a booking is said to be: "You", a name, or a night's title. */
export const whoHas = ({ booking }: Pick<Block, 'booking'>): string =>
  booking.kind === 'build night' ? booking.title : booking.mine ? 'You' : booking.personName;

/** The half hours, one row each, with what a screen reader says of every one of them. */
export const LaneCells = memo(function LaneCells({ idPrefix, dates, lanes, blocks, today }: LaneCellsProps) {
  const words = (date: string, lane: number, minute: number): string => {
    const block = blockAt(blocks, { date, lane, minute });
    const hatch = hatchOf(lanes[lane]?.instrument, date, today);
    const state = block ? `${whoHas(block)} until ${clockText(block.bottom)}` : (hatch ?? 'free');
    return `${dayText(date)} ${clockText(minute)}, ${lanes[lane]?.tag ?? ''}, ${state}`;
  };
  return Array.from({ length: SLOTS }, (_, slot) => (
    <Box key={slot} role="row" sx={{ display: 'contents' }}>
      <Box role="rowheader" sx={{ ...CLOCK, visibility: slot % 2 === 0 ? 'visible' : 'hidden' }}>
        {clockText(slot * SLOT_MINUTES)}
      </Box>
      {dates.flatMap((date, day) =>
        lanes.map((lane, index) => (
          <Box
            key={`${date}:${lane.id}`}
            role="gridcell"
            id={cellId(idPrefix, day * lanes.length + index, slot)}
            aria-label={words(date, index, slot * SLOT_MINUTES)}
            sx={{
              borderLeft: '1px solid',
              borderLeftColor: index === 0 ? 'token.edge' : 'token.rule',
              borderTop: slot % 2 === 0 ? '1px solid' : '1px dotted',
              borderTopColor: slot === 0 ? 'transparent' : 'token.rule',
            }}
          />
        )),
      )}
    </Box>
  ));
});

const CLOCK = {
  height: SLOT_PX,
  pr: '8px',
  textAlign: 'right',
  typography: 'small',
  lineHeight: '1rem',
  color: 'token.ink2',
  // The figure stands beside its line, not under it.
  mt: '-8px',
} as const;
