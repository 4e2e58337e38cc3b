import { token } from '../../../shared-ui/tokens';
import { fixed } from '../../../lib/text';
import type { FilterBuilds } from './builds';
import type { FilterFigures } from './figures';
import {
  bandPath,
  GAIN,
  gainToY,
  GUTTER,
  LEAST_GAIN_DB,
  linePath,
  MOST_RETURN_LOSS_DB,
  RETURN,
  returnToY,
  steps,
  type ToX,
} from './plot-scale';

/** What every layer of the plot is given. */
export interface LayerProps {
  figures: FilterFigures;
  x: ToX;
  /** Right edge of the panels. */
  right: number;
}

/** The haloed text that stays readable over lines. */
export const HALO = {
  paintOrder: 'stroke',
  stroke: token('paper'),
  strokeWidth: 4,
  strokeLinejoin: 'round',
} as const;

export function Grid({ figures: { axis }, x, right }: LayerProps) {
  const across = [
    ...steps(10, -LEAST_GAIN_DB).map((db) => gainToY(-db)),
    ...steps(10, MOST_RETURN_LOSS_DB).map(returnToY),
  ];
  const panels = (at: number) => `M${at} ${GAIN.top}V${GAIN.bottom}M${at} ${RETURN.top}V${RETURN.bottom}`;
  return (
    <g stroke={token('rule')}>
      <path d={across.map((y) => `M${GUTTER} ${y}H${right}`).join('')} />
      <path
        d={steps(axis.stepHertz, axis.endHertz)
          .map((hertz) => panels(x(hertz)))
          .join('')}
      />
      <path
        d={steps(axis.stepHertz, axis.endHertz - axis.stepHertz)
          .map((hertz) => panels(x(hertz + axis.stepHertz / 2)))
          .join('')}
        strokeDasharray="1 5"
      />
    </g>
  );
}

/** Figures of both panels and of the frequency axis. */
export function AxisFigures({ figures: { axis }, x }: LayerProps) {
  const end = GUTTER - 7;
  const decimals = axis.stepHertz < 1e6 ? 1 : 0;
  return (
    <g fontSize="10.5" fontWeight="600" fill={token('ink2')}>
      <g textAnchor="end">
        <text x={end} y={GAIN.top - 11}>
          Gain, dB
        </text>
        {steps(10, -LEAST_GAIN_DB).map((db) => (
          <text key={db} x={end} y={gainToY(-db) + 4}>
            {fixed(-db, 0)}
          </text>
        ))}
        <text x={end} y={RETURN.top - 10}>
          Return, dB
        </text>
        {steps(10, MOST_RETURN_LOSS_DB).map((db) => (
          <text key={db} x={end} y={returnToY(db) + 4}>
            {db}
          </text>
        ))}
        <text x={end} y={RETURN.bottom + 18}>
          MHz
        </text>
      </g>
      <g textAnchor="middle">
        {steps(axis.stepHertz, axis.endHertz).map((hertz) => (
          <text key={hertz} x={x(hertz)} y={RETURN.bottom + 18}>
            {fixed(hertz / 1e6, decimals)}
          </text>
        ))}
      </g>
    </g>
  );
}

/** The wanted band, through both panels. */
export function WantedBand({ figures: { carrier }, x }: LayerProps) {
  const [low, high] = [x(carrier.lowHertz), x(carrier.highHertz)];
  const width = Math.max(high - low, 2);
  return (
    <g>
      <path
        d={`M${low} ${GAIN.top}h${width}V${RETURN.bottom}h${-width}z`}
        fill={token('green')}
        fillOpacity="0.22"
      />
      <text
        x={(low + high) / 2}
        y={GAIN.top - 11}
        textAnchor="middle"
        fontSize="11"
        fontWeight="700"
        fill={token('green')}
      >
        {carrier.band ?? 'carrier'}
      </text>
    </g>
  );
}

/** The middle 95 % of the builds behind both lines; faint while another filter's builds are on their way. */
export function Spread({ built, isStale, x }: { built: FilterBuilds; isStale: boolean; x: ToX }) {
  const { hertz, gainDb, returnLossDb } = built.bands;
  return (
    <g opacity={isStale ? 0.4 : 1}>
      <path d={bandPath(hertz, gainDb[0], gainDb[1], x, gainToY)} fill={token('green')} fillOpacity="0.24" />
      <path
        d={bandPath(hertz, returnLossDb[0], returnLossDb[1], x, returnToY)}
        fill={token('ink')}
        fillOpacity="0.14"
      />
    </g>
  );
}

/** The filter of the nearest parts. */
export function Lines({ figures: { response }, x }: LayerProps) {
  const { hertz, gainDb, returnLossDb } = response;
  return (
    <g fill="none" strokeLinejoin="round">
      <path d={linePath(hertz, gainDb, x, gainToY)} stroke={token('green')} strokeWidth="2.2" />
      <path d={linePath(hertz, returnLossDb, x, returnToY)} stroke={token('ink')} strokeWidth="1.8" />
    </g>
  );
}
