import { accuracy, analyzerReading, decibels } from '../analyzer';
import type { AnalyzerInput } from '../analyzer';
import { wattsFromDbm } from '../conversions';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';
import { dBm } from '../units';

/** An analyzer on the tap of a dummy load. */
export interface DummyLoadTapInput extends AnalyzerInput {
  /** From the load to its tap, above the pads in line. */
  tapLossDb: number;
  /** How far from that it may be at this frequency, ± dB. */
  tapToleranceDb: number;
}

const REL_POWER_PER_DB = Math.LN10 / 10;

/**
 * Power into a dummy load from an analyzer on its tap.
 *
 * @returns watts; uncertainties in watts, symmetrical to first order; the four components of the chain: the analyzer's
 *   three and the tap.
 * @throws OutOfDomainError naming the input.
 * @example dummyLoadTapReading({ referenceLevelDbm: 0, divisionsDown: 0.3, dbPerDivision: 10, readToDivisions: 0.05, padsInLineDb: 10, amplitudeAccuracyDb: 1, tapLossDb: 30, tapToleranceDb: 0.5 }).value //=> 5.011872
 * @see JCGM 100:2008 (GUM), 5.1.2
 */
export function dummyLoadTapReading(input: DummyLoadTapInput): LevelReading {
  const atTap = analyzerReading(input);
  const level = dBm(atTap.value + decibels('tapLossDb', 'Loss to the tap', input.tapLossDb));
  const watts = wattsFromDbm(level);
  const limit = accuracy('tapToleranceDb', 'Tolerance of the tap', input.tapToleranceDb);
  const sources = [...atTap.components, { name: 'tap', limit, distribution: 'rectangular' as const }];
  const inWatts = sources.map(({ name, limit: decibel, distribution }) => {
    return { name, limit: decibel * REL_POWER_PER_DB * watts, distribution };
  });
  return { ...readingOf('dummy-load-tap/1', watts, 'W', inWatts), watts };
}
