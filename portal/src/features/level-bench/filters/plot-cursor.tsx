import { token } from '../../../shared-ui/tokens';
import { GAIN, gainToY, HEIGHT, RETURN, returnToY } from './plot-scale';
import type { ResponseRow } from './response-rows';

/** Where the hand or the keyboard is, over the drawing. */
export function PlotCursor({ row, x, width }: { row: ResponseRow; x: number; width: number }) {
  return (
    <svg
      width={width}
      height={HEIGHT}
      aria-hidden
      style={{ position: 'absolute', inset: 0, pointerEvents: 'none' }}
    >
      <path
        d={`M${x} ${GAIN.top}V${GAIN.bottom}M${x} ${RETURN.top}V${RETURN.bottom}`}
        stroke={token('ink')}
        strokeDasharray="2 3"
      />
      <circle
        cx={x}
        cy={gainToY(row.gainDb)}
        r="4"
        fill={token('sheet')}
        stroke={token('green')}
        strokeWidth="2"
      />
      <circle
        cx={x}
        cy={returnToY(row.returnLossDb)}
        r="4"
        fill={token('sheet')}
        stroke={token('ink')}
        strokeWidth="2"
      />
    </svg>
  );
}
