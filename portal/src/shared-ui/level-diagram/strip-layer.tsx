import { signed } from '../../lib/text';
import { token } from '../tokens';
import { columnOf, type LayerProps } from './layers';
import { dotKind, LevelDot } from './level-dot';
import type { LevelRow } from './level-rows';
import { differenceToY, STRIP, STRIP_DB } from './level-scale';

const LEFT_OF_MIDDLE = 10;

function StripPoint({ row, x }: { row: LevelRow; x: number }) {
  const { measured, offPlanDb, isBeingEntered } = row;
  if (!measured || offPlanDb === undefined) return null;
  const u = measured.expandedUncertaintyDb;
  const [dotX, y] = [x - LEFT_OF_MIDDLE, differenceToY(offPlanDb)];
  const isOff = Math.abs(offPlanDb) > STRIP_DB;
  const colour = token(isBeingEntered ? 'copper' : 'ink');
  const tip = offPlanDb > 0 ? -1 : 1;
  return (
    <g>
      {isOff ? (
        <path
          d={`M${dotX} ${y - tip * 14}V${y - tip * 2}M${dotX - 4} ${y - tip * 7}L${dotX} ${y - tip * 2}L${dotX + 4} ${y - tip * 7}`}
          fill="none"
          stroke={colour}
          strokeWidth="2"
        />
      ) : (
        <LevelDot
          x={dotX}
          y={y}
          yHigh={differenceToY(offPlanDb + u)}
          yLow={differenceToY(offPlanDb - u)}
          kind={dotKind(isBeingEntered, measured.isWithMentor)}
        />
      )}
      <text
        x={dotX + 9}
        y={(isOff ? y - tip * 8 : y) + 4}
        fontWeight="700"
        fill={colour}
        stroke={token('paper')}
        strokeWidth="3"
        paintOrder="stroke"
      >
        {signed(offPlanDb)}
      </text>
    </g>
  );
}

/** Every point again as its difference from plan at ± 3.2 dB full scale, where whiskers can be read. */
export function Strip({ rows, width }: Pick<LayerProps, 'rows' | 'width'>) {
  const column = columnOf({ rows, width });
  return (
    <g>
      <g stroke={token('rule')} fill="none">
        <rect x="0" y={STRIP.top} width={width} height={STRIP.height} />
        <path d={`M0 ${differenceToY(2)}H${width}M0 ${differenceToY(-2)}H${width}`} />
      </g>
      {rows.map(({ point }, index) => {
        const top = differenceToY(point.toleranceDb);
        return (
          <rect
            key={point.id}
            x={index * column + 1}
            y={top}
            width={column - 2}
            height={differenceToY(-point.toleranceDb) - top}
            fill={token('green')}
            fillOpacity="0.2"
          />
        );
      })}
      <path d={`M0 ${STRIP.middle}H${width}`} stroke={token('green')} strokeWidth="1.6" />
      {rows.map((row, index) => (
        <StripPoint key={row.point.id} row={row} x={(index + 0.5) * column} />
      ))}
    </g>
  );
}
