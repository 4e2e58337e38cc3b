import { oscilloscopeReading, SCREEN_DIVISIONS } from './oscilloscope';
import type { OscilloscopeInput } from './oscilloscope';
import { voltsPeakToPeakFromDbm } from './conversions';
import { dBm, ohms } from './units';
import { verdictOf } from './verdict';
import type { VerdictWindow } from './verdict';

/** Smallest setting advised unless the instrument goes lower, V/div; common practice for a bench oscilloscope. */
export const SMALLEST_VOLTS_PER_DIVISION = 0.002;

/** A smaller setting at which the same trace would still fit the screen, and what it would settle. */
export interface TighterScale {
  voltsPerDivision: number;
  /** Height the same voltage would have. */
  divisionsPeakToPeak: number;
  /** Expanded uncertainty of the same level there, dB. */
  expandedUncertainty: number;
  /** Whether the level just read would pass there. */
  wouldPass: boolean;
  /** Least level that would pass and can be read there, dBm; absent when the window has no low end or none would. */
  passesFrom?: number;
  /** Greatest level that would pass and fits the screen there, dBm; absent when there is no high end or none would. */
  passesUpTo?: number;
}

/**
 * The smallest setting of the 1, 2, 5 row at which the trace still fits, and from what level it would then pass.
 *
 * @param window - dBm.
 * @returns undefined when no smaller setting fits.
 * @throws OutOfDomainError as `oscilloscopeReading` and `verdictOf`.
 * @example tighterScale({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }, { low: 0, high: 3 }).voltsPerDivision //=> 0.01
 * @example tighterScale({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }, { low: 0, high: 3 }).passesFrom //=> 0.392903
 * @example tighterScale({ voltsPerDivision: 0.01, divisionsPeakToPeak: 6.6, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }, { low: 0, high: 3 }) //=> undefined
 */
export function tighterScale(
  input: OscilloscopeInput,
  window: VerdictWindow,
  smallestVoltsPerDivision = SMALLEST_VOLTS_PER_DIVISION,
): TighterScale | undefined {
  const now = oscilloscopeReading(input);
  const height = input.voltsPerDivision * input.divisionsPeakToPeak;
  const setting = smallestFitting(height, smallestVoltsPerDivision);
  if (setting === undefined || setting >= input.voltsPerDivision) return undefined;
  const there = { ...input, voltsPerDivision: setting };
  const divisionsPeakToPeak = height / setting;
  const { expandedUncertainty } = oscilloscopeReading({ ...there, divisionsPeakToPeak });
  return {
    voltsPerDivision: setting,
    divisionsPeakToPeak,
    expandedUncertainty,
    wouldPass: verdictOf(now.value, expandedUncertainty, window) === 'pass',
    ...passingRange(there, window),
  };
}

/** Settings go 1, 2, 5 in each decade; written as decimals so that 0.02 is exactly what a member would type. */
function smallestFitting(height: number, smallest: number): number | undefined {
  for (let decade = -6; decade <= 3; decade++) {
    for (const step of [1, 2, 5]) {
      const setting = Number(`${step}e${decade}`);
      if (setting >= smallest && height / setting <= SCREEN_DIVISIONS) return setting;
    }
  }
  return undefined;
}

function passingRange(
  input: OscilloscopeInput,
  window: VerdictWindow,
): { passesFrom?: number; passesUpTo?: number } {
  const { low, high } = window;
  const span = levelsOnScreen(input);
  const passesLow = (level: number) => low === undefined || level - uncertaintyAt(input, level) >= low;
  const passesHigh = (level: number) => high === undefined || level + uncertaintyAt(input, level) <= high;
  const from = boundary(span.least, span.most, passesLow);
  const upTo = boundary(span.most, span.least, passesHigh);
  if (from === undefined || upTo === undefined || from > upTo) return {};
  return {
    passesFrom: low === undefined ? undefined : from,
    passesUpTo: high === undefined ? undefined : upTo,
  };
}

/** Levels that stand between four times the reading resolution and the height of the screen. */
function levelsOnScreen(input: OscilloscopeInput): { least: number; most: number } {
  const least = Math.min(4 * input.readToDivisions, SCREEN_DIVISIONS);
  const levelOf = (divisionsPeakToPeak: number) =>
    oscilloscopeReading({ ...input, divisionsPeakToPeak }).value;
  return { least: levelOf(least), most: levelOf(SCREEN_DIVISIONS) };
}

function uncertaintyAt(input: OscilloscopeInput, level: number): number {
  const volts = voltsPeakToPeakFromDbm(dBm(level), ohms(input.loadOhms));
  const height = volts / (input.voltsPerDivision * input.probeRatio);
  const divisionsPeakToPeak = Math.min(Math.max(height, 4 * input.readToDivisions), SCREEN_DIVISIONS);
  return oscilloscopeReading({ ...input, divisionsPeakToPeak }).expandedUncertainty;
}

/**
 * First level on the way from `start` to `goal` that passes, by halving: once one passes, all further on do.
 */
function boundary(start: number, goal: number, passes: (level: number) => boolean): number | undefined {
  if (passes(start)) return start;
  if (!passes(goal)) return undefined;
  let failing = start;
  let passing = goal;
  for (let step = 0; step < 60; step++) {
    const middle = (failing + passing) / 2;
    if (passes(middle)) passing = middle;
    else failing = middle;
  }
  return passing;
}
