import { columnOf, type LayerProps } from './layers';
import { dotKind, LevelDot } from './level-dot';

export function Measured({ rows, width, y }: LayerProps) {
  const column = columnOf({ rows, width });
  return rows.map(({ point, measured, isBeingEntered }, index) => {
    if (!measured) return null;
    const { levelDbm, expandedUncertaintyDb, isWithMentor } = measured;
    return (
      <LevelDot
        key={point.id}
        x={(index + 0.5) * column}
        y={y(levelDbm)}
        yHigh={y(levelDbm + expandedUncertaintyDb)}
        yLow={y(levelDbm - expandedUncertaintyDb)}
        kind={dotKind(isBeingEntered, isWithMentor)}
        cap={6}
      />
    );
  });
}
