import { requireWithin } from '../domain';
import { hertz } from '../units';

const HENRIES = { input: 'henries', label: 'Inductance', unit: 'H', above: 0, atMost: 1e6 };
const FARADS = { input: 'farads', label: 'Capacitance', unit: 'F', above: 0, atMost: 1e6 };

const radians = (frequency: number) => 2 * Math.PI * hertz(frequency);

/**
 * Resonant frequency of a coil and a capacitor.
 *
 * @returns Hz.
 * @throws OutOfDomainError naming the input.
 * @example resonantHertz(1e-6, 100e-12) //=> 15915494.30919
 * @see f = 1/(2π√(LC)); textbook
 */
export function resonantHertz(henries: number, farads: number): number {
  return hertz(
    1 / (2 * Math.PI * Math.sqrt(requireWithin(HENRIES, henries) * requireWithin(FARADS, farads))),
  );
}

/**
 * Coil that resonates with a capacitor.
 *
 * @returns henry.
 * @throws OutOfDomainError naming the input.
 * @example 1e6 * resonatingHenries(7.1e6, 100e-12) //=> 5.024855
 * @see L = 1/(ω²C); textbook
 */
export function resonatingHenries(frequencyHertz: number, farads: number): number {
  return 1 / (radians(frequencyHertz) ** 2 * requireWithin(FARADS, farads));
}

/**
 * Capacitor that resonates with a coil.
 *
 * @returns farad.
 * @throws OutOfDomainError naming the input.
 * @example 1e12 * resonatingFarads(7.1e6, 5.024855e-6) //=> 100.000007
 * @see C = 1/(ω²L); textbook
 */
export function resonatingFarads(frequencyHertz: number, henries: number): number {
  return 1 / (radians(frequencyHertz) ** 2 * requireWithin(HENRIES, henries));
}

/**
 * Reactance of a coil.
 *
 * @returns ohms, above 0.
 * @throws OutOfDomainError naming the input.
 * @example inductiveReactance(7e6, 1e-6) //=> 43.982297
 * @see X = ωL; textbook
 */
export function inductiveReactance(frequencyHertz: number, henries: number): number {
  return radians(frequencyHertz) * requireWithin(HENRIES, henries);
}

/**
 * Reactance of a capacitor.
 *
 * @returns ohms, below 0.
 * @throws OutOfDomainError naming the input.
 * @example capacitiveReactance(7e6, 100e-12) //=> -227.364204
 * @see X = −1/(ωC); textbook
 */
export function capacitiveReactance(frequencyHertz: number, farads: number): number {
  return -1 / (radians(frequencyHertz) * requireWithin(FARADS, farads));
}

/**
 * Q of a coil from the resistance in series with it.
 *
 * @throws OutOfDomainError naming the input.
 * @example coilQ(7.1e6, 2.2e-6, 0.6) //=> 163.572257
 * @see Q = ωL/R; textbook
 */
export function coilQ(frequencyHertz: number, henries: number, seriesOhms: number): number {
  const domain = {
    input: 'seriesOhms',
    label: 'Resistance of the coil',
    unit: 'ohm',
    atLeast: 1e-9,
    atMost: 1e9,
  };
  return inductiveReactance(frequencyHertz, henries) / requireWithin(domain, seriesOhms);
}

/**
 * Loaded Q of a resonator from its half-power bandwidth.
 *
 * @throws OutOfDomainError naming the input.
 * @example loadedQ(7.1e6, 50e3) //=> 142
 * @see Q = f/B; textbook
 */
export function loadedQ(centreHertz: number, bandwidthHertz: number): number {
  const centre = hertz(centreHertz, 'centreHertz');
  return centre / hertz(bandwidthHertz, 'bandwidthHertz');
}

/**
 * Insertion loss of one resonator, coupled alike at both ends.
 *
 * @param unloadedQ - above the loaded one.
 * @returns dB.
 * @throws OutOfDomainError naming the input.
 * @example resonatorLossDb(20, 200) //=> 0.91515
 * @see −20 log10(1 − QL/Qu); textbook
 */
export function resonatorLossDb(loaded: number, unloadedQ: number): number {
  requireWithin({ input: 'loaded', label: 'Loaded Q', above: 0, atMost: 1e9 }, loaded);
  requireWithin(
    { input: 'unloadedQ', label: 'Unloaded Q', above: loaded * (1 + 1e-9), atMost: 1e12 },
    unloadedQ,
  );
  return -20 * Math.log10(1 - loaded / unloadedQ);
}
