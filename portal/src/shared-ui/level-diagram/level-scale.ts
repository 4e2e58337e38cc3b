import type { LevelRow } from './level-rows';

const GRID_DB = 10;
const OVER_LIMIT_DB = 5;

/** Full scale of the strip of differences, either way. */
export const STRIP_DB = 3.2;

/** Heights of the parts of the drawing, in pixels from its top. */
export const PLOT = { top: 8, height: 328, bottom: 336 };
export const GAINS = { planned: 361, measured: 373 };
export const STRIP = { top: 384, height: 108, bottom: 492, middle: 438 };
export const NAMES = { first: 507, second: 520 };
export const HEIGHT = 532;
export const GUTTER = 56;
export const LEAST_COLUMN = 64;

export interface LevelRange {
  lowDbm: number;
  highDbm: number;
}

/**
 * From the lowest tolerance, rounded down to the grid, to 5 dB over the highest limit, rounded up; a reading outside
 * of that widens it, so that no point is lost.
 */
export function rangeOf(rows: readonly LevelRow[]): LevelRange {
  const lows = rows.flatMap(({ point, measured }) => [
    point.planDbm - point.toleranceDb,
    measured?.levelDbm ?? Infinity,
  ]);
  const highs = rows.flatMap(({ point, measured }) => [
    (point.limitDbm ?? point.planDbm + point.toleranceDb) + OVER_LIMIT_DB,
    measured?.levelDbm ?? -Infinity,
  ]);
  return {
    lowDbm: Math.floor(Math.min(...lows) / GRID_DB) * GRID_DB,
    highDbm: Math.ceil(Math.max(...highs) / GRID_DB) * GRID_DB,
  };
}

/** Grid levels from high to low. */
export function gridOf({ lowDbm, highDbm }: LevelRange, step = GRID_DB): number[] {
  const top = Math.floor(highDbm / step) * step;
  return Array.from({ length: Math.floor((top - lowDbm) / step) + 1 }, (_, index) => top - index * step);
}

/** Vertical place of a level in a plot of this top and height. */
export const levelToY =
  ({ lowDbm, highDbm }: LevelRange, plot: { top: number; height: number } = PLOT) =>
  (dbm: number): number =>
    plot.top + ((highDbm - dbm) / (highDbm - lowDbm)) * plot.height;

/** Vertical place of a difference from plan in the strip; what is off its scale stands at the edge. */
export function differenceToY(db: number): number {
  const shown = Math.max(-STRIP_DB, Math.min(STRIP_DB, db));
  return STRIP.middle - (shown / STRIP_DB) * (STRIP.height / 2);
}

/** The stepped plan line: flat at each planned level, vertical at each boundary. */
export function stepPath(levels: readonly number[], y: (dbm: number) => number, columnWidth: number): string {
  return levels
    .map((dbm, index) => `${index === 0 ? `M0 ${y(dbm)}` : `V${y(dbm)}`}H${(index + 1) * columnWidth}`)
    .join('');
}
