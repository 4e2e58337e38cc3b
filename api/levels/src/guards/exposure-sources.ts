import { requireSome, requireWithin } from '../domain';

/** Several sources at one place, each as the part of its own limit that it takes. */
export interface ExposureSum {
  sum: number;
  isWithinLimits: boolean;
  /** For one source more; 0 where nothing is left. */
  left: number;
}

/** Parts that add up to 1 in decimals do so whatever binary fractions leave over. */
const DUST = 1e-12;

/**
 * Several sources of exposure together: their parts of the limit add up, and the sum is not to pass 1.
 *
 * @param parts - of each source: power density over the limit at its frequency, or ERP over its threshold; up to 50.
 * @throws OutOfDomainError naming the input.
 * @example exposureSum([0.4, 0.35, 0.3]) //=> { sum: 1.05, isWithinLimits: false, left: 0 }
 * @see 47 CFR 1.1307(b)(3)(ii)(B), text of 2026-09-23; ICNIRP (2020) says the same of simultaneous exposure, from memory
 */
export function exposureSum(parts: readonly number[]): ExposureSum {
  requireSome({ input: 'parts', label: 'Sources' }, parts, 50);
  const each = { input: 'parts', label: 'Part of the limit', atLeast: 0, atMost: 1e6 };
  const sum = parts.reduce((total, part) => total + requireWithin(each, part), 0);
  const isWithinLimits = sum <= 1 + DUST;
  return { sum, isWithinLimits, left: sum >= 1 - DUST ? 0 : 1 - sum };
}

const EXEMPT_WATTS = 1e-3;

/**
 * Whether a source is too weak to ask for an evaluation in the United States, at any distance.
 *
 * @param averageWatts - the most that is available, averaged over time.
 * @throws OutOfDomainError naming the input.
 * @example isExemptByPower(1e-3) //=> true
 * @see 47 CFR 1.1307(b)(3)(i)(A), text of 2026-09-23
 */
export function isExemptByPower(averageWatts: number): boolean {
  const domain = { input: 'averageWatts', label: 'Average power', unit: 'W', atLeast: 0, atMost: 1e9 };
  return requireWithin(domain, averageWatts) <= EXEMPT_WATTS;
}

/** Of free space as the rule rounds it, ohm. */
const FREE_SPACE_OHMS = 377;

/**
 * Power density of a plane wave with an electric field.
 *
 * @param voltsPerMetre - rms.
 * @returns mW/cm².
 * @throws OutOfDomainError naming the input.
 * @example densityOfField(61.4) //=> 0.999989
 * @see 47 CFR 1.1307(b)(2): E²/377 ohm, text of 2026-09-23
 */
export function densityOfField(voltsPerMetre: number): number {
  const domain = { input: 'voltsPerMetre', label: 'Electric field', unit: 'V/m', atLeast: 0, atMost: 1e6 };
  return requireWithin(domain, voltsPerMetre) ** 2 / FREE_SPACE_OHMS / 10;
}
