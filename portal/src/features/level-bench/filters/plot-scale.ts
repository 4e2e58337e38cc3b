import type { Axis } from './frequencies';

/** The design's two panels: gain 0 to −70 dB, return loss 0 at the top to 40 at the foot. */
export const LEAST_GAIN_DB = -70;
export const MOST_RETURN_LOSS_DB = 40;
export const GUTTER = 64;
export const GAIN = { top: 22, bottom: 325 };
export const RETURN = { top: 360, bottom: 478 };
export const HEIGHT = 500;
/** What hangs over the plot's right edge: half of the last figure. */
const RIGHT = 10;

/** What leaves the scale is held just outside of it, where it is cut off. */
const held = (share: number): number => Math.min(Math.max(share, -0.01), 1.03);

export const gainToY = (db: number): number => GAIN.top + held(db / LEAST_GAIN_DB) * (GAIN.bottom - GAIN.top);

export const returnToY = (db: number): number =>
  RETURN.top + held(db / MOST_RETURN_LOSS_DB) * (RETURN.bottom - RETURN.top);

export type ToX = (hertz: number) => number;

export const hertzToX =
  (axis: Axis, width: number): ToX =>
  (hertz) =>
    GUTTER + (hertz / axis.endHertz) * (width - GUTTER - RIGHT);

export const xToHertz = (axis: Axis, width: number, x: number): number =>
  Math.min(Math.max((x - GUTTER) / (width - GUTTER - RIGHT), 0), 1) * axis.endHertz;

/** Multiples of a step from 0 to an end. */
export const steps = (step: number, end: number): number[] =>
  Array.from({ length: Math.round(end / step) + 1 }, (_step, index) => index * step);

const point = (x: number, y: number): string => `${x.toFixed(1)} ${y.toFixed(1)}`;

/** A line through figures over frequency. */
export const linePath = (
  hertz: Float64Array,
  figures: Float64Array,
  x: ToX,
  y: (db: number) => number,
): string =>
  Array.from(hertz, (one, index) => `${index === 0 ? 'M' : 'L'}${point(x(one), y(figures[index]))}`).join('');

/** The area between two lines over the same frequencies. */
export function bandPath(
  hertz: Float64Array,
  low: Float64Array,
  high: Float64Array,
  x: ToX,
  y: (db: number) => number,
): string {
  const back = Array.from(hertz, (one, index) => `L${point(x(one), y(high[index]))}`).reverse();
  return `${linePath(hertz, low, x, y)}${back.join('')}Z`;
}
