import { requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { hertz, ohms } from '../units';
import { named } from './ladder';
import type { Ladder, LadderElement } from './ladder';
import { prototypeOf, requirePrototype } from './prototype';
import type { Prototype, PrototypeInput } from './prototype';

/** Coupling between neighbours, and loading at the ends, for a bandwidth of 1. */
export interface CouplingCoefficients {
  /** q1: external Q of the first resonator times fractional bandwidth. */
  sourceQ: number;
  /** qn. */
  loadQ: number;
  /** k12 to k(n−1)n. */
  couplings: number[];
}

/**
 * Normalised couplings and end loadings of a coupled-resonator filter.
 *
 * @returns for the bandwidth the family is defined by: half power for a Butterworth, the ripple for a Chebyshev.
 * @throws OutOfDomainError naming the input; an order of at least 2.
 * @example couplingCoefficients({ family: 'Butterworth', order: 3 }) //=> { sourceQ: 1, loadQ: 1, couplings: [0.707107, 0.707107] }
 * @see q1 = g0·g1, qn = gn·g(n+1), k = 1/√(gi·g(i+1)); Handbook of Filter Synthesis (1967), from memory
 */
export function couplingCoefficients(input: PrototypeInput): CouplingCoefficients {
  const prototype = resonatorPrototype(input);
  const g = prototype.elements;
  return {
    sourceQ: g[0] ?? NaN,
    loadQ: (g.at(-1) ?? NaN) * prototype.load,
    couplings: g.slice(1).map((next, index) => 1 / Math.sqrt((g[index] ?? NaN) * next)),
  };
}

/** A band-pass to be designed. */
export interface BandPassInput extends PrototypeInput {
  centreHertz: number;
  /** Butterworth: between the half-power points. Chebyshev: of the ripple. At most 30 % of the centre. */
  bandwidthHertz: number;
  sourceOhms: number;
  loadOhms: number;
  /** Coil of every resonator. */
  resonatorHenries: number;
}

/** Wider than this the couplings change too much over the band; common practice. */
const GREATEST_FRACTION = 0.3;

/**
 * Exact elements of a band-pass of parallel resonators to ground, coupled by capacitors, the ends too.
 *
 * The couplings are right at the centre only, so the band comes out a little lopsided and steeper below; what the
 * filter really does is worked out from its parts by `ladderResponse`.
 *
 * @returns for n resonators n coils and 2·n + 1 capacitors; ends as asked for, also for an even-order Chebyshev.
 * @throws OutOfDomainError naming the input; also when the coil leaves no capacitance for a resonator or is too large
 *   for the ends: choose another coil.
 * @example coupledResonatorBandPass({ family: 'Butterworth', order: 2, centreHertz: 7.1e6, bandwidthHertz: 300e3, sourceOhms: 50, loadOhms: 50, resonatorHenries: 1e-6 }).elements.map(({ name }) => name) //=> ['C1', 'C2', 'L3', 'C4', 'C5', 'L6', 'C7']
 * @see Microwave Filters, Impedance-Matching Networks and Coupling Structures (1964), chapter 8 (formulas from memory,
 *   checked by simulation)
 */
export function coupledResonatorBandPass(input: BandPassInput): Ladder {
  const prototype = resonatorPrototype(input);
  const sourceOhms = ohms(input.sourceOhms, 'sourceOhms');
  const loadOhms = ohms(input.loadOhms, 'loadOhms');
  const omega = 2 * Math.PI * hertz(input.centreHertz, 'centreHertz');
  const henries = requireCoil(input);
  const fraction = requireFraction(input);
  const slope = 1 / (omega * henries);
  const between = innerCouplings(prototype.elements, fraction, slope).map((j) => j / omega);
  const first = endCoupling(fraction * slope, prototype.elements[0] ?? NaN, sourceOhms, omega);
  const last = endCoupling(
    fraction * slope,
    (prototype.elements.at(-1) ?? NaN) * prototype.load,
    loadOhms,
    omega,
  );
  const taken = [first.shunt, ...between, last.shunt];
  const resonant = slope / omega;
  const own = prototype.elements.map((_g, index) => resonant - (taken[index] ?? 0) - (taken[index + 1] ?? 0));
  requireOwnCapacitance(own, input.resonatorHenries);
  return {
    elements: named(laidOut([first.series, ...between, last.series], own, henries)),
    sourceOhms,
    loadOhms,
  };
}

function resonatorPrototype(input: PrototypeInput): Prototype {
  requirePrototype(input);
  requireWithin({ input: 'order', label: 'Resonators', atLeast: 2 }, input.order);
  return prototypeOf(input);
}

function requireCoil({ resonatorHenries }: BandPassInput): number {
  const domain = {
    input: 'resonatorHenries',
    label: 'Coil of a resonator',
    unit: 'H',
    atLeast: 1e-12,
    atMost: 1e3,
  };
  return requireWithin(domain, resonatorHenries);
}

function requireFraction({ bandwidthHertz, centreHertz }: BandPassInput): number {
  const atMost = GREATEST_FRACTION * centreHertz;
  requireWithin(
    { input: 'bandwidthHertz', label: 'Bandwidth', unit: 'Hz', above: 0, atMost },
    bandwidthHertz,
  );
  return bandwidthHertz / centreHertz;
}

/** Admittance inverters between resonators, S. */
function innerCouplings(g: readonly number[], fraction: number, slope: number): number[] {
  return g.slice(1).map((next, index) => (fraction * slope) / Math.sqrt((g[index] ?? NaN) * next));
}

/** An inverter to an end has no negative capacitor to lean on there, so it is one capacitor and what it looks like. */
function endCoupling(
  loading: number,
  g: number,
  end: number,
  omega: number,
): { series: number; shunt: number } {
  const inverter = Math.sqrt(loading / (g * end));
  const times = inverter * end;
  if (!(times < 1)) {
    const permitted = 'a larger coil, or a narrower band: this one cannot be coupled to its end';
    throw new OutOfDomainError(
      'resonatorHenries',
      times,
      permitted,
      `Coil of a resonator: needed is ${permitted}.`,
    );
  }
  const series = inverter / (omega * Math.sqrt(1 - times ** 2));
  return { series, shunt: series / (1 + (omega * series * end) ** 2) };
}

function requireOwnCapacitance(own: readonly number[], henries: number): void {
  if (own.every((farads) => farads > 0)) return;
  const permitted = 'a smaller coil: this one resonates with less than its couplings bring';
  throw new OutOfDomainError(
    'resonatorHenries',
    henries,
    permitted,
    `Coil of a resonator: needed is ${permitted}.`,
  );
}

function laidOut(
  couplings: readonly number[],
  own: readonly number[],
  henries: number,
): Omit<LadderElement, 'name'>[] {
  return couplings.flatMap((farads, index): Omit<LadderElement, 'name'>[] => {
    const coupling = { place: 'series', part: 'capacitor', value: farads } as const;
    const capacitor = own[index];
    if (capacitor === undefined) return [coupling];
    return [
      coupling,
      { place: 'shunt', part: 'capacitor', value: capacitor },
      { place: 'shunt', part: 'inductor', value: henries },
    ];
  });
}

/**
 * Loss in mid-band from the Q of the resonators, as an estimate.
 *
 * @param unloadedQ - of the resonators, above 0.
 * @returns dB; holds while it is a few dB and the band is narrow.
 * @throws OutOfDomainError naming the input.
 * @example dissipationLossDb({ family: 'Butterworth', order: 3 }, 0.05, 200) //=> 1.737178
 * @see 4.343·Σg/(w·Qu), Microwave Filters, Impedance-Matching Networks and Coupling Structures (1964); narrow band
 */
export function dissipationLossDb(
  input: PrototypeInput,
  fractionalBandwidth: number,
  unloadedQ: number,
): number {
  const { elements } = prototypeOf(input);
  requireWithin(
    { input: 'fractionalBandwidth', label: 'Bandwidth over centre', above: 0, atMost: 2 },
    fractionalBandwidth,
  );
  requireWithin({ input: 'unloadedQ', label: 'Unloaded Q', above: 0, atMost: 1e9 }, unloadedQ);
  const sum = elements.reduce((total, g) => total + g, 0);
  return ((10 / Math.LN10) * sum) / (fractionalBandwidth * unloadedQ);
}
