import Box from '@mui/material/Box';
import { clockText } from '../../../lib/club-time-text';
import { SLOT_PX } from '../lanes/lane-sizes';

const HOURS = Array.from({ length: 24 }, (_, hour) => hour);

/** The hours down the side, each beside its line. */
export function LaneClock() {
  return (
    <Box aria-hidden sx={{ pr: '8px', textAlign: 'right', typography: 'small', color: 'token.ink2' }}>
      {HOURS.map((hour) => (
        <div key={hour} style={{ height: 2 * SLOT_PX, lineHeight: '16px', transform: 'translateY(-8px)' }}>
          {clockText(hour * 60)}
        </div>
      ))}
    </Box>
  );
}
