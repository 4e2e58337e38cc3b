import fc from 'fast-check';

/**
 * Numbers spread evenly from one bound to the other, both included.
 *
 * The library's own doubles are spread evenly over their bit patterns, so that from 0 on nearly all of them are next to
 * nothing: a property about sums or uncertainties would then hold for any code.
 */
export function between(low: number, high: number): fc.Arbitrary<number> {
  const steps = 1_000_000;
  return fc.integer({ min: 0, max: steps }).map((step) => low + ((high - low) * step) / steps);
}
