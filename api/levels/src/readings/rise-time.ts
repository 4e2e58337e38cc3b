import { rectangular } from '../analyzer';
import { requireWithin } from '../domain';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';
import { ASSUMED_TIME_BASE_REL } from './time-base';

/** A rising edge on an oscilloscope, and how fast that is itself. */
export interface RiseTimeInput {
  /** From 10 to 90 % of the step. */
  divisions: number;
  secondsPerDivision: number;
  readToDivisions: number;
  /** Of oscilloscope and probe together, −3 dB. */
  bandwidthHertz: number;
  /** Relative; {@link ASSUMED_TIME_BASE_REL} where left out. */
  timeBaseToleranceRel?: number;
  /** How far its rise may be from 0.35 over its bandwidth, relative; {@link ASSUMED_RISE_REL} where left out. */
  riseToleranceRel?: number;
}

/** A response that is not quite that of one pole: common practice. */
export const ASSUMED_RISE_REL = 0.1;

/** Rise time of an edge without the oscilloscope's share. */
export interface RiseTimeReading extends LevelReading {
  shownSeconds: number;
  instrumentSeconds: number;
}

/**
 * Rise time of a signal from what an oscilloscope shows of it.
 *
 * Bandwidth here is that of rise times; a level near it reads low as well, by 3 dB at the bandwidth itself.
 *
 * @returns ns; three rectangular components: reading resolution, time base, the instrument's own rise.
 * @throws OutOfDomainError naming the input: an edge no slower than the instrument's own, by a tenth at least.
 * @example riseTimeReading({ divisions: 6, secondsPerDivision: 1e-9, readToDivisions: 0.1, bandwidthHertz: 100e6 }).value //=> 4.873397
 * @see 0.35/bandwidth, and the root of the difference of squares: common practice
 */
export function riseTimeReading(input: RiseTimeInput): RiseTimeReading {
  const { secondsPerDivision, readToDivisions, bandwidthHertz } = input;
  const { timeBaseToleranceRel = ASSUMED_TIME_BASE_REL, riseToleranceRel = ASSUMED_RISE_REL } = input;
  const part = { atLeast: 0, atMost: 0.25 };
  requireWithin(
    { ...part, input: 'timeBaseToleranceRel', label: 'Tolerance of the time base' },
    timeBaseToleranceRel,
  );
  requireWithin({ ...part, input: 'riseToleranceRel', label: 'Tolerance of its own rise' }, riseToleranceRel);
  const bandwidth = { input: 'bandwidthHertz', label: 'Bandwidth', unit: 'Hz', above: 0, atMost: 1e12 };
  const instrumentSeconds = 0.35 / requireWithin(bandwidth, bandwidthHertz);
  const shownSeconds = shownOf(input, instrumentSeconds);
  const signal = Math.sqrt(shownSeconds ** 2 - instrumentSeconds ** 2);
  const nano = 1e9;
  const reading = readingOf('rise-time/1', nano * signal, 'ns', [
    rectangular('reading resolution', (nano * readToDivisions * secondsPerDivision * shownSeconds) / signal),
    rectangular('time base', (nano * timeBaseToleranceRel * shownSeconds ** 2) / signal),
    rectangular('the instrument’s own rise', (nano * riseToleranceRel * instrumentSeconds ** 2) / signal),
  ]);
  return { ...reading, shownSeconds, instrumentSeconds };
}

function shownOf(
  { divisions, secondsPerDivision, readToDivisions }: RiseTimeInput,
  instrumentSeconds: number,
): number {
  const time = { input: 'secondsPerDivision', label: 'Time per division', unit: 's/div' };
  requireWithin({ ...time, above: 0, atMost: 100 }, secondsPerDivision);
  const least = Number(((1.1 * instrumentSeconds) / secondsPerDivision).toPrecision(6));
  const width = { input: 'divisions', label: 'Divisions, for an oscilloscope this fast', unit: 'div' };
  requireWithin({ ...width, atLeast: least, atMost: 20 }, divisions);
  const readTo = { input: 'readToDivisions', label: 'Read to within', unit: 'div', above: 0 };
  requireWithin({ ...readTo, atMost: divisions / 4 }, readToDivisions);
  return divisions * secondsPerDivision;
}
