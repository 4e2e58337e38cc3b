import { requireWithin } from './domain';

/** Coverage factor of every expanded uncertainty here: about 95 % for a normal distribution (JCGM 100:2008, 6.3.3). */
export const COVERAGE_FACTOR = 2;

/** How the values within a limit are spread. */
export type Distribution = 'rectangular' | 'triangular' | 'U-shaped' | 'normal, k = 2' | 'standard';

// Limit over standard uncertainty. JCGM 100:2008: 4.3.7 rectangular, 4.3.9 triangular, 4.3.3 normal at k = 2; U-shaped
// for mismatch is the practice of radio-frequency metrology. Clause numbers from memory.
const DIVISOR: Record<Distribution, number> = {
  rectangular: Math.sqrt(3),
  triangular: Math.sqrt(6),
  'U-shaped': Math.SQRT2,
  'normal, k = 2': 2,
  standard: 1,
};

/** One source of uncertainty, in the unit of the budget (dB for a level). */
export interface UncertaintySource {
  name: string;
  /** Half width of the distribution, at least 0. */
  limit: number;
  distribution: Distribution;
}

/** A source with what it contributes. */
export interface UncertaintyComponent extends UncertaintySource {
  standardUncertainty: number;
}

/** The sources and their root-sum-square. */
export interface UncertaintyBudget {
  components: UncertaintyComponent[];
  standardUncertainty: number;
  /** k = 2. */
  expandedUncertainty: number;
}

/**
 * Combines independent sources by root-sum-square and expands with k = 2.
 *
 * @param sources - one unit throughout; may be empty, which gives zeros.
 * @returns the components in the order given.
 * @throws OutOfDomainError when a limit is negative or not finite.
 * @example uncertaintyBudget([{ name: 'scale', limit: 0.3, distribution: 'standard' }, { name: 'pad', limit: 0.4, distribution: 'standard' }]).expandedUncertainty //=> 1
 * @see JCGM 100:2008 (GUM), 5.1.2 and 6.2
 */
export function uncertaintyBudget(sources: readonly UncertaintySource[]): UncertaintyBudget {
  const components = sources.map((source) => ({
    ...source,
    standardUncertainty: standardUncertaintyOf(source),
  }));
  const standardUncertainty = Math.hypot(...components.map((component) => component.standardUncertainty));
  return { components, standardUncertainty, expandedUncertainty: COVERAGE_FACTOR * standardUncertainty };
}

function standardUncertaintyOf({ name, limit, distribution }: UncertaintySource): number {
  requireWithin({ input: name, label: `Limit of ${name}`, atLeast: 0, atMost: 1e30 }, limit);
  return limit / DIVISOR[distribution];
}

// A tolerance t of a voltage moves its level by 20 log10(1 ± t). The two sides differ (3 %: +0.257 and −0.265 dB); the
// first-order term lies between them and is what the GUM's law of propagation asks for. It holds to about 0.25.
const DB_PER_VOLTAGE_TOLERANCE = 20 / Math.LN10;
const DB_PER_POWER_TOLERANCE = 10 / Math.LN10;

const tolerance = { atLeast: 0, atMost: 0.25 };

/**
 * Decibels of a relative tolerance of a voltage, to first order.
 *
 * @param relative - 0.03 for 3 %.
 * @throws OutOfDomainError below 0 or above 0.25, where decibels are no longer linear.
 * @example dbFromVoltageTolerance(0.03) //=> 0.260577
 * @see JCGM 100:2008, 5.1.2
 */
export function dbFromVoltageTolerance(relative: number, input = 'tolerance'): number {
  return (
    DB_PER_VOLTAGE_TOLERANCE * requireWithin({ input, label: 'Relative tolerance', ...tolerance }, relative)
  );
}

/**
 * Decibels of a relative tolerance of a power, or of the resistance it is worked out in, to first order.
 *
 * @param relative - 0.01 for 1 %.
 * @throws OutOfDomainError below 0 or above 0.25.
 * @example dbFromPowerTolerance(0.01) //=> 0.043429
 * @see JCGM 100:2008, 5.1.2
 */
export function dbFromPowerTolerance(relative: number, input = 'tolerance'): number {
  return (
    DB_PER_POWER_TOLERANCE * requireWithin({ input, label: 'Relative tolerance', ...tolerance }, relative)
  );
}
