/** Builds counted by their figure. */
export interface Histogram {
  /** Where the first bar begins, and how wide each is. */
  from: number;
  step: number;
  counts: number[];
}

const BARS = 16;
const STEPS = [0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10];

/** Counts figures in bars of a round width, about sixteen of them. */
export function histogramOf(figures: Float64Array): Histogram {
  const least = figures.reduce((a, b) => Math.min(a, b), Infinity);
  const most = figures.reduce((a, b) => Math.max(a, b), -Infinity);
  const step = STEPS.find((one) => (most - least) / one <= BARS) ?? Math.ceil((most - least) / BARS);
  const first = Math.floor(least / step);
  const counts = new Array<number>(Math.floor(most / step) - first + 1).fill(0);
  for (const figure of figures) counts[Math.floor(figure / step) - first] += 1;
  return { from: first * step, step, counts };
}

/** Round figures for an axis, about five of them. */
export function axisFigures(from: number, to: number): number[] {
  const step = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50].find((one) => (to - from) / one <= 5) ?? 100;
  const first = Math.ceil(from / step);
  return Array.from(
    { length: Math.floor(to / step) - first + 1 },
    (_figure, index) => (first + index) * step,
  );
}
