import { requireWithin } from './domain';
import { readingOf } from './reading';
import type { LevelReading } from './reading';
import { hertz } from './units';

/** What a frequency counter shows and how good its time base is. */
export interface CounterInput {
  frequencyHertz: number;
  gateSeconds: number;
  /** Stated limit of the time base, parts per million, with ageing since its calibration. */
  timeBasePpm: number;
  /** Division before the counter; 1 where left out. */
  prescaler?: number;
}

/**
 * Frequency from a direct counter.
 *
 * @returns Hz; two components, rectangular: one count (prescaler over gate time) and the time base.
 * @throws OutOfDomainError naming the input, also when the gate is too short to count one cycle.
 * @example counterReading({ frequencyHertz: 14.1e6, gateSeconds: 1, timeBasePpm: 1 }).expandedUncertainty //=> 16.322173
 * @see JCGM 100:2008 (GUM), 4.3.7 and 5.1.2; one count either way is the nature of a gated counter (common practice)
 */
export function counterReading(input: CounterInput): LevelReading {
  const { gateSeconds, timeBasePpm, prescaler = 1 } = input;
  const frequency = hertz(input.frequencyHertz, 'frequencyHertz');
  requireWithin({ input: 'prescaler', label: 'Prescaler', atLeast: 1, atMost: 1e6 }, prescaler);
  requireWithin(
    { input: 'timeBasePpm', label: 'Time base', unit: 'ppm', atLeast: 0, atMost: 1000 },
    timeBasePpm,
  );
  const oneCycle = prescaler / frequency;
  requireWithin(
    { input: 'gateSeconds', label: 'Gate time', unit: 's', atLeast: oneCycle, atMost: 1e5 },
    gateSeconds,
  );
  return readingOf('counter/1', frequency, 'Hz', [
    { name: 'one count', limit: prescaler / gateSeconds, distribution: 'rectangular' },
    { name: 'time base', limit: frequency * timeBasePpm * 1e-6, distribution: 'rectangular' },
  ]);
}
