import { requireWithin } from '../domain';

/** Ratings resistors are sold in, W; common practice. */
export const RESISTOR_RATINGS_WATTS: readonly number[] = [
  0.125, 0.25, 0.5, 1, 2, 3, 5, 10, 25, 50, 100, 250, 500, 1000,
];

/** A resistor is used to at most this part of its rating; common practice. */
export const DERATING = 0.5;

/** What a resistor takes and what to buy for it. */
export interface ResistorRating {
  watts: number;
  /** Absent when no single resistor of the list stands it: share the power among several. */
  ratingWatts?: number;
}

/**
 * The rating to buy for a dissipation.
 *
 * The rating holds at the temperature its maker states, with leads as short as he states; a resistor at its limit burns
 * fingers and boards.
 *
 * @param watts - 0 or more, average.
 * @param derating - largest part of the rating to use, above 0 to 1.
 * @throws OutOfDomainError naming the input.
 * @example ratingToBuy(0.171) //=> { watts: 0.171, ratingWatts: 0.5 }
 * @example ratingToBuy(900) //=> { watts: 900 }
 * @see common practice
 */
export function ratingToBuy(watts: number, derating = DERATING): ResistorRating {
  requireWithin({ input: 'watts', label: 'Dissipation', unit: 'W', atLeast: 0, atMost: 1e12 }, watts);
  requireWithin({ input: 'derating', label: 'Part of the rating used', above: 0, atMost: 1 }, derating);
  const ratingWatts = RESISTOR_RATINGS_WATTS.find((rating) => watts <= rating * derating);
  return ratingWatts === undefined ? { watts } : { watts, ratingWatts };
}
