import { requireWithin } from '../domain';
import { ohms } from '../units';
import { returnLossOrNone } from './return-loss';

/** One match, told every way it is told. */
export interface Match {
  /** Size of the reflection coefficient, 0 to 1. */
  reflection: number;
  /** Absent when everything comes back. */
  vswr?: number;
  /** Absent for a perfect match. */
  returnLossDb?: number;
  /** Power that does not go in, as a loss; absent when none goes in. */
  mismatchLossDb?: number;
  /** Part of the power that comes back, 0 to 1. */
  reflectedPower: number;
}

/**
 * A match from its reflection coefficient.
 *
 * | reflection | absent |
 * | --- | --- |
 * | 0 | return loss |
 * | 1 | VSWR, mismatch loss |
 *
 * @param reflection - size, 0 to 1.
 * @throws OutOfDomainError outside that.
 * @example matchFromReflection(0.2).vswr //=> 1.5
 * @example matchFromReflection(1) //=> { reflection: 1, returnLossDb: 0, reflectedPower: 1 }
 * @see VSWR = (1 + ρ)/(1 − ρ), return loss −20 log ρ, mismatch loss −10 log(1 − ρ²); textbook
 */
export function matchFromReflection(reflection: number): Match {
  requireWithin({ input: 'reflection', label: 'Reflection coefficient', atLeast: 0, atMost: 1 }, reflection);
  const goesIn = 1 - reflection ** 2;
  const isTotal = goesIn < 1e-12;
  return {
    reflection,
    vswr: isTotal ? undefined : (1 + reflection) / (1 - reflection),
    returnLossDb: returnLossOrNone(reflection),
    mismatchLossDb: isTotal ? undefined : Math.abs(10 * Math.log10(goesIn)),
    reflectedPower: reflection ** 2,
  };
}

/**
 * A match from its voltage standing-wave ratio.
 *
 * @param vswr - 1 to 1e6.
 * @throws OutOfDomainError outside that.
 * @example matchFromVswr(2).returnLossDb //=> 9.542425
 * @see as `matchFromReflection`
 */
export function matchFromVswr(vswr: number): Match {
  requireWithin({ input: 'vswr', label: 'VSWR', atLeast: 1, atMost: 1e6 }, vswr);
  return matchFromReflection((vswr - 1) / (vswr + 1));
}

/**
 * A match from its return loss.
 *
 * @param returnLossDb - 0 to 200 dB.
 * @throws OutOfDomainError outside that.
 * @example matchFromReturnLoss(20).vswr //=> 1.222222
 * @see as `matchFromReflection`
 */
export function matchFromReturnLoss(returnLossDb: number): Match {
  requireWithin(
    { input: 'returnLossDb', label: 'Return loss', unit: 'dB', atLeast: 0, atMost: 200 },
    returnLossDb,
  );
  return matchFromReflection(10 ** (-returnLossDb / 20));
}

/** A resistance and a reactance in series; a capacitance is negative. */
export interface Impedance {
  resistanceOhms: number;
  reactanceOhms: number;
}

/**
 * How an impedance ends a line.
 *
 * @param lineOhms - above 0.
 * @throws OutOfDomainError naming the input; a resistance may be 0, not negative.
 * @example matchFromImpedance({ resistanceOhms: 50, reactanceOhms: 50 }, 50).vswr //=> 2.618034
 * @see ρ = |Z − Z0| / |Z + Z0|; textbook
 */
export function matchFromImpedance(impedance: Impedance, lineOhms: number): Match {
  const { resistanceOhms: r, reactanceOhms: x } = requireImpedance(impedance);
  const line = ohms(lineOhms, 'lineOhms');
  return matchFromReflection(Math.hypot(r - line, x) / Math.hypot(r + line, x));
}

/** An impedance that can be. */
export function requireImpedance(impedance: Impedance): Impedance {
  const { resistanceOhms, reactanceOhms } = impedance;
  requireWithin(
    { input: 'resistanceOhms', label: 'Resistance', unit: 'ohm', atLeast: 0, atMost: 1e12 },
    resistanceOhms,
  );
  requireWithin(
    { input: 'reactanceOhms', label: 'Reactance', unit: 'ohm', atLeast: -1e12, atMost: 1e12 },
    reactanceOhms,
  );
  return impedance;
}

/** What two mismatches facing each other can do, their distance in wavelengths unknown. */
export interface MismatchBounds {
  /** Against both matched losses alone: negative is more power than they let expect. */
  leastDb: number;
  greatestDb: number;
  /** Half width for an uncertainty budget, dB; the distribution is U-shaped. */
  limitDb: number;
}

/**
 * Bounds of the level between a source and a load that are both mismatched.
 *
 * @param sourceReflection - sizes, each 0 to under 1.
 * @throws OutOfDomainError naming the input.
 * @example mismatchBounds(0.1, 0.2) //=> { leastDb: -0.172003, greatestDb: 0.175478, limitDb: 0.175478 }
 * @see 20 log10(1 ± ρs·ρl); textbook on radio-frequency metrology
 */
export function mismatchBounds(sourceReflection: number, loadReflection: number): MismatchBounds {
  const domain = { label: 'Reflection coefficient', atLeast: 0, below: 1 };
  requireWithin({ ...domain, input: 'sourceReflection' }, sourceReflection);
  requireWithin({ ...domain, input: 'loadReflection' }, loadReflection);
  const both = sourceReflection * loadReflection;
  const greatestDb = Math.abs(20 * Math.log10(1 - both));
  return { leastDb: -20 * Math.log10(1 + both) || 0, greatestDb, limitDb: greatestDb };
}
