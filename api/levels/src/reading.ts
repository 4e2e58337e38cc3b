import { uncertaintyBudget } from './budget';
import type { UncertaintyBudget, UncertaintySource } from './budget';
import { requireWithin } from './domain';

/** Units a direct-reading meter shows. */
export type MeterUnit = 'V' | 'mV' | 'A' | 'mA' | 'ohm' | 'kohm' | 'W' | 'mW' | 'dB';

/** Units of a reading's value and window. */
export type ReadingUnit = 'dBm' | 'dB' | 'dBc' | 'Hz' | 'ns' | MeterUnit;

/**
 * Name and version of a calculation, kept beside every reading so that it can be worked out again. The number rises
 * when the same input would give another answer.
 */
export type Calculation =
  | 'oscilloscope/1'
  | 'dummy-load/1'
  | 'dummy-load-tap/1'
  | 'analyzer/1'
  | 'harmonic/1'
  | 'intermodulation/1'
  | 'two-tone-envelope/1'
  | 'logarithmic-detector/1'
  | 'diode-probe/1'
  | 'meter/1'
  | 'counter/1'
  | 'time-base/1'
  | 'rise-time/1'
  | 'gain/1';

/** A measured value and how sure it is. Nothing in it is rounded. */
export interface LevelReading extends UncertaintyBudget {
  value: number;
  unit: ReadingUnit;
  /** Unit of the uncertainties and of every component: dB for dBm, dB and dBc, otherwise the reading's own. */
  uncertaintyUnit: Exclude<ReadingUnit, 'dBm' | 'dBc'>;
  calculation: Calculation;
  /** Where the method saw a voltage. */
  voltsPeakToPeak?: number;
  /** Where the value is a level or a power. */
  watts?: number;
}

/** Puts a value and its sources of uncertainty together. */
export function readingOf(
  calculation: Calculation,
  value: number,
  unit: ReadingUnit,
  sources: readonly UncertaintySource[],
): LevelReading {
  requireWithin({ input: 'value', label: 'Value', unit, atLeast: -1e15, atMost: 1e15 }, value);
  const uncertaintyUnit = unit === 'dBm' || unit === 'dBc' ? 'dB' : unit;
  return { value, unit, uncertaintyUnit, calculation, ...uncertaintyBudget(sources) };
}
