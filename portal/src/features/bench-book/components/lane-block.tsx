import Box from '@mui/material/Box';
import { formatTime, lengthText } from '../../../lib/club-time-text';
import { token } from '../../../shared-ui/tokens';
import type { Block } from '../lanes/blocks';
import { MINUTE_PX } from '../lanes/lane-sizes';
import { whoHas } from './lane-cells';

interface LaneBlockProps {
  block: Block;
  laneCount: number;
  /** Instruments carry a doubled edge, so that they are told from benches without colour. */
  isInstrument: boolean;
  /** A phone has room for surnames' initials and times. */
  isWide: boolean;
  onOpen: () => void;
}

/** 1.5 h in a narrow lane, where "1 h 30" would not fit. */
export const hoursText = (minutes: number): string =>
  minutes % 60 === 0 || minutes % 30 !== 0 ? lengthText(minutes) : `${minutes / 60} h`;

const firstName = (name: string): string => name.split(' ')[0] ?? name;
const shortName = (name: string): string => name.replace(/ (\p{L})\S*$/u, ' $1.');

/** A booking in its lane. The grid's cells say the same to a screen reader, so it is drawing and pointer only. */
export function LaneBlock({ block, laneCount, isInstrument, isWide, onOpen }: LaneBlockProps) {
  const { booking, lane, lanes, top, bottom, minutes } = block;
  const look =
    booking.kind === 'build night' ? NIGHT : booking.mine ? MINE : isInstrument ? OTHERS_DOUBLE : OTHERS;
  const isNight = booking.kind === 'build night';
  const name = isNight || booking.mine ? whoHas(block) : (isWide ? shortName : firstName)(booking.personName);
  const times = `${formatTime(booking.startsAt)} to ${formatTime(booking.endsAt)}`;
  return (
    <Box
      aria-hidden
      title={`${whoHas(block)}, ${times}`}
      onPointerDown={(event) => event.stopPropagation()}
      onClick={onOpen}
      sx={{ ...BLOCK, ...look }}
      style={{
        top: top * MINUTE_PX + 1,
        height: Math.max(20, (bottom - top) * MINUTE_PX - 2),
        left: `calc(${(lane / laneCount) * 100}% + 3px)`,
        width: `calc(${(lanes / laneCount) * 100}% - 6px)`,
      }}
    >
      <b>{name}</b>
      <div>{isNight || isWide ? times : hoursText(minutes)}</div>
    </Box>
  );
}

const BLOCK = {
  position: 'absolute',
  overflow: 'hidden',
  p: '3px 6px',
  border: '1px solid',
  borderRadius: '2px',
  fontSize: '0.78125rem',
  lineHeight: '1.0625rem',
  // A long word is cut at the lane's edge rather than broken between any two letters.
  overflowWrap: 'normal',
  hyphens: 'auto',
  cursor: 'pointer',
  pointerEvents: 'auto',
} as const;
const OTHERS = { borderColor: 'token.edge', backgroundColor: 'token.sheet', color: 'token.ink' } as const;
const OTHERS_DOUBLE = { ...OTHERS, borderLeft: `4px double ${token('ink2')}`, pl: '5px' } as const;
const MINE = { borderColor: 'token.green', backgroundColor: 'token.green', color: 'token.onGreen' } as const;
const NIGHT = { borderColor: 'token.trace', backgroundColor: 'token.traceTint', color: 'token.ink' } as const;
