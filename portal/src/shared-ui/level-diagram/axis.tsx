import { signed } from '../../lib/text';
import { token } from '../tokens';
import { differenceToY, GAINS, gridOf, GUTTER, HEIGHT, PLOT, STRIP, type LevelRange } from './level-scale';
import { powerLabel } from './level-words';

interface AxisProps {
  range: LevelRange;
  y: (dbm: number) => number;
}

/** The labels at the left, an own drawing so that it stays in place when the columns scroll. */
export function Axis({ range, y }: AxisProps) {
  const end = GUTTER - 7;
  return (
    <svg width={GUTTER} height={HEIGHT} aria-hidden style={{ flex: 'none' }} fontSize="10.5" textAnchor="end">
      <text x={end} y={PLOT.top + 4} fontWeight="600" fill={token('ink3')}>
        dBm
      </text>
      {gridOf(range)
        .slice(1)
        .map((dbm) => (
          <g key={dbm}>
            <text x={end} y={y(dbm) + 1} fontWeight="700" fill={token('ink2')}>
              {signed(dbm, 0)}
            </text>
            <text x={end} y={y(dbm) + 13} fontWeight="600" fill={token('ink3')}>
              {powerLabel(dbm)}
            </text>
          </g>
        ))}
      <g fontWeight="600" fill={token('ink3')}>
        <text x={end} y={GAINS.measured}>
          Gain, dB
        </text>
        <text x={end} y={differenceToY(2) + 4}>
          +2
        </text>
        <text x={end} y={STRIP.middle + 4} fontWeight="700" fill={token('green')}>
          plan
        </text>
        <text x={end} y={differenceToY(-2) + 4}>
          −2
        </text>
      </g>
    </svg>
  );
}
