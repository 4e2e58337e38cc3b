import { requireWithin } from '../domain';
import { hertz } from '../units';

/** Boltzmann's constant, J/K; exact since the SI of 2019. */
const BOLTZMANN = 1.380649e-23;

/** Reference temperature of a noise figure, K. */
export const REFERENCE_KELVIN = 290;

/**
 * Level of thermal noise in a bandwidth, raised by a noise figure.
 *
 * @param kelvin - of the source; 290 where left out, for which a noise figure is defined.
 * @returns dBm.
 * @throws OutOfDomainError naming the input.
 * @example noiseDbm(2400, 10) //=> -130.173075
 * @see N = k·T·B·F, k exact by the SI of 2019
 */
export function noiseDbm(bandwidthHertz: number, noiseFigureDb = 0, kelvin = REFERENCE_KELVIN): number {
  const bandwidth = hertz(bandwidthHertz, 'bandwidthHertz');
  requireWithin(
    { input: 'noiseFigureDb', label: 'Noise figure', unit: 'dB', atLeast: 0, atMost: 200 },
    noiseFigureDb,
  );
  requireWithin({ input: 'kelvin', label: 'Temperature', unit: 'K', above: 0, atMost: 1e6 }, kelvin);
  return 10 * Math.log10(BOLTZMANN * kelvin * bandwidth * 1000) + noiseFigureDb;
}

/**
 * Noise temperature of a noise figure.
 *
 * @returns kelvin.
 * @throws OutOfDomainError when it is not 0 to 200 dB.
 * @example noiseKelvin(3) //=> 288.626071
 * @see Te = 290·(F − 1); textbook
 */
export function noiseKelvin(noiseFigureDb: number): number {
  requireWithin(
    { input: 'noiseFigureDb', label: 'Noise figure', unit: 'dB', atLeast: 0, atMost: 200 },
    noiseFigureDb,
  );
  return REFERENCE_KELVIN * (10 ** (noiseFigureDb / 10) - 1);
}
