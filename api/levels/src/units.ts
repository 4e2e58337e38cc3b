import { requireWithin } from './domain';

declare const unit: unique symbol;
type Measured<U extends string> = number & { readonly [unit]: U };

/** Absolute power level, decibels above one milliwatt. */
export type Dbm = Measured<'dBm'>;
/** Ratio of two powers in decibels; a loss is negative. */
export type Decibel = Measured<'dB'>;
export type Watts = Measured<'W'>;
/** Size of a voltage, never negative; the name it travels under says rms, peak or peak to peak. */
export type Volts = Measured<'V'>;
export type Ohms = Measured<'ohm'>;
export type Hertz = Measured<'Hz'>;

// The bounds below are no physics: they only keep every result of this package a finite number.

/**
 * A level in dBm.
 *
 * @param input - name to report when the value is out of domain.
 * @throws OutOfDomainError outside −300 to +300 dBm, or not finite.
 * @example dBm(-20) //=> -20
 * @example dBm(NaN) //=> throws OutOfDomainError
 */
export function dBm(value: number, input = 'level'): Dbm {
  return requireWithin({ input, label: 'Level', unit: 'dBm', atLeast: -300, atMost: 300 }, value) as Dbm;
}

/**
 * A ratio in dB.
 *
 * @throws OutOfDomainError outside −1000 to +1000 dB, or not finite.
 * @example dB(-3) //=> -3
 */
export function dB(value: number, input = 'ratio'): Decibel {
  return requireWithin({ input, label: 'Ratio', unit: 'dB', atLeast: -1000, atMost: 1000 }, value) as Decibel;
}

/**
 * A power in watts; zero is a power, though it has no level.
 *
 * @throws OutOfDomainError when negative or not finite.
 * @example watts(5) //=> 5
 * @example watts(-1) //=> throws OutOfDomainError
 */
export function watts(value: number, input = 'power'): Watts {
  return requireWithin({ input, label: 'Power', unit: 'W', atLeast: 0, atMost: 1e30 }, value) as Watts;
}

/**
 * The size of a voltage.
 *
 * @throws OutOfDomainError when negative or not finite.
 * @example volts(0.66) //=> 0.66
 */
export function volts(value: number, input = 'voltage'): Volts {
  return requireWithin({ input, label: 'Voltage', unit: 'V', atLeast: 0, atMost: 1e18 }, value) as Volts;
}

/**
 * A resistance.
 *
 * @throws OutOfDomainError when zero, negative or not finite.
 * @example ohms(50) //=> 50
 * @example ohms(0) //=> throws OutOfDomainError
 */
export function ohms(value: number, input = 'resistance'): Ohms {
  return requireWithin({ input, label: 'Resistance', unit: 'ohm', above: 0, atMost: 1e15 }, value) as Ohms;
}

/**
 * A frequency.
 *
 * @throws OutOfDomainError when zero, negative or not finite.
 * @example hertz(14.1e6) //=> 14100000
 */
export function hertz(value: number, input = 'frequency'): Hertz {
  return requireWithin({ input, label: 'Frequency', unit: 'Hz', above: 0, atMost: 1e15 }, value) as Hertz;
}
