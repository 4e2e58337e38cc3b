import { requireOneOf, requireWithin } from '../domain';
import { hertz } from '../units';

/** How an emission lies about its carrier (for a single sideband: about the suppressed one). */
export type EmissionSide = 'upper' | 'lower' | 'both';

/** From and to, Hz. */
export interface OccupiedBand {
  lowHertz: number;
  highHertz: number;
}

/**
 * The frequencies an emission takes up.
 *
 * @param carrierHertz - what the dial shows; of a single sideband the suppressed carrier.
 * @param bandwidthHertz - the whole of it: twice the highest tone for both sidebands.
 * @throws OutOfDomainError naming the input.
 * @example occupiedBand(14.348e6, 'upper', 3000) //=> { lowHertz: 14348000, highHertz: 14351000 }
 * @example occupiedBand(7.1e6, 'both', 6000) //=> { lowHertz: 7097000, highHertz: 7103000 }
 * @see 47 CFR 97.307(b): the whole emission must lie inside, not only its carrier
 */
export function occupiedBand(carrierHertz: number, side: EmissionSide, bandwidthHertz: number): OccupiedBand {
  const carrier = hertz(carrierHertz, 'carrierHertz');
  requireOneOf({ input: 'side', label: 'Sideband' }, ['upper', 'lower', 'both'], side);
  const domain = { input: 'bandwidthHertz', label: 'Bandwidth', unit: 'Hz', above: 0, atMost: carrier };
  requireWithin(domain, bandwidthHertz);
  if (side === 'upper') return { lowHertz: carrier, highHertz: carrier + bandwidthHertz };
  if (side === 'lower') return { lowHertz: carrier - bandwidthHertz, highHertz: carrier };
  return { lowHertz: carrier - bandwidthHertz / 2, highHertz: carrier + bandwidthHertz / 2 };
}
