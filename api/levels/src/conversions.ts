import { requireWithin } from './domain';
import { dB, dBm, volts, watts } from './units';
import type { Dbm, Decibel, Ohms, Volts, Watts } from './units';

// Definitions: IEC 60027-3 (logarithmic quantities) and Recommendation ITU-R V.574 (decibel); P = V rms squared / R.
const WATTS_AT_0_DBM = 1e-3;
/** Peak to peak over rms, sine only. */
const PEAK_TO_PEAK_PER_RMS = 2 * Math.SQRT2;

/**
 * Power of a level.
 *
 * @example wattsFromDbm(dBm(30)) //=> 1
 * @see IEC 60027-3
 */
export function wattsFromDbm(level: Dbm): Watts {
  return watts(WATTS_AT_0_DBM * 10 ** (level / 10));
}

/**
 * Level of a power. Zero power has no level.
 *
 * @throws OutOfDomainError when the power is zero or negative.
 * @example dbmFromWatts(watts(0.001)) //=> 0
 * @example dbmFromWatts(watts(0)) //=> throws OutOfDomainError
 * @see IEC 60027-3
 */
export function dbmFromWatts(power: Watts): Dbm {
  const positive = requireWithin({ input: 'power', label: 'Power', unit: 'W', above: 0 }, power);
  return dBm(10 * Math.log10(positive / WATTS_AT_0_DBM));
}

/**
 * Rms voltage of a level across a resistance.
 *
 * @example voltsRmsFromDbm(dBm(13.0103), ohms(50)) //=> 1
 */
export function voltsRmsFromDbm(level: Dbm, resistance: Ohms): Volts {
  return volts(Math.sqrt(wattsFromDbm(level) * resistance));
}

/**
 * Level of an rms voltage across a resistance.
 *
 * @throws OutOfDomainError when the voltage is zero: nothing has no level.
 * @example dbmFromVoltsRms(volts(1), ohms(50)) //=> 13.0103
 */
export function dbmFromVoltsRms(voltsRms: Volts, resistance: Ohms): Dbm {
  return dbmFromWatts(wattsFromVoltsRms(voltsRms, resistance));
}

/**
 * Power of an rms voltage in a resistance.
 *
 * @example wattsFromVoltsRms(volts(10), ohms(50)) //=> 2
 */
export function wattsFromVoltsRms(voltsRms: Volts, resistance: Ohms): Watts {
  return watts(voltsRms ** 2 / resistance);
}

/**
 * Peak-to-peak voltage of a sine from its rms voltage.
 *
 * @example voltsPeakToPeakFromRms(volts(1)) //=> 2.828427
 */
export function voltsPeakToPeakFromRms(voltsRms: Volts): Volts {
  return volts(voltsRms * PEAK_TO_PEAK_PER_RMS);
}

/**
 * Rms voltage of a sine from its peak-to-peak voltage.
 *
 * @example voltsRmsFromPeakToPeak(volts(2)) //=> 0.707107
 */
export function voltsRmsFromPeakToPeak(voltsPeakToPeak: Volts): Volts {
  return volts(voltsPeakToPeak / PEAK_TO_PEAK_PER_RMS);
}

/**
 * Peak-to-peak voltage of a sine of this level across a resistance.
 *
 * @example voltsPeakToPeakFromDbm(dBm(10), ohms(50)) //=> 2
 */
export function voltsPeakToPeakFromDbm(level: Dbm, resistance: Ohms): Volts {
  return voltsPeakToPeakFromRms(voltsRmsFromDbm(level, resistance));
}

/**
 * Level of a sine from its peak-to-peak voltage across a resistance.
 *
 * @throws OutOfDomainError when the voltage is zero.
 * @example dbmFromVoltsPeakToPeak(volts(0.66), ohms(50)) //=> 0.370279
 */
export function dbmFromVoltsPeakToPeak(voltsPeakToPeak: Volts, resistance: Ohms): Dbm {
  return dbmFromVoltsRms(voltsRmsFromPeakToPeak(voltsPeakToPeak), resistance);
}

/**
 * Decibels of a power ratio.
 *
 * @throws OutOfDomainError when the ratio is not positive.
 * @example dbFromPowerRatio(2) //=> 3.0103
 */
export function dbFromPowerRatio(ratio: number): Decibel {
  return dB(10 * Math.log10(requireWithin({ input: 'ratio', label: 'Power ratio', above: 0 }, ratio)));
}

/**
 * Decibels of a voltage ratio across equal resistances.
 *
 * @throws OutOfDomainError when the ratio is not positive.
 * @example dbFromVoltageRatio(2) //=> 6.0206
 */
export function dbFromVoltageRatio(ratio: number): Decibel {
  return dB(20 * Math.log10(requireWithin({ input: 'ratio', label: 'Voltage ratio', above: 0 }, ratio)));
}

/**
 * Power ratio of a number of decibels.
 *
 * @example powerRatioFromDb(dB(-10)) //=> 0.1
 */
export function powerRatioFromDb(ratio: Decibel): number {
  return 10 ** (ratio / 10);
}

/**
 * Voltage ratio of a number of decibels, equal resistances.
 *
 * @example voltageRatioFromDb(dB(20)) //=> 10
 */
export function voltageRatioFromDb(ratio: Decibel): number {
  return 10 ** (ratio / 20);
}
