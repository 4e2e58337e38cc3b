import { useId } from 'react';
import { token } from '../tokens';
import { columnOf, Gains, Grid, Headroom, Plan, type LayerProps } from './layers';
import { HEIGHT, NAMES, PLOT } from './level-scale';
import { twoLines } from './level-words';
import { Measured } from './measured-layer';
import { Strip } from './strip-layer';

interface ColumnsProps extends LayerProps {
  /** Bold under its column, and tinted while a reading is being entered there. */
  currentId?: string;
  /** Outlined for the keyboard. */
  focused?: number;
  onPress?: (id: string) => void;
}

function Names({ rows, width, currentId }: ColumnsProps) {
  const column = columnOf({ rows, width });
  return rows.map(({ point }, index) => {
    const isCurrent = point.id === currentId;
    const [first, second] = twoLines(point.name);
    return (
      <text
        key={point.id}
        textAnchor="middle"
        fontWeight={isCurrent ? 700 : 600}
        fill={token(isCurrent ? 'ink' : 'ink2')}
      >
        <tspan x={(index + 0.5) * column} y={NAMES.first}>
          {first}
        </tspan>
        <tspan x={(index + 0.5) * column} y={NAMES.second}>
          {second}
        </tspan>
      </text>
    );
  });
}

/** The plot, its gains, the strip and the names, from the tint at the back to the dots in front. */
export function Columns(props: ColumnsProps) {
  const { rows, width, focused, onPress } = props;
  const hatchId = useId();
  const column = columnOf(props);
  const tall = { y: PLOT.top, width: column, height: HEIGHT - PLOT.top };
  return (
    <svg
      width={width}
      height={HEIGHT}
      aria-hidden
      fontSize="10.5"
      style={{ display: 'block', overflow: 'visible' }}
    >
      <defs>
        <pattern
          id={hatchId}
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V5" stroke={token('brassFill')} strokeWidth="1.2" strokeOpacity="0.75" />
        </pattern>
      </defs>
      {rows.map(
        ({ point, isBeingEntered }, index) =>
          isBeingEntered && <rect key={point.id} x={index * column} {...tall} fill={token('copperTint')} />,
      )}
      <Grid {...props} />
      <Headroom {...props} hatchId={hatchId} />
      <Plan {...props} />
      <Gains {...props} />
      <Measured {...props} />
      <Strip {...props} />
      <Names {...props} />
      {focused !== undefined && (
        <rect
          x={focused * column + 1}
          y={PLOT.top + 1}
          width={column - 2}
          height={HEIGHT - PLOT.top - 2}
          fill="none"
          stroke={token('green')}
          strokeWidth="2"
        />
      )}
      {onPress &&
        rows.map(({ point }, index) => (
          <rect
            key={point.id}
            x={index * column}
            {...tall}
            fill="transparent"
            style={{ cursor: 'pointer' }}
            onClick={() => onPress(point.id)}
          />
        ))}
    </svg>
  );
}
