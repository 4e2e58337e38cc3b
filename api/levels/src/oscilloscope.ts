import { dbFromPowerTolerance, dbFromVoltageTolerance } from './budget';
import type { UncertaintySource } from './budget';
import { dbmFromVoltsPeakToPeak, wattsFromDbm } from './conversions';
import { requireWithin } from './domain';
import type { Domain } from './domain';
import { OutOfDomainError } from './errors';
import { readingOf } from './reading';
import type { LevelReading } from './reading';
import { ohms, volts } from './units';

/** Height of the screen in divisions; common practice for bench oscilloscopes. */
export const SCREEN_DIVISIONS = 8;

/** A trace must stand this many times higher than it can be read, or its decibels are no longer linear. */
const LEAST_DIVISIONS_PER_RESOLUTION = 4;

/**
 * Limits assumed when neither instrument nor plan states its own; each is relative and rectangular.
 *
 * Common practice, not taken from any one data sheet: vertical gain of a bench oscilloscope within 3 %; division ratio
 * of a compensated ×10 probe within 2 %; a ×1 probe divides nothing, a few hundred ohms of its lead against the
 * 1 megohm input make under 0.1 %; a resistive load trimmed or measured with a bench meter within 0.5 %.
 */
export const ASSUMED_SCOPE_LIMITS = {
  verticalGainToleranceRel: 0.03,
  probeToleranceRel: { 1: 0.001, 10: 0.02 },
  loadToleranceRel: 0.005,
} as const;

/** What the oscilloscope shows across a known load, and how good each part of the set-up is. */
export interface OscilloscopeInput {
  /** As set, before the probe: 0.02 for 20 mV/div. */
  voltsPerDivision: number;
  /** Height of the sine on the screen, above 0 and at most 8. */
  divisionsPeakToPeak: number;
  /** Half width within which the height was read, in divisions. */
  readToDivisions: number;
  probeRatio: 1 | 10;
  /** Resistance in which the level is taken. */
  loadOhms: number;
  /** Relative limits, 0.03 for 3 %; {@link ASSUMED_SCOPE_LIMITS} where left out. */
  verticalGainToleranceRel?: number;
  probeToleranceRel?: number;
  loadToleranceRel?: number;
}

/**
 * Level of a sine from an oscilloscope across a load.
 *
 * The budget holds reading resolution, vertical gain, probe and load. It leaves out how the probe loads the circuit: at
 * 50 ohm and 14 MHz a ×10 probe of about 10 pF takes under 0.01 dB, a ×1 probe of about 100 pF some 0.2 dB, so take
 * levels at radio frequency with the probe at ×10.
 *
 * @returns dBm; uncertainties in dB; four components; volts peak to peak at the load; watts.
 * @throws OutOfDomainError naming the input: a trace higher than the screen or lower than four times what it was read
 *   to, a probe that is neither 1 nor 10, a resistance of zero or less, a tolerance above 0.25.
 * @example oscilloscopeReading({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }).value //=> 0.370279
 * @example oscilloscopeReading({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }).expandedUncertainty //=> 0.473045
 * @example oscilloscopeReading({ voltsPerDivision: 0.02, divisionsPeakToPeak: 33, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }) //=> throws OutOfDomainError
 * @see JCGM 100:2008 (GUM), 5.1.2; IEC 60027-3
 */
export function oscilloscopeReading(input: OscilloscopeInput): LevelReading {
  const load = ohms(input.loadOhms, 'loadOhms');
  const voltsPeakToPeak = voltsAtTheLoad(input);
  const level = dbmFromVoltsPeakToPeak(volts(voltsPeakToPeak), load);
  const reading = readingOf('oscilloscope/1', level, 'dBm', scopeSources(input));
  return { ...reading, voltsPeakToPeak, watts: wattsFromDbm(level) };
}

function voltsAtTheLoad(input: OscilloscopeInput): number {
  requireWithin(VOLTS_PER_DIVISION, input.voltsPerDivision);
  requireWithin(READ_TO, input.readToDivisions);
  const least = LEAST_DIVISIONS_PER_RESOLUTION * input.readToDivisions;
  requireWithin({ ...DIVISIONS, atLeast: least }, input.divisionsPeakToPeak);
  requireProbe(input.probeRatio);
  return input.voltsPerDivision * input.divisionsPeakToPeak * input.probeRatio;
}

function requireProbe(ratio: number): void {
  if (ratio === 1 || ratio === 10) return;
  throw new OutOfDomainError(
    'probeRatio',
    ratio,
    '1 or 10',
    `Probe: ×${ratio} is not known here, only ×1 and ×10.`,
  );
}

/** The four rectangular limits in dB. A tolerance of the load moves the power, one of a voltage moves it twice. */
function scopeSources(input: OscilloscopeInput): UncertaintySource[] {
  const assumed = ASSUMED_SCOPE_LIMITS;
  const gain = input.verticalGainToleranceRel ?? assumed.verticalGainToleranceRel;
  const probe = input.probeToleranceRel ?? assumed.probeToleranceRel[input.probeRatio];
  const load = input.loadToleranceRel ?? assumed.loadToleranceRel;
  const resolution = input.readToDivisions / input.divisionsPeakToPeak;
  return [
    rectangular('reading resolution', dbFromVoltageTolerance(resolution, 'readToDivisions')),
    rectangular('vertical gain', dbFromVoltageTolerance(gain, 'verticalGainToleranceRel')),
    rectangular('probe', dbFromVoltageTolerance(probe, 'probeToleranceRel')),
    rectangular('load', dbFromPowerTolerance(load, 'loadToleranceRel')),
  ];
}

function rectangular(name: string, limit: number): UncertaintySource {
  return { name, limit, distribution: 'rectangular' };
}

const VOLTS_PER_DIVISION: Domain = {
  input: 'voltsPerDivision',
  label: 'Volts per division',
  unit: 'V/div',
  above: 0,
  atMost: 1000,
};
const READ_TO: Domain = {
  input: 'readToDivisions',
  label: 'Read to within',
  unit: 'div',
  above: 0,
  atMost: 2,
};
const DIVISIONS: Domain = {
  input: 'divisionsPeakToPeak',
  label: 'Divisions, peak to peak',
  unit: 'div',
  atMost: SCREEN_DIVISIONS,
};
