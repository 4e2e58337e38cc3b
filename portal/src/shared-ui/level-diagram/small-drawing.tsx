import { signed } from '../../lib/text';
import { token } from '../tokens';
import type { LevelRow } from './level-rows';
import { gridOf, levelToY, rangeOf, stepPath } from './level-scale';
import { summary } from './level-words';
import { useWidth } from './use-width';

const GUTTER = 34;
const PLOT = { top: 4, height: 96 };
const HEIGHT = 104;
const STEP_DB = 20;

/** The stepped line at 104 high: limits as bars, readings as dots, no figures but the axis. */
export function SmallDrawing({ rows }: { rows: readonly LevelRow[] }) {
  const [frame, frameWidth] = useWidth<HTMLDivElement>(358);
  const range = rangeOf(rows);
  const y = levelToY(range, PLOT);
  const width = frameWidth - GUTTER;
  const column = width / rows.length;
  return (
    <div ref={frame}>
      <svg width={frameWidth} height={HEIGHT} role="img" aria-label={summary(rows)} fontSize="11" fill="none">
        {rows.map(
          ({ point, isBeingEntered }, index) =>
            isBeingEntered && (
              <rect
                key={point.id}
                x={GUTTER + index * column}
                width={column}
                height={HEIGHT}
                fill={token('copperTint')}
              />
            ),
        )}
        {gridOf(range, STEP_DB).map((dbm) => (
          <g key={dbm}>
            <path d={`M${GUTTER} ${y(dbm)}H${frameWidth}`} stroke={token('rule')} />
            <text x={GUTTER - 6} y={y(dbm) + 4} textAnchor="end" fontWeight="700" fill={token('ink2')}>
              {signed(dbm, 0)}
            </text>
          </g>
        ))}
        <g transform={`translate(${GUTTER} 0)`}>
          <Marks rows={rows} column={column} y={y} />
        </g>
      </svg>
    </div>
  );
}

function Marks({
  rows,
  column,
  y,
}: {
  rows: readonly LevelRow[];
  column: number;
  y: (dbm: number) => number;
}) {
  const levels = rows.map(({ point }) => point.planDbm);
  return (
    <>
      {rows.map(({ point: { id, planDbm, toleranceDb, limitDbm } }, index) => {
        const top = y(planDbm + toleranceDb);
        return (
          <g key={id}>
            <rect
              x={index * column}
              y={top}
              width={column}
              height={y(planDbm - toleranceDb) - top}
              fill={token('green')}
              fillOpacity="0.2"
            />
            {limitDbm !== undefined && limitDbm !== null && (
              <path
                d={`M${index * column + 1} ${y(limitDbm)}h${column - 2}`}
                stroke={token('oxide')}
                strokeWidth="1.8"
              />
            )}
          </g>
        );
      })}
      <path d={stepPath(levels, y, column)} stroke={token('green')} strokeWidth="2" />
      {rows.map(({ point, measured, isBeingEntered }, index) => {
        if (!measured) return null;
        const [x, middle] = [(index + 0.5) * column, y(measured.levelDbm)];
        return isBeingEntered ? (
          <circle
            key={point.id}
            cx={x}
            cy={middle}
            r="4"
            fill={token('paper')}
            stroke={token('copper')}
            strokeWidth="2"
          />
        ) : (
          <circle key={point.id} cx={x} cy={middle} r="3.4" fill={token('ink')} />
        );
      })}
    </>
  );
}
