import Box from '@mui/material/Box';
import { clockText } from '../../../lib/club-time-text';
import type { Extent } from '../lanes/extent';
import { MINUTE_PX } from '../lanes/lane-sizes';

/** The hours down the side, each beside its line; the first, which the heads would cover, under it. */
export function LaneClock({ from, to }: Extent) {
  const hours = Array.from({ length: (to - from) / 60 }, (_, index) => from + index * 60);
  return (
    <Box aria-hidden sx={{ pr: '8px', textAlign: 'right', typography: 'small', color: 'token.ink2' }}>
      {hours.map((minute) => (
        <div
          key={minute}
          style={{
            height: 60 * MINUTE_PX,
            lineHeight: '16px',
            transform: `translateY(${minute === from ? 2 : -8}px)`,
          }}
        >
          {clockText(minute)}
        </div>
      ))}
    </Box>
  );
}
