/**
 * A match better than this is given no figure: 1e−9 of the voltage comes back, far below what any bench can see, and
 * the logarithm runs away.
 */
const PERFECT_REFLECTION = 1e-9;

/**
 * Return loss of a reflection, for results that go without a figure where the match is perfect.
 *
 * @param reflection - size of the reflection coefficient, 0 to 1.
 * @returns dB; undefined for a perfect match.
 */
export function returnLossOrNone(reflection: number): number | undefined {
  return reflection < PERFECT_REFLECTION ? undefined : Math.abs(20 * Math.log10(reflection));
}
