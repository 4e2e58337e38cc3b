import type { PadDesign } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { token } from '../../../shared-ui/tokens';
import { exactText, ohmsText, padText } from './answer-words';

const BOX = { fill: token('sheet'), stroke: token('ink'), strokeWidth: 1.6 } as const;

/** A pi pad with its nearest values, and the exact ones under it. */
export function PadDrawing({ pad }: { pad: PadDesign }) {
  const [first, across, last] = pad.resistors.map(({ ohms }) => ohmsText(ohms));
  return (
    <Box component="figure" sx={{ m: 0, flex: 'none', width: 204, textAlign: 'center' }}>
      <svg
        role="img"
        aria-label={`Pi pad: ${padText(pad)}, to ground, in the line and to ground.`}
        width="204"
        height="66"
        fill="none"
        stroke={token('ink')}
        strokeWidth="1.4"
      >
        <path d="M6 11H76M124 11H198M60 11v7M60 54v5M144 11v7M144 54v5M51 59h18M55 63h10M135 59h18M139 63h10" />
        <circle cx="4" cy="11" r="2.8" fill={token('brassTint')} />
        <circle cx="200" cy="11" r="2.8" fill={token('brassTint')} />
        <circle cx="60" cy="11" r="2.4" fill={token('ink')} />
        <circle cx="144" cy="11" r="2.4" fill={token('ink')} />
        <rect x="52" y="18" width="16" height="36" {...BOX} />
        <rect x="76" y="3" width="48" height="16" {...BOX} />
        <rect x="136" y="18" width="16" height="36" {...BOX} />
        <g fontSize="13" fontWeight="700" fill={token('ink')} stroke="none">
          <text x="46" y="41" textAnchor="end">
            {first}
          </text>
          <text x="100" y="37" textAnchor="middle">
            {across}
          </text>
          <text x="158" y="41">
            {last}
          </text>
        </g>
      </svg>
      <Box component="figcaption" sx={{ typography: 'small', color: 'token.ink2' }}>
        ohm; exact {exactText(pad)}
      </Box>
    </Box>
  );
}
