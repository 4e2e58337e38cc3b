import Box from '@mui/material/Box';
import { clubDay } from '../../../lib/club-time';
import { clockText } from '../../../lib/club-time-text';
import { token } from '../../../shared-ui/tokens';
import type { Booking } from '../api/bench-book';
import type { Block } from '../lanes/blocks';
import type { Extent } from '../lanes/extent';
import { closedStretches, type OpenDay } from '../../../lib/opening-hours';
import { hatchOf } from '../lanes/hatches';
import type { Lane } from '../lanes/lane';
import { MINUTE_PX, SLOT_PX } from '../lanes/lane-sizes';
import { hoursText, LaneBlock } from './lane-block';
import { ClosedHatch } from './closed-hatch';
import { LaneCursor, LaneHatch, LaneWish, NowLine } from './lane-marks';
import { useLanePointer } from './use-lane-pointer';

/** A stretch of one lane that is asked for and not booked yet. */
export interface Wish {
  date: string;
  laneId: string;
  from: number;
  to: number;
}

export interface Picked {
  date: string;
  lane: Lane;
  from: number;
  to: number;
}

interface LaneDayProps {
  date: string;
  lanes: readonly Lane[];
  blocks: readonly Block[];
  wishes: readonly Wish[];
  cursor: { lane: number; slot: number; length: number } | undefined;
  hours: readonly OpenDay[];
  extent: Extent;
  isWide: boolean;
  onPick: (picked: Picked) => void;
  onOpen: (booking: Booking) => void;
}

/** The drawing of one day over its cells, and what a pointer does there. */
export function LaneDay(props: LaneDayProps) {
  const { date, lanes, blocks, wishes, cursor, hours, extent, isWide, onPick, onOpen } = props;
  const laneCount = lanes.length;
  const pointer = useLanePointer(laneCount, (index, from, to) => {
    const lane = lanes[index];
    if (lane) onPick({ date, lane, from, to });
  });
  const wishWords = ({ from, to }: { from: number; to: number }) =>
    isWide ? `${clockText(from)} to ${clockText(to)}` : hoursText(to - from);
  return (
    <Box
      aria-hidden
      style={{ gridColumn: `span ${laneCount}`, height: (extent.to - extent.from) * MINUTE_PX }}
      sx={WINDOW}
    >
      <Box
        {...pointer.handlers}
        style={{ top: -extent.from * MINUTE_PX, backgroundSize: `${100 / laneCount}% 100%, auto, auto` }}
        sx={DAY}
      >
        {closedStretches(hours, date).map((closed) => (
          <ClosedHatch key={closed.from} {...closed} extent={extent} />
        ))}
        {lanes.map(({ id, instrument }, index) => {
          const words = hatchOf(instrument, date, clubDay());
          return words && <LaneHatch key={id} lane={index} laneCount={laneCount} words={words} />;
        })}
        {blocks.map((block) => (
          <LaneBlock
            key={block.key}
            block={block}
            laneCount={laneCount}
            isInstrument={lanes[block.lane]?.kind === 'instrument'}
            isWide={isWide}
            onOpen={() => onOpen(block.booking)}
          />
        ))}
        {wishes.map(({ laneId, from, to }) => {
          const lane = lanes.findIndex(({ id }) => id === laneId);
          if (lane < 0) return null;
          return <LaneWish key={laneId} {...{ lane, laneCount, from, to }} words={wishWords({ from, to })} />;
        })}
        {pointer.drawn && (
          <LaneWish {...pointer.drawn} laneCount={laneCount} words={wishWords(pointer.drawn)} />
        )}
        <NowLine date={date} />
        {cursor && <LaneCursor {...cursor} laneCount={laneCount} />}
      </Box>
    </Box>
  );
}

const LINE = token('rule');

/** Shows of the day what the week's hours ask for; clipped rather than hidden, so that words inside may stick. */
const WINDOW = { position: 'relative', overflow: 'clip', borderLeft: `1px solid ${token('edge')}` } as const;

/** Hours ruled, half hours dotted, lanes parted; the day's own edge stands out. Drawn by the background, not by cells. */
const DAY = {
  position: 'absolute',
  left: 0,
  right: 0,
  height: 24 * 60 * MINUTE_PX,
  cursor: 'cell',
  touchAction: 'pan-y',
  backgroundImage: [
    `linear-gradient(90deg, transparent calc(100% - 1px), ${LINE} 0)`,
    `repeating-linear-gradient(180deg, ${LINE} 0 1px, transparent 1px ${2 * SLOT_PX}px)`,
    `repeating-linear-gradient(180deg, transparent 0 ${SLOT_PX}px, color-mix(in srgb, ${LINE} 55%, transparent) ${SLOT_PX}px ${SLOT_PX + 1}px, transparent ${SLOT_PX + 1}px ${2 * SLOT_PX}px)`,
  ].join(', '),
} as const;
