import { requireOneOf, requireWithin } from '../domain';

/** Series of preferred values; the number is how many there are in a decade. */
export type PreferredSeries = 'E3' | 'E6' | 'E12' | 'E24' | 'E48' | 'E96';

/** Every series offered, coarsest first. */
export const PREFERRED_SERIES: readonly PreferredSeries[] = ['E3', 'E6', 'E12', 'E24', 'E48', 'E96'];

// IEC 60063:2015. E24 is historic and does not follow the rounding rule, E12 to E3 are thinned from it.
const E24 = [
  100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430, 470, 510, 560, 620, 680,
  750, 820, 910,
];

/** Any value a part may have, in whatever unit: only keeps results finite. */
const VALUE = { input: 'value', label: 'Value', atLeast: 1e-15, atMost: 1e15 };

/**
 * Significands of a series, 1.00 to under 10, rising.
 *
 * @throws OutOfDomainError for a series that is not offered.
 * @example preferredSignificands('E6') //=> [1, 1.5, 2.2, 3.3, 4.7, 6.8]
 * @see IEC 60063:2015; E48 and E96 by its rounding rule, 10^(i/N) to three digits
 */
export function preferredSignificands(series: PreferredSeries): readonly number[] {
  return hundredths(series).map((value) => value / 100);
}

/** Worked out once for each series: fitting two parts asks some hundred times. */
const known = new Map<PreferredSeries, readonly number[]>();

function hundredths(series: PreferredSeries): readonly number[] {
  const found = known.get(series);
  if (found !== undefined) return found;
  requireOneOf({ input: 'series', label: 'Series of preferred values' }, PREFERRED_SERIES, series);
  const count = Number(series.slice(1));
  const made =
    count <= 24
      ? E24.filter((_value, index) => index % (24 / count) === 0)
      : Array.from({ length: count }, (_value, index) => Math.round(100 * 10 ** (index / count)));
  known.set(series, made);
  return made;
}

/** The preferred values on either side; both are the value itself when it is preferred. */
export interface PreferredNeighbours {
  below: number;
  above: number;
}

/**
 * The nearest preferred values not above and not below a value.
 *
 * @param value - any unit, 1e−15 to 1e15.
 * @throws OutOfDomainError outside that.
 * @example preferredNeighbours(247.5, 'E24') //=> { below: 240, above: 270 }
 * @see IEC 60063:2015
 */
export function preferredNeighbours(value: number, series: PreferredSeries): PreferredNeighbours {
  requireWithin(VALUE, value);
  // The twelfth digit is binary noise: 0.47 from an arithmetic must find 0.47.
  const [digits = '1', exponent = '0'] = value.toExponential(11).split('e');
  const sought = Number(digits) * 100;
  const decade = Number(exponent);
  const values = hundredths(series);
  const next = values.findIndex((preferred) => preferred >= sought - 1e-9);
  const above = preferredOf(next === -1 ? 1000 : (values[next] ?? 1000), decade);
  const isPreferred = next !== -1 && (values[next] ?? 0) <= sought + 1e-9;
  return {
    below: isPreferred ? above : preferredOf(values.at(next === -1 ? -1 : next - 1) ?? 100, decade),
    above,
  };
}

/** Written as a decimal, so that 0.47 is exactly what a member would type. */
function preferredOf(hundredth: number, decade: number): number {
  return Number(`${hundredth}e${decade - 2}`);
}

/**
 * Preferred values from one bound to another, both included, rising.
 *
 * @throws OutOfDomainError when a bound is outside 1e−15 to 1e15.
 * @example preferredBetween(90, 200, 'E6') //=> [100, 150]
 */
export function preferredBetween(low: number, high: number, series: PreferredSeries): number[] {
  requireWithin({ ...VALUE, input: 'low' }, low);
  requireWithin({ ...VALUE, input: 'high' }, high);
  const values: number[] = [];
  for (let exponent = Math.floor(Math.log10(low)); exponent <= Math.log10(high); exponent++) {
    const decade = hundredths(series).map((hundredth) => preferredOf(hundredth, exponent));
    values.push(...decade.filter((value) => value >= low && value <= high));
  }
  return values;
}

/** A preferred value and how far it is from what was wanted. */
export interface NearestPreferred {
  value: number;
  /** Relative: 0.02 is 2 % too much. */
  errorRel: number;
}

/**
 * The preferred value with the smallest difference; of two as near, the smaller.
 *
 * @param by - what is smallest: the difference, or the ratio (which matters only in the middle between two values).
 * @throws OutOfDomainError when the value is outside 1e−15 to 1e15.
 * @example nearestPreferred(17.61, 'E24').value //=> 18
 * @example nearestPreferred(1050, 'E24', 'ratio').value //=> 1100
 * @see IEC 60063:2015
 */
export function nearestPreferred(
  value: number,
  series: PreferredSeries,
  by: 'difference' | 'ratio' = 'difference',
): NearestPreferred {
  const { below, above } = preferredNeighbours(value, series);
  const isBelow = by === 'ratio' ? value * value <= below * above : value - below <= above - value;
  const nearest = isBelow ? below : above;
  return { value: nearest, errorRel: nearest / value - 1 };
}
