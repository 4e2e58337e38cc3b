import { rectangular } from '../analyzer';
import { dbFromPowerTolerance, dbFromVoltageTolerance } from '../budget';
import { dbmFromVoltsRms, wattsFromDbm } from '../conversions';
import { requireWithin } from '../domain';
import { ASSUMED_SCOPE_LIMITS } from '../oscilloscope';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';
import { ohms, volts } from '../units';
import { ASSUMED_METER_ACCURACY_REL } from './log-detector';

/** What a voltmeter behind a diode probe shows, and what the probe is made of. */
export interface DiodeProbeInput {
  directVolts: number;
  /** Half width within which it was read, V. */
  readToVolts: number;
  /** Relative; {@link ASSUMED_METER_ACCURACY_REL} where left out. */
  meterAccuracyRel?: number;
  /** Peak voltage for each volt shown: 1 for a plain peak probe, √2 for one with a resistor to read rms; 1 where left out. */
  peakPerVolt?: number;
  /** Across the diode at this current, and how far it may be from it, V. */
  diodeDropVolts: number;
  diodeDropPlusMinusVolts: number;
  /** Resistance in which the level is taken. */
  loadOhms: number;
  /** Relative; as for an oscilloscope where left out. */
  loadToleranceRel?: number;
}

/**
 * Level of a carrier across a load from a diode probe and a voltmeter.
 *
 * The probe shows the peak less the diode's drop. At a few tenths of a volt the drop is no longer what it was, and its
 * share of the reading runs away: the uncertainty says so, and under four times the drop's own spread it is refused.
 *
 * @returns dBm; uncertainties in dB; four rectangular components: reading resolution, voltmeter, diode drop, load; volts
 *   peak to peak; watts.
 * @throws OutOfDomainError naming the input.
 * @example diodeProbeReading({ directVolts: 9.7, readToVolts: 0.05, diodeDropVolts: 0.3, diodeDropPlusMinusVolts: 0.1, loadOhms: 50 }).value //=> 30
 * @see JCGM 100:2008 (GUM), 5.1.2; peak detection: textbook
 */
export function diodeProbeReading(input: DiodeProbeInput): LevelReading {
  const { directVolts, readToVolts, meterAccuracyRel = ASSUMED_METER_ACCURACY_REL, peakPerVolt = 1 } = input;
  const { loadToleranceRel = ASSUMED_SCOPE_LIMITS.loadToleranceRel } = input;
  requireProbe(input, peakPerVolt);
  const load = ohms(input.loadOhms, 'loadOhms');
  const peak = directVolts * peakPerVolt + input.diodeDropVolts;
  const level = dbmFromVoltsRms(volts(peak / Math.SQRT2), load);
  const part = (ofPeak: number, name: string) => dbFromVoltageTolerance(ofPeak / peak, name);
  const reading = readingOf('diode-probe/1', level, 'dBm', [
    rectangular('reading resolution', part(readToVolts * peakPerVolt, 'readToVolts')),
    rectangular('voltmeter', part(meterAccuracyRel * directVolts * peakPerVolt, 'meterAccuracyRel')),
    rectangular('diode drop', part(input.diodeDropPlusMinusVolts, 'diodeDropPlusMinusVolts')),
    rectangular('load', dbFromPowerTolerance(loadToleranceRel, 'loadToleranceRel')),
  ]);
  return { ...reading, voltsPeakToPeak: 2 * peak, watts: wattsFromDbm(level) };
}

function requireProbe(input: DiodeProbeInput, peakPerVolt: number): void {
  const volt = { unit: 'V', atMost: 1e4 };
  requireWithin({ ...volt, input: 'directVolts', label: 'Direct voltage', above: 0 }, input.directVolts);
  requireWithin({ ...volt, input: 'readToVolts', label: 'Read to within', above: 0 }, input.readToVolts);
  requireWithin(
    { ...volt, input: 'diodeDropVolts', label: 'Drop of the diode', atLeast: 0, atMost: 2 },
    input.diodeDropVolts,
  );
  requireWithin({ input: 'peakPerVolt', label: 'Peak for each volt', atLeast: 0.1, atMost: 10 }, peakPerVolt);
}
