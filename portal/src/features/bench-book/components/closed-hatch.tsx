import Box from '@mui/material/Box';
import { token } from '../../../shared-ui/tokens';
import type { Extent } from '../lanes/extent';
import { MINUTE_PX } from '../lanes/lane-sizes';

interface ClosedHatchProps extends Extent {
  /** What of the day is drawn, so that the word stands in sight. */
  extent: Extent;
}

/** Hours in which nobody opens the workshop, hatched over all lanes of the day; the word where there is room for it. */
export function ClosedHatch({ from, to, extent }: ClosedHatchProps) {
  const [top, bottom] = [Math.max(from, extent.from), Math.min(to, extent.to)];
  if (top >= bottom) return null;
  return (
    <Box
      aria-hidden
      data-testid="closed-hours"
      style={{ top: top * MINUTE_PX, height: (bottom - top) * MINUTE_PX }}
      sx={{
        position: 'absolute',
        left: 0,
        right: 0,
        pointerEvents: 'none',
        backgroundImage: `repeating-linear-gradient(135deg, transparent 0 7px, color-mix(in srgb, ${token('edge')} 50%, transparent) 7px 8px)`,
      }}
    >
      <Box
        component="span"
        sx={{
          position: 'sticky',
          top: 92,
          display: 'block',
          width: 'fit-content',
          m: '8px',
          px: '4px',
          typography: 'small',
          color: 'token.ink2',
          backgroundColor: 'token.paper',
        }}
      >
        Closed
      </Box>
    </Box>
  );
}
