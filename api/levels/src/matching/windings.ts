import { requireWithin } from '../domain';
import { hertz } from '../units';

const METRES_PER_INCH = 0.0254;

/** A coil of one layer on a round former. */
export interface SingleLayerCoil {
  /** To the middle of the wire. */
  diameterMetres: number;
  /** Of the winding; at least 0.4 of the diameter, or the formula is more than 1 % off. */
  lengthMetres: number;
}

/** The formula is told in inches. */
function perTurnSquared({ diameterMetres, lengthMetres }: SingleLayerCoil): number {
  requireWithin(
    { input: 'diameterMetres', label: 'Diameter', unit: 'm', atLeast: 1e-4, atMost: 10 },
    diameterMetres,
  );
  const length = {
    input: 'lengthMetres',
    label: 'Length',
    unit: 'm',
    atLeast: 0.4 * diameterMetres,
    atMost: 100,
  };
  requireWithin(length, lengthMetres);
  const [d, l] = [diameterMetres / METRES_PER_INCH, lengthMetres / METRES_PER_INCH];
  return (1e-6 * d ** 2) / (18 * d + 40 * l);
}

/**
 * Inductance of a single-layer coil, within 1 %.
 *
 * @param turns - above 0, parts of a turn too.
 * @returns henry.
 * @throws OutOfDomainError naming the input; a coil shorter than 0.4 of its diameter too.
 * @example 1e6 * singleLayerHenries({ diameterMetres: 0.0254, lengthMetres: 0.0254 }, 20) //=> 6.896552
 * @see L = d²N²/(18d + 40l) in µH and inches (1928)
 */
export function singleLayerHenries(coil: SingleLayerCoil, turns: number): number {
  requireWithin({ input: 'turns', label: 'Turns', above: 0, atMost: 1e4 }, turns);
  return perTurnSquared(coil) * turns ** 2;
}

/**
 * Turns of a single-layer coil for an inductance.
 *
 * @returns turns, parts of one too.
 * @throws OutOfDomainError naming the input.
 * @example singleLayerTurns({ diameterMetres: 0.0254, lengthMetres: 0.0254 }, 5e-6) //=> 17.029386
 * @see as `singleLayerHenries`
 */
export function singleLayerTurns(coil: SingleLayerCoil, henries: number): number {
  requireWithin({ input: 'henries', label: 'Inductance', unit: 'H', above: 0, atMost: 1e3 }, henries);
  return Math.sqrt(henries / perTurnSquared(coil));
}

/** Resistivity of annealed copper at 20 °C, ohm metre: 100 % IACS, from memory. */
export const COPPER_OHM_METRES = 1.7241e-8;

const VACUUM_PERMEABILITY = 4e-7 * Math.PI;

/**
 * Depth at which a current has fallen to 1/e in a conductor.
 *
 * @param resistivityOhmMetres - copper's where left out.
 * @returns metres.
 * @throws OutOfDomainError naming the input.
 * @example 1e6 * skinDepthMetres(1e6) //=> 66.084766
 * @see δ = √(ρ/(π·f·µ0)); textbook
 */
export function skinDepthMetres(frequencyHertz: number, resistivityOhmMetres = COPPER_OHM_METRES): number {
  const domain = { input: 'resistivityOhmMetres', label: 'Resistivity', unit: 'ohm m', above: 0, atMost: 1 };
  const resistivity = requireWithin(domain, resistivityOhmMetres);
  return Math.sqrt(resistivity / (Math.PI * hertz(frequencyHertz, 'frequencyHertz') * VACUUM_PERMEABILITY));
}

/**
 * Resistance of a round wire at radio frequency.
 *
 * Taken for a current in one skin depth under the surface; the true one is about a depth over a diameter higher, and
 * turns that lie close raise it more.
 *
 * @param diameterMetres - bare, ten skin depths at least: thinner, the current is no longer all at the surface.
 * @param resistivityOhmMetres - copper's where left out.
 * @returns ohms for each metre.
 * @throws OutOfDomainError naming the input.
 * @example wireOhmsPerMetre(7e6, 1e-3) //=> 0.219715
 * @see ρ/(π·d·δ), textbook
 */
export function wireOhmsPerMetre(
  frequencyHertz: number,
  diameterMetres: number,
  resistivityOhmMetres = COPPER_OHM_METRES,
): number {
  const depth = skinDepthMetres(frequencyHertz, resistivityOhmMetres);
  const domain = { input: 'diameterMetres', label: 'Wire, for this frequency', unit: 'm', atMost: 1 };
  requireWithin({ ...domain, atLeast: Number((10 * depth).toPrecision(6)) }, diameterMetres);
  return resistivityOhmMetres / (Math.PI * diameterMetres * depth);
}

/** A winding under voltage. */
export interface FluxInput {
  voltsRms: number;
  frequencyHertz: number;
  turns: number;
  /** Cross section of the core, m². */
  areaSquareMetres: number;
}

/**
 * Peak flux density of a sine in a core.
 *
 * @returns tesla; 1 gauss is 0.1 mT.
 * @throws OutOfDomainError naming the input.
 * @example 1e3 * peakFluxTesla({ voltsRms: 31.6228, frequencyHertz: 3.5e6, turns: 12, areaSquareMetres: 0.114e-4 }) //=> 14.865561
 * @see B = √2·E/(2π·f·N·A), the law of induction
 */
export function peakFluxTesla({ voltsRms, frequencyHertz, turns, areaSquareMetres }: FluxInput): number {
  requireWithin({ input: 'voltsRms', label: 'Voltage', unit: 'V', atLeast: 0, atMost: 1e6 }, voltsRms);
  requireWithin({ input: 'turns', label: 'Turns', above: 0, atMost: 1e4 }, turns);
  const area = { input: 'areaSquareMetres', label: 'Cross section', unit: 'm²', above: 0, atMost: 10 };
  requireWithin(area, areaSquareMetres);
  const frequency = hertz(frequencyHertz, 'frequencyHertz');
  return (Math.SQRT2 * voltsRms) / (2 * Math.PI * frequency * turns * areaSquareMetres);
}
