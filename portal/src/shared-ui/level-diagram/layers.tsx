import { fixed, signed } from '../../lib/text';
import { token } from '../tokens';
import type { LevelRow } from './level-rows';
import { GAINS, gridOf, PLOT, stepPath, type LevelRange } from './level-scale';

/** What every layer of the drawing is given: rows left to right, x from the plot's own left edge. */
export interface LayerProps {
  rows: readonly LevelRow[];
  width: number;
  range: LevelRange;
  y: (dbm: number) => number;
}

export const columnOf = ({ rows, width }: Pick<LayerProps, 'rows' | 'width'>): number => width / rows.length;

export function Grid({ rows, width, range, y }: LayerProps) {
  const column = columnOf({ rows, width });
  return (
    <g stroke={token('rule')}>
      {gridOf(range).map((dbm) => (
        <path key={dbm} d={`M0 ${y(dbm)}H${width}`} strokeWidth={dbm === 0 ? 2 : 1} />
      ))}
      {rows.slice(1).map(({ point }, index) => (
        <path
          key={point.id}
          d={`M${(index + 1) * column} ${PLOT.top}V${PLOT.bottom}`}
          strokeDasharray="1 4"
        />
      ))}
    </g>
  );
}

/** Hatch from plan to limit, the limit bar, and the headroom in dB above it. */
export function Headroom({ rows, width, y, hatchId }: LayerProps & { hatchId: string }) {
  const column = columnOf({ rows, width });
  return rows.map(({ point, headroomDb, isHeadroomLow }, index) => {
    if (headroomDb === undefined || point.limitDbm === undefined || point.limitDbm === null) return null;
    const [x, top] = [index * column + 1, y(point.limitDbm)];
    const words = `${fixed(headroomDb)}${isHeadroomLow ? ' low' : ''}`;
    const middle = (index + 0.5) * column;
    return (
      <g key={point.id}>
        <rect
          x={x}
          y={top}
          width={column - 2}
          height={Math.max(0, y(point.planDbm) - top)}
          fill={`url(#${hatchId})`}
        />
        <path d={`M${x} ${top}h${column - 2}`} stroke={token('oxide')} strokeWidth="2.2" />
        {isHeadroomLow && (
          <path
            transform={`translate(${middle - 30} ${top - 14})`}
            d="M3 .5h4l2.5 2.5v4L7 9.5H3L.5 7V3zM5 2.6v2.8M5 7.3v.1"
            fill="none"
            stroke={token('oxide')}
            strokeWidth="1.2"
          />
        )}
        <text x={middle} y={top - 5} textAnchor="middle" fontWeight="700" fill={token('oxide')}>
          {words}
        </text>
      </g>
    );
  });
}

export function Plan({ rows, width, y }: LayerProps) {
  const column = columnOf({ rows, width });
  return (
    <>
      {rows.map(({ point }, index) => {
        const top = y(point.planDbm + point.toleranceDb);
        return (
          <rect
            key={point.id}
            x={index * column}
            y={top}
            width={column}
            height={y(point.planDbm - point.toleranceDb) - top}
            fill={token('green')}
            fillOpacity="0.2"
          />
        );
      })}
      <path
        d={stepPath(
          rows.map(({ point }) => point.planDbm),
          y,
          column,
        )}
        fill="none"
        stroke={token('green')}
        strokeWidth="2.2"
      />
    </>
  );
}

/** On each boundary, planned over measured, joined to its step by a dotted leader. */
export function Gains({ rows, width, y }: LayerProps) {
  const column = columnOf({ rows, width });
  return rows.map((row, index) => {
    const before = rows[index - 1];
    if (!before || row.gainPlannedDb === undefined) return null;
    const x = index * column;
    const foot = y(Math.min(row.point.planDbm, before.point.planDbm));
    const isLive = row.isBeingEntered || before.isBeingEntered;
    return (
      <g key={row.point.id} textAnchor="middle">
        <path
          d={`M${x} ${foot}V${PLOT.bottom + 12}`}
          stroke={token('green')}
          strokeWidth="1"
          strokeDasharray="1.5 2.5"
        />
        <text x={x} y={GAINS.planned - 2} fontWeight="600" fill={token('green')}>
          {signed(row.gainPlannedDb)}
        </text>
        {row.gainMeasuredDb !== undefined && (
          <text x={x} y={GAINS.measured} fontWeight="700" fill={token(isLive ? 'copper' : 'ink')}>
            {signed(row.gainMeasuredDb)}
          </text>
        )}
      </g>
    );
  });
}
