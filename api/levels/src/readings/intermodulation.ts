import { accuracy, decibelsDown, rectangular, resolution } from '../analyzer';
import { requireOneOf } from '../domain';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';

/** Two tones and their strongest product on one screen. */
export interface IntermodulationInput {
  /** How far the tones stand below the top line; the weaker one, if they are not quite alike. */
  toneDivisionsDown: number;
  /** How far the strongest third-order product stands below it. */
  productDivisionsDown: number;
  dbPerDivision: number;
  readToDivisions: number;
  /** Stated fidelity of the decibel scale, ± dB. */
  scaleFidelityDb: number;
  /** What the product is told against: each tone, or the peak envelope power 6.02 dB above it. */
  against: 'each tone' | 'peak envelope power';
}

/** Two equal tones lie this far below their peak envelope power, dB. */
const TONE_UNDER_PEAK_DB = 20 * Math.log10(2);

/**
 * Intermodulation of two equal tones from an analyzer.
 *
 * The same transmitter looks 6.02 dB better told below its peak envelope power: say with every figure which it is.
 *
 * @returns dBc, negative when the product is weaker; uncertainties in dB; three rectangular components: each line's
 *   reading resolution and the scale's fidelity. The lines stand so close that flatness does not count.
 * @throws OutOfDomainError naming the input.
 * @example intermodulationReading({ toneDivisionsDown: 0.6, productDivisionsDown: 3.6, dbPerDivision: 10, readToDivisions: 0.05, scaleFidelityDb: 0.5, against: 'peak envelope power' }).value //=> -36.0206
 * @see JCGM 100:2008 (GUM), 5.1.2; PEP = 4 × each tone
 */
export function intermodulationReading(input: IntermodulationInput): LevelReading {
  const { toneDivisionsDown, productDivisionsDown, against } = input;
  requireOneOf({ input: 'against', label: 'Told against' }, ['each tone', 'peak envelope power'], against);
  const tone = decibelsDown({ ...input, divisionsDown: toneDivisionsDown }, 'toneDivisionsDown');
  const product = decibelsDown({ ...input, divisionsDown: productDivisionsDown }, 'productDivisionsDown');
  const toPeak = against === 'each tone' ? 0 : TONE_UNDER_PEAK_DB;
  return readingOf('intermodulation/1', tone - product - toPeak, 'dBc', [
    resolution('reading of the tones', input),
    resolution('reading of the product', input),
    rectangular('scale fidelity', accuracy('scaleFidelityDb', 'Scale fidelity', input.scaleFidelityDb)),
  ]);
}
