import Box from '@mui/material/Box';
import { token } from '../../../shared-ui/tokens';
import { metreText } from './windings';

const SIZE = 132;
const RADIUS = 58;

/** A round wire cut across, its skin to scale. */
export function WireSection({ diameter, depth }: { diameter: number; depth: number }) {
  const skin = Math.min((2 * RADIUS * depth) / diameter, RADIUS);
  return (
    <Box
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: '20px',
        mt: '10px',
        p: '12px 16px',
        border: '1px solid',
        borderColor: 'token.rule',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <svg
        width={SIZE}
        height={SIZE}
        role="img"
        aria-label={`A wire ${metreText(diameter)} across; its skin is ${metreText(depth)} deep`}
      >
        <circle cx={SIZE / 2} cy={SIZE / 2} r={RADIUS} fill={token('sunk')} />
        <circle
          cx={SIZE / 2}
          cy={SIZE / 2}
          r={RADIUS - skin / 2}
          fill="none"
          stroke={token('ink')}
          strokeWidth={skin}
        />
        <circle cx={SIZE / 2} cy={SIZE / 2} r={RADIUS} fill="none" stroke={token('ink')} strokeWidth="1.5" />
      </svg>
      <Box sx={{ typography: 'small', color: 'token.ink2' }}>
        A wire <b>{metreText(diameter)}</b> across, to scale. Most of the current runs in the outer{' '}
        <b>{metreText(Math.min(depth, diameter / 2))}</b>; what lies deeper hardly carries any.
      </Box>
    </Box>
  );
}
