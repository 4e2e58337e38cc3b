import { requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { GREATEST_FILTER_ORDER, requirePrototype } from './prototype';
import type { PrototypeInput } from './prototype';

/**
 * Loss of an ideal low-pass at a frequency, by its formula.
 *
 * A high-pass has the same at the turned-over ratio, cutoff over frequency.
 *
 * @param ratio - frequency over cutoff, 0 or more.
 * @returns dB against the source's available power: an even-order Chebyshev shows its ripple at 0.
 * @throws OutOfDomainError naming the input.
 * @example idealAttenuationDb({ family: 'Butterworth', order: 5 }, 2) //=> 30.107239
 * @see Microwave Filters, Impedance-Matching Networks and Coupling Structures (1964), chapter 4 (formulas from memory,
 *   checked by simulation)
 */
export function idealAttenuationDb(input: PrototypeInput, ratio: number): number {
  const { order, rippleDb } = requirePrototype(input);
  requireWithin({ input: 'ratio', label: 'Frequency over cutoff', atLeast: 0, atMost: 1e6 }, ratio);
  const excess =
    rippleDb === undefined ? ratio ** (2 * order) : epsilonSquared(rippleDb) * polynomial(order, ratio) ** 2;
  return 10 * Math.log10(1 + excess);
}

function epsilonSquared(rippleDb: number): number {
  return 10 ** (rippleDb / 10) - 1;
}

/** Chebyshev's polynomial of the first kind. */
function polynomial(order: number, x: number): number {
  return x <= 1 ? Math.cos(order * Math.acos(x)) : Math.cosh(order * Math.acosh(x));
}

/** What a filter must take. */
export interface OrderInput extends Omit<PrototypeInput, 'order'> {
  /** Frequency over cutoff at which it must; above 1. */
  ratio: number;
  attenuationDb: number;
}

/**
 * The least order whose ideal response takes enough.
 *
 * @throws OutOfDomainError naming the input; also when no order offered does.
 * @example leastOrder({ family: 'Chebyshev', rippleDb: 0.1, ratio: 2, attenuationDb: 43 }) //=> 6
 * @see `idealAttenuationDb`
 */
export function leastOrder({ family, rippleDb, ratio, attenuationDb }: OrderInput): number {
  requireWithin({ input: 'ratio', label: 'Frequency over cutoff', above: 1, atMost: 1e6 }, ratio);
  requireWithin(
    { input: 'attenuationDb', label: 'Attenuation', unit: 'dB', above: 0, atMost: 300 },
    attenuationDb,
  );
  for (let order = 1; order <= GREATEST_FILTER_ORDER; order++) {
    if (idealAttenuationDb({ family, order, rippleDb }, ratio) >= attenuationDb) return order;
  }
  const most = idealAttenuationDb({ family, order: GREATEST_FILTER_ORDER, rippleDb }, ratio);
  const permitted = `at most ${most.toFixed(1)} dB, what order ${GREATEST_FILTER_ORDER} takes there`;
  throw new OutOfDomainError('attenuationDb', attenuationDb, permitted, `Attenuation: ${permitted}.`);
}

/**
 * Frequency over cutoff at which a Chebyshev low-pass takes 3.01 dB.
 *
 * @throws OutOfDomainError naming the input.
 * @example halfPowerRatio(5, 0.1) //=> 1.134718
 * @see as `idealAttenuationDb`
 */
export function halfPowerRatio(order: number, rippleDb: number): number {
  requirePrototype({ family: 'Chebyshev', order, rippleDb });
  return Math.cosh(Math.acosh(1 / Math.sqrt(epsilonSquared(rippleDb))) / order);
}

/**
 * Ripple of a loss-free filter that returns so little.
 *
 * @param returnLossDb - least return loss in the passband, 3 to 60 dB.
 * @throws OutOfDomainError outside that.
 * @example rippleFromReturnLoss(20) //=> 0.043648
 * @see |S11|² + |S21|² = 1 for a loss-free two-port
 */
export function rippleFromReturnLoss(returnLossDb: number): number {
  const domain = {
    input: 'returnLossDb',
    label: 'Return loss in the passband',
    unit: 'dB',
    above: 3.02,
    atMost: 60,
  };
  requireWithin(domain, returnLossDb);
  return -10 * Math.log10(1 - 10 ** (-returnLossDb / 10));
}

/**
 * Least return loss in the passband of a loss-free filter of such a ripple.
 *
 * @throws OutOfDomainError when the ripple is not above 0 and at most 3 dB.
 * @example returnLossFromRipple(0.1) //=> 16.427747
 * @see as `rippleFromReturnLoss`
 */
export function returnLossFromRipple(rippleDb: number): number {
  requireWithin({ input: 'rippleDb', label: 'Ripple', unit: 'dB', atLeast: 1e-6, atMost: 3 }, rippleDb);
  return -10 * Math.log10(1 - 10 ** (-rippleDb / 10));
}
