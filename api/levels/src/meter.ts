import { requireWithin } from './domain';
import { readingOf } from './reading';
import type { LevelReading, MeterUnit } from './reading';

/** What a direct-reading meter shows and how good it is. Everything is in `unit`. */
export interface MeterInput {
  /** As shown, with its sign. */
  value: number;
  unit: MeterUnit;
  /** Half width within which it was read: the last digit that stands still, or part of a scale mark. */
  readToValue: number;
  /** Stated accuracy relative to the reading, 0.01 for 1 %. */
  accuracyRel: number;
  /** Stated fixed part of the accuracy (digits, or per cent of full scale), in `unit`; 0 where left out. */
  accuracyFixed?: number;
}

/**
 * Value of a voltage, current, resistance or power from a meter.
 *
 * @returns value and uncertainties in `unit`; two components, rectangular: reading resolution and accuracy.
 * @throws OutOfDomainError naming the input.
 * @example meterReading({ value: 22.4, unit: 'mA', readToValue: 0.1, accuracyRel: 0.01 }).expandedUncertainty //=> 0.283257
 * @see JCGM 100:2008 (GUM), 4.3.7 and 5.1.2
 */
export function meterReading(input: MeterInput): LevelReading {
  const { value, unit, readToValue, accuracyRel, accuracyFixed = 0 } = input;
  requireWithin({ input: 'value', label: 'Value', unit, atLeast: -1e12, atMost: 1e12 }, value);
  requireWithin({ input: 'readToValue', label: 'Read to within', unit, above: 0, atMost: 1e12 }, readToValue);
  requireWithin({ input: 'accuracyRel', label: 'Accuracy', atLeast: 0, atMost: 0.5 }, accuracyRel);
  requireWithin(
    { input: 'accuracyFixed', label: 'Fixed accuracy', unit, atLeast: 0, atMost: 1e12 },
    accuracyFixed,
  );
  return readingOf('meter/1', value, unit, [
    { name: 'reading resolution', limit: readToValue, distribution: 'rectangular' },
    // A stated "per cent plus digits" is one limit: its two parts add.
    { name: 'accuracy', limit: accuracyRel * Math.abs(value) + accuracyFixed, distribution: 'rectangular' },
  ]);
}
