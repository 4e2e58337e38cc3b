import { frequencyGrid } from '@ferrite-row/levels';

/** The plot's frequency axis, from 0. */
export interface Axis {
  endHertz: number;
  /** Between figures; a tenth of it is the finer step. */
  stepHertz: number;
}

/** The design's 4.2 times the carrier holds the harmonics up to the fourth. */
const TIMES_CARRIER = 4.2;
const MOST_STEPS = 8;
/** Points a step: a multiple of ten, so that the finer steps fall on them. */
const POINTS_A_STEP = 40;

/** From 0 to 4.2 times the carrier, rounded up to a whole step of 1, 2 or 5. */
export function axisFor(carrierHertz: number): Axis {
  const reach = TIMES_CARRIER * carrierHertz;
  const decade = 10 ** Math.floor(Math.log10(reach / MOST_STEPS));
  const stepHertz = [1, 2, 5, 10].map((one) => one * decade).find((step) => reach / step <= MOST_STEPS);
  const step = stepHertz ?? 10 * decade;
  return { stepHertz: step, endHertz: Math.ceil(reach / step) * step };
}

const NEAR_POINTS = 101;

/**
 * Where the response is worked out: evenly along the axis, closer in a narrow passband, and at every frequency that
 * matters.
 * @returns rising, each once.
 */
export function plotFrequencies(
  { endHertz, stepHertz }: Axis,
  matters: readonly number[],
  passband?: { lowHertz: number; highHertz: number },
): Float64Array {
  const spacing = stepHertz / POINTS_A_STEP;
  const even = Array.from(
    { length: Math.round(endHertz / spacing) },
    (_point, index) => (index + 1) * spacing,
  );
  const near = passband ? frequencyGrid(passband.lowHertz, passband.highHertz, NEAR_POINTS) : [];
  return Float64Array.from(new Set([...even, ...near, ...matters])).sort();
}

/** The index of a frequency, or of the nearest to it. */
export function nearestIndex(hertz: Float64Array, wanted: number): number {
  let best = 0;
  hertz.forEach((one, index) => {
    if (Math.abs(one - wanted) < Math.abs((hertz[best] ?? Infinity) - wanted)) best = index;
  });
  return best;
}
