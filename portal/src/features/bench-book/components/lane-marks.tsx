import Box from '@mui/material/Box';
import { useEffect, useState } from 'react';
import { clubDay, wallOf } from '../../../lib/club-time';
import { clockText } from '../../../lib/club-time-text';
import { token } from '../../../shared-ui/tokens';
import { MINUTE_PX, SLOT_PX } from '../lanes/lane-sizes';

const BOX = { position: 'absolute', pointerEvents: 'none' } as const;

const across = (lane: number, laneCount: number) => ({
  left: `calc(${(lane / laneCount) * 100}% + 3px)`,
  width: `calc(${100 / laneCount}% - 6px)`,
});

/** The wall's minute of today, moving on by itself. */
function useMinuteOfToday(): number {
  const [minute, setMinute] = useState(() => wallOf(new Date()).minute);
  useEffect(() => {
    const timer = setInterval(() => setMinute(wallOf(new Date()).minute), 20_000);
    return () => clearInterval(timer);
  }, []);
  return minute;
}

/** The copper line across today's lanes, with its time. */
export function NowLine({ date }: { date: string }) {
  const minute = useMinuteOfToday();
  if (date !== clubDay()) return null;
  return (
    <Box
      aria-hidden
      style={{ top: minute * MINUTE_PX }}
      sx={{ ...BOX, left: 0, right: 0, zIndex: 2, borderTop: '2px solid', borderColor: 'token.copper' }}
    >
      <Box
        component="span"
        sx={{
          position: 'absolute',
          bottom: 1,
          left: '2px',
          px: '3px',
          typography: 'least',
          fontWeight: 700,
          color: 'token.copper',
          backgroundColor: 'token.paper',
        }}
      >
        {clockText(minute)}
      </Box>
    </Box>
  );
}

/** A day on which an instrument cannot be used, hatched from end to end, with the reason down its side. */
export function LaneHatch({ lane, laneCount, words }: { lane: number; laneCount: number; words: string }) {
  return (
    <Box
      aria-hidden
      style={across(lane, laneCount)}
      sx={{
        ...BOX,
        top: 2,
        bottom: 2,
        border: '1px solid',
        borderColor: 'token.brass',
        borderRadius: '2px',
        backgroundColor: 'token.sheet',
        backgroundImage: `repeating-linear-gradient(135deg, transparent 0 7px, color-mix(in srgb, ${token('brassFill')} 32%, transparent) 7px 12px)`,
      }}
    >
      <Box
        component="span"
        sx={{
          position: 'sticky',
          top: 96,
          display: 'block',
          m: '12px auto',
          width: 'fit-content',
          writingMode: 'vertical-rl',
          transform: 'rotate(180deg)',
          py: '4px',
          fontSize: '0.78125rem',
          fontWeight: 600,
          backgroundColor: 'token.sheet',
        }}
      >
        {words}
      </Box>
    </Box>
  );
}

/** What the form asks for, dashed, until it is booked. */
export function LaneWish({ lane, laneCount, from, to, words }: WishProps) {
  return (
    <Box
      aria-hidden
      style={{ ...across(lane, laneCount), top: from * MINUTE_PX + 1, height: (to - from) * MINUTE_PX - 2 }}
      sx={{
        ...BOX,
        overflow: 'hidden',
        p: '2px 5px',
        border: '2px dashed',
        borderColor: 'token.green',
        borderRadius: '2px',
        backgroundColor: 'token.sheet',
        fontSize: '0.78125rem',
        lineHeight: '1.0625rem',
      }}
    >
      <b>You</b>
      <div>{words}</div>
    </Box>
  );
}

interface WishProps {
  lane: number;
  laneCount: number;
  from: number;
  to: number;
  words: string;
}

/** Where the keyboard is: the design's focus ring, drawn inside the grid because the grid itself has the focus. */
export function LaneCursor({ lane, laneCount, slot, length }: CursorProps) {
  return (
    <Box
      aria-hidden
      data-testid="lane-cursor"
      ref={(element: HTMLElement | null) => element?.scrollIntoView?.({ block: 'nearest' })}
      style={{ ...across(lane, laneCount), top: slot * SLOT_PX, height: length * SLOT_PX }}
      sx={{
        ...BOX,
        zIndex: 3,
        outline: '2px solid',
        outlineColor: 'token.green',
        scrollMargin: '110px 0 40px',
      }}
    />
  );
}

interface CursorProps {
  lane: number;
  laneCount: number;
  slot: number;
  length: number;
}
