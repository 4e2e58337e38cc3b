import { requireWithin } from './domain';
import { OutOfDomainError } from './errors';

/** Verdict of a reading against a window. */
export type Verdict = 'pass' | 'too close to call' | 'not yet';

/** Permitted values, in the unit of the reading; an end left out is open. */
export interface VerdictWindow {
  low?: number;
  high?: number;
}

/** One end of the window that the reading straddles. */
export interface StraddledEnd {
  end: 'low' | 'high';
  /** The window's end. */
  limit: number;
  /** How far the reading may reach: value less (or plus) its uncertainty. */
  reach: number;
  /** Distance of `reach` past `limit`, more than 0. */
  past: number;
  /** With the same uncertainty, this value and better passes (low end: or more; high end: or less). */
  passesFrom: number;
  /** Uncertainty at which this very value would pass; absent when the value itself is outside. */
  passesWithUncertainty?: number;
}

/**
 * Verdict with a guard band as wide as the expanded uncertainty. Nothing is rounded before judging.
 *
 * | value ± U | verdict |
 * | --- | --- |
 * | wholly inside the window, touching an end included | pass |
 * | wholly outside | not yet |
 * | otherwise | too close to call |
 *
 * @param expandedUncertainty - k = 2, 0 or more, in the unit of the value's differences.
 * @throws OutOfDomainError when a number is not finite, the uncertainty is negative, or the window has no end or is
 *   reversed.
 * @example verdictOf(0.5, 0.39, { low: 0, high: 3 }) //=> 'pass'
 * @example verdictOf(0.37, 0.47, { low: 0, high: 3 }) //=> 'too close to call'
 * @example verdictOf(-0.6, 0.47, { low: 0, high: 3 }) //=> 'not yet'
 * @see ILAC-G8:09/2019, 4.2.3 (guard band equal to the expanded uncertainty, three outcomes)
 */
export function verdictOf(value: number, expandedUncertainty: number, window: VerdictWindow): Verdict {
  const { low, high, least, most } = judged(value, expandedUncertainty, window);
  if (least >= low && most <= high) return 'pass';
  return most < low || least > high ? 'not yet' : 'too close to call';
}

/**
 * Which ends of the window a reading straddles, by how much, and what would settle it.
 *
 * @returns one entry for each end straddled; empty unless the verdict is 'too close to call'.
 * @throws OutOfDomainError as `verdictOf`.
 * @example whyTooClose(0.25, 0.5, { low: 0, high: 3 }) //=> [{ end: 'low', limit: 0, reach: -0.25, past: 0.25, passesFrom: 0.5, passesWithUncertainty: 0.25 }]
 * @example whyTooClose(1.5, 0.5, { low: 0, high: 3 }) //=> []
 */
export function whyTooClose(
  value: number,
  expandedUncertainty: number,
  window: VerdictWindow,
): StraddledEnd[] {
  if (verdictOf(value, expandedUncertainty, window) !== 'too close to call') return [];
  const { low, high, least, most } = judged(value, expandedUncertainty, window);
  const ends: StraddledEnd[] = [];
  if (least < low) {
    const past = low - least;
    ends.push({
      end: 'low',
      limit: low,
      reach: least,
      past,
      ...settledAt(value - low, low + expandedUncertainty),
    });
  }
  if (most > high) {
    const past = most - high;
    ends.push({
      end: 'high',
      limit: high,
      reach: most,
      past,
      ...settledAt(high - value, high - expandedUncertainty),
    });
  }
  return ends;
}

function settledAt(
  inside: number,
  passesFrom: number,
): Pick<StraddledEnd, 'passesFrom' | 'passesWithUncertainty'> {
  return inside > 0 ? { passesFrom, passesWithUncertainty: inside } : { passesFrom };
}

function judged(value: number, expandedUncertainty: number, window: VerdictWindow) {
  requireWithin({ input: 'value', label: 'Value' }, value);
  requireWithin({ input: 'expandedUncertainty', label: 'Uncertainty', atLeast: 0 }, expandedUncertainty);
  const { low, high } = requireWindow(window);
  return { low, high, least: value - expandedUncertainty, most: value + expandedUncertainty };
}

/** Both ends, an open one at infinity. */
function requireWindow({ low, high }: VerdictWindow): { low: number; high: number } {
  if (low === undefined && high === undefined) {
    const permitted = 'a low end, a high end or both';
    throw new OutOfDomainError('window', undefined, permitted, `A window needs ${permitted}.`);
  }
  if (low !== undefined) requireWithin({ input: 'low', label: 'Low end of the window' }, low);
  if (high !== undefined)
    requireWithin({ input: 'high', label: 'High end of the window', atLeast: low }, high);
  return { low: low ?? -Infinity, high: high ?? Infinity };
}
