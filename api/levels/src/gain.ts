import { requireWithin } from './domain';
import { WrongUnitError } from './errors';
import { readingOf } from './reading';
import type { LevelReading } from './reading';
import { dB, dBm } from './units';
import type { Dbm, Decibel } from './units';

/** Measured headroom under this is called low. The portal's own choice: no standard names a figure. */
export const LOW_HEADROOM_DB = 1;

/**
 * Level after a gain; a loss is negative.
 *
 * @example levelAfter(dBm(-19), dB(20.5)) //=> 1.5
 */
export function levelAfter(level: Dbm, gain: Decibel): Dbm {
  return dBm(level + gain);
}

/**
 * Gain between two levels; a loss is negative.
 *
 * @example gainBetween(dBm(-19), dBm(1.5)) //=> 20.5
 */
export function gainBetween(input: Dbm, output: Dbm): Decibel {
  return dB(output - input);
}

/** Room left under a limit. */
export interface Headroom {
  /** Limit less level; negative when the level is over the limit. */
  headroomDb: number;
  /** True under {@link LOW_HEADROOM_DB}. */
  isLow: boolean;
}

/**
 * Headroom of a level under a limit, unrounded.
 *
 * @example headroomTo(dBm(10), dBm(1.5)) //=> { headroomDb: 8.5, isLow: false }
 * @example headroomTo(dBm(39), dBm(38.2)).isLow //=> true
 */
export function headroomTo(limit: Dbm, level: Dbm): Headroom {
  const headroomDb = limit - level;
  return { headroomDb, isLow: headroomDb < LOW_HEADROOM_DB };
}

/** What a gain needs to know of each reading, however it was taken. */
export type MeasuredLevel = Pick<LevelReading, 'value' | 'unit' | 'expandedUncertainty'>;

/** Two readings in dBm. */
export interface GainInput {
  output: MeasuredLevel;
  input: MeasuredLevel;
}

/**
 * Gain (or difference) worked out from two level readings, with both uncertainties carried into it.
 *
 * The two are combined as independent. When one instrument took both, part of its error is common and cancels, so the
 * true uncertainty is smaller: the result errs towards caution.
 *
 * @returns dB, two components.
 * @throws WrongUnitError when a reading is not in dBm.
 * @example
 * gainReading({
 *   output: oscilloscopeReading({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }),
 *   input: analyzerReading({ referenceLevelDbm: 0, divisionsDown: 1.94, dbPerDivision: 10, readToDivisions: 0.02, padsInLineDb: 0, amplitudeAccuracyDb: 0.4 }),
 * }).value //=> 19.770279
 * @see JCGM 100:2008, 5.1.2
 */
export function gainReading({ output, input }: GainInput): LevelReading {
  requireLevel('output', output);
  requireLevel('input', input);
  return readingOf('gain/1', output.value - input.value, 'dB', [
    { name: 'output level', limit: output.expandedUncertainty, distribution: 'normal, k = 2' },
    { name: 'input level', limit: input.expandedUncertainty, distribution: 'normal, k = 2' },
  ]);
}

function requireLevel(input: string, reading: MeasuredLevel): void {
  if (reading.unit !== 'dBm') {
    const message = `A gain is worked out from two levels in dBm; the ${input} is in ${reading.unit}.`;
    throw new WrongUnitError(input, reading.unit, 'a reading in dBm', message);
  }
  requireWithin({ input, label: `Level at the ${input}`, unit: 'dBm' }, reading.value);
}
