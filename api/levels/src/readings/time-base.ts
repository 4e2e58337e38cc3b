import { rectangular } from '../analyzer';
import { requireWithin } from '../domain';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';

/** Whole cycles counted along the screen of an oscilloscope. */
export interface TimeBaseInput {
  cycles: number;
  /** Divisions they take. */
  divisions: number;
  secondsPerDivision: number;
  /** Half width within which the divisions were read. */
  readToDivisions: number;
  /** Of the time base, relative; {@link ASSUMED_TIME_BASE_REL} where left out. */
  timeBaseToleranceRel?: number;
}

/** Common practice for a bench oscilloscope; a digital one is far better, and says so. */
export const ASSUMED_TIME_BASE_REL = 0.03;

/**
 * Frequency from the time base of an oscilloscope: enough to tell a band, not a channel.
 *
 * @returns Hz; two rectangular components: reading resolution and time base.
 * @throws OutOfDomainError naming the input.
 * @example timeBaseReading({ cycles: 3, divisions: 4, secondsPerDivision: 0.2e-6, readToDivisions: 0.1 }).value //=> 3750000
 * @see JCGM 100:2008 (GUM), 4.3.7 and 5.1.2; f = cycles over time
 */
export function timeBaseReading(input: TimeBaseInput): LevelReading {
  const { cycles, divisions, secondsPerDivision, readToDivisions } = input;
  const { timeBaseToleranceRel = ASSUMED_TIME_BASE_REL } = input;
  requireWithin({ input: 'cycles', label: 'Cycles', above: 0, atMost: 1000 }, cycles);
  requireWithin({ input: 'divisions', label: 'Divisions', unit: 'div', above: 0, atMost: 20 }, divisions);
  const seconds = {
    input: 'secondsPerDivision',
    label: 'Time per division',
    unit: 's/div',
    above: 0,
    atMost: 100,
  };
  requireWithin(seconds, secondsPerDivision);
  const readTo = {
    input: 'readToDivisions',
    label: 'Read to within',
    unit: 'div',
    above: 0,
    atMost: divisions / 4,
  };
  requireWithin(readTo, readToDivisions);
  const tolerance = {
    input: 'timeBaseToleranceRel',
    label: 'Tolerance of the time base',
    atLeast: 0,
    atMost: 0.25,
  };
  requireWithin(tolerance, timeBaseToleranceRel);
  const frequency = cycles / (divisions * secondsPerDivision);
  return readingOf('time-base/1', frequency, 'Hz', [
    rectangular('reading resolution', (frequency * readToDivisions) / divisions),
    rectangular('time base', frequency * timeBaseToleranceRel),
  ]);
}
