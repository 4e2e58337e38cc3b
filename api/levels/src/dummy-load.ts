import { oscilloscopeReading } from './oscilloscope';
import type { OscilloscopeInput } from './oscilloscope';
import { readingOf } from './reading';
import type { LevelReading } from './reading';
import { wattsFromDbm } from './conversions';
import { dBm } from './units';

/** Watts per watt and decibel, to first order: P = 10^(L/10) gives dP/P = ln 10 / 10 · dL. */
const REL_POWER_PER_DB = Math.LN10 / 10;

/**
 * Power into a dummy load from an oscilloscope across it, for a steady carrier.
 *
 * The same set-up and budget as `oscilloscopeReading`, told in watts. The voltage on a dummy load can exceed what a
 * probe stands: its derating with frequency is on its leaflet, and a burn from radio frequency is deep.
 *
 * @returns watts; uncertainties in watts, symmetrical to first order; volts peak to peak at the load.
 * @throws OutOfDomainError as `oscilloscopeReading`.
 * @example dummyLoadReading({ voltsPerDivision: 1, divisionsPeakToPeak: 4.5, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }).value //=> 5.0625
 * @see JCGM 100:2008 (GUM), 5.1.2
 */
export function dummyLoadReading(input: OscilloscopeInput): LevelReading {
  const { value, voltsPeakToPeak, components } = oscilloscopeReading(input);
  const watts = wattsFromDbm(dBm(value));
  const sources = components.map(({ name, limit, distribution }) => {
    return { name, limit: limit * REL_POWER_PER_DB * watts, distribution };
  });
  return { ...readingOf('dummy-load/1', watts, 'W', sources), voltsPeakToPeak, watts };
}
