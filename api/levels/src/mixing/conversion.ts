import { requireOneOf, requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { hertz } from '../units';

/** Which of the two second-order products is wanted. */
export type WantedProduct = 'sum' | 'difference';

/** A frequency conversion. */
export interface Conversion {
  hertz: number;
  /** 'inverted': lower sideband in comes out as upper, and the tuning of the signal runs backwards. */
  sideband: 'kept' | 'inverted';
  /** Where the local oscillator stands against what comes out. */
  injection: 'high side' | 'low side';
}

/**
 * The wanted product of a mixer, its sideband and its injection side.
 *
 * The sideband turns exactly when the signal is subtracted from the local oscillator: LO − IF with the oscillator
 * above. Two conversions that both turn it put it right again.
 *
 * @throws OutOfDomainError naming the input; also when a difference of two equal frequencies is wanted.
 * @example convert(23.067e6, 8.867e6, 'difference') //=> { hertz: 14200000, sideband: 'inverted', injection: 'high side' }
 * @example convert(5.2e6, 9e6, 'sum') //=> { hertz: 14200000, sideband: 'kept', injection: 'low side' }
 * @see arithmetic; the rule of sideband inversion is a handbook statement (from memory)
 */
export function convert(loHertz: number, ifHertz: number, wanted: WantedProduct): Conversion {
  const lo = hertz(loHertz, 'loHertz');
  const intermediate = hertz(ifHertz, 'ifHertz');
  requireOneOf({ input: 'wanted', label: 'Wanted product' }, ['sum', 'difference'], wanted);
  if (wanted === 'difference' && lo === intermediate) throw noDifference(loHertz);
  const out = wanted === 'sum' ? lo + intermediate : Math.abs(lo - intermediate);
  return {
    hertz: hertz(out),
    sideband: wanted === 'difference' && lo > intermediate ? 'inverted' : 'kept',
    injection: lo > out ? 'high side' : 'low side',
  };
}

function noDifference(loHertz: number): OutOfDomainError {
  const permitted = 'another frequency than the intermediate one';
  return new OutOfDomainError('loHertz', loHertz, permitted, `Local oscillator: it must have ${permitted}.`);
}

/** A receiver's conversion to its intermediate frequency. */
export interface ReceiveInput {
  signalHertz: number;
  ifHertz: number;
  /** Local oscillator above the signal, or below it. */
  injection: 'high side' | 'low side';
}

/** Where else a receiver hears, and where its oscillator stands. */
export interface ReceiveImage {
  loHertz: number;
  /** The other frequency that gives the same intermediate one. */
  imageHertz: number;
  /** Half way between signal and oscillator: twice it less twice the oscillator is the intermediate frequency too. */
  halfIfHertz: number;
  sideband: 'kept' | 'inverted';
}

/**
 * Oscillator, image and half-IF response of a conversion to an intermediate frequency.
 *
 * @throws OutOfDomainError naming the input; with injection below, a signal at or under the intermediate frequency.
 * @example receiveImage({ signalHertz: 14.2e6, ifHertz: 9e6, injection: 'high side' }) //=> { loHertz: 23200000, imageHertz: 32200000, halfIfHertz: 18700000, sideband: 'inverted' }
 * @see handbook relations (from memory)
 */
export function receiveImage({ signalHertz, ifHertz, injection }: ReceiveInput): ReceiveImage {
  const signal = hertz(signalHertz, 'signalHertz');
  const intermediate = hertz(ifHertz, 'ifHertz');
  requireOneOf({ input: 'injection', label: 'Injection' }, ['high side', 'low side'], injection);
  const isHigh = injection === 'high side';
  if (!isHigh) requireAbove(signal, intermediate);
  const lo = isHigh ? signal + intermediate : signal - intermediate;
  return {
    loHertz: lo,
    imageHertz: isHigh ? lo + intermediate : Math.abs(lo - intermediate),
    halfIfHertz: (signal + lo) / 2,
    sideband: isHigh ? 'inverted' : 'kept',
  };
}

function requireAbove(signal: number, intermediate: number): void {
  const label = 'Signal, with the oscillator below it';
  requireWithin({ input: 'signalHertz', label, unit: 'Hz', above: intermediate }, signal);
}
