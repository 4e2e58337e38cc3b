import { requireOneOf, requireWithin } from '../domain';
import { nearestPreferred, preferredBetween, preferredNeighbours } from './preferred-values';
import type { PreferredSeries } from './preferred-values';

/** Quantities made up from preferred values; how two of them combine depends on it. */
export type PartQuantity = 'resistance' | 'capacitance' | 'inductance';

/** A wanted value made up from one preferred value or two. */
export interface FittedPart {
  /** One or two preferred values, the larger first. */
  parts: number[];
  arrangement: 'one part' | 'parallel' | 'series';
  /** What they make together. */
  value: number;
  /** Relative to what was wanted. */
  errorRel: number;
}

/** How a value may be made up. */
export interface FitChoice {
  series: PreferredSeries;
  /** Most parts to use; 1 where left out. */
  atMostParts?: 1 | 2;
  /** One part is enough when it comes this near; {@link ENOUGH_REL} where left out. */
  enoughRel?: number;
  /** What two parts may be; both where left out. */
  arrangements?: readonly ('parallel' | 'series')[];
}

/** Nearer than this nobody fits a second part; common practice, half the tolerance of a good part. */
export const ENOUGH_REL = 0.01;

/** A second part this much smaller than the first in what it adds is lost in the first one's tolerance. */
const LEAST_SHARE = 0.01;

/** The first part gives half or more, or a little less when the second is rounded up. */
const BEYOND_HALF = 2.2;

/**
 * The nearest value that one preferred part, or two in parallel or series, can make.
 *
 * @param wanted - in any unit; the result is in the same.
 * @returns one part when it comes within `enoughRel`, or when two come no nearer.
 * @throws OutOfDomainError when the value is outside 1e−15 to 1e15 or a choice is not offered.
 * @example fittedPart(370, 'capacitance', { series: 'E6', atMostParts: 2 }) //=> { parts: [220, 150], arrangement: 'parallel', value: 370, errorRel: 0 }
 * @example fittedPart(292.4, 'resistance', { series: 'E24' }).parts //=> [300]
 * @see IEC 60063:2015 for the values; two parts by Kirchhoff's laws
 */
export function fittedPart(wanted: number, quantity: PartQuantity, choice: FitChoice): FittedPart {
  const { series, atMostParts = 1, enoughRel = ENOUGH_REL } = choice;
  requireOneOf(
    { input: 'quantity', label: 'Quantity' },
    ['resistance', 'capacitance', 'inductance'],
    quantity,
  );
  requireOneOf({ input: 'atMostParts', label: 'Parts' }, [1, 2], atMostParts);
  requireWithin({ input: 'enoughRel', label: 'Near enough', atLeast: 0, atMost: 1 }, enoughRel);
  const single = nearestPreferred(wanted, series);
  const one: FittedPart = { parts: [single.value], arrangement: 'one part', ...single };
  if (atMostParts === 1 || Math.abs(one.errorRel) <= enoughRel) return one;
  const { arrangements = ['parallel', 'series'] } = choice;
  const pairs = arrangements.map((arrangement) => nearestPair(wanted, quantity, series, arrangement));
  return pairs.reduce((best, pair) => (isNearer(pair, best) ? pair : best), one);
}

/** Differences under this are binary noise. */
const NOISE_REL = 1e-9;

function isNearer(pair: FittedPart, best: FittedPart): boolean {
  return Math.abs(pair.errorRel) < Math.abs(best.errorRel) - NOISE_REL;
}

/** Capacitors add in parallel, resistors and coils in series; the other way their reciprocals add. */
function nearestPair(
  wanted: number,
  quantity: PartQuantity,
  series: PreferredSeries,
  arrangement: 'parallel' | 'series',
): FittedPart {
  const isSum = (quantity === 'capacitance') === (arrangement === 'parallel');
  const together = isSum ? (a: number, b: number) => a + b : (a: number, b: number) => 1 / (1 / a + 1 / b);
  const rest = isSum ? (a: number) => wanted - a : (a: number) => 1 / (1 / wanted - 1 / a);
  const [low, high] = isSum
    ? [wanted / BEYOND_HALF, wanted * (1 - LEAST_SHARE)]
    : [wanted / (1 - LEAST_SHARE), wanted * BEYOND_HALF];
  let best = { parts: [wanted], value: Infinity, errorRel: Infinity };
  for (const first of preferredBetween(low, high, series)) {
    const { below, above } = preferredNeighbours(rest(first), series);
    for (const second of [below, above]) {
      const value = together(first, second);
      const errorRel = value / wanted - 1;
      // Of pairs as near, the one first met has the more equal parts, which share the load.
      if (Math.abs(errorRel) < Math.abs(best.errorRel) - NOISE_REL)
        best = { parts: [first, second], value, errorRel };
    }
  }
  return { ...best, parts: best.parts.sort((a, b) => b - a), arrangement };
}
