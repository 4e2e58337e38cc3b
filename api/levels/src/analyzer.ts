import type { UncertaintySource } from './budget';
import { wattsFromDbm } from './conversions';
import { requireWithin } from './domain';
import { readingOf } from './reading';
import type { LevelReading } from './reading';
import { dBm } from './units';

/** Limit assumed for a fixed pad when none is stated, dB; common practice for a bought or a measured home-made one. */
export const ASSUMED_PAD_TOLERANCE_DB = 0.2;

/** Height of an analyzer's screen in divisions; common practice. */
const ANALYZER_DIVISIONS = 10;

/** What a spectrum analyzer shows, and what stands before its input. */
export interface AnalyzerInput {
  /** Level of the top line. */
  referenceLevelDbm: number;
  /** How far the peak stands below the top line, 0 to 10. */
  divisionsDown: number;
  dbPerDivision: number;
  /** Half width within which the peak was read, in divisions. */
  readToDivisions: number;
  /** All pads between the stage and the input, 0 or more. */
  padsInLineDb: number;
  /** Limit of the pads together; {@link ASSUMED_PAD_TOLERANCE_DB} where left out, nothing when no pad is in line. */
  padToleranceDb?: number;
  /** Stated absolute amplitude accuracy, ± dB. */
  amplitudeAccuracyDb: number;
}

/**
 * Level at the stage from a spectrum analyzer.
 *
 * @returns dBm before the pads; uncertainties in dB; three components (reading resolution, amplitude accuracy, pads),
 *   each a rectangular limit; watts.
 * @throws OutOfDomainError naming the input.
 * @example analyzerReading({ referenceLevelDbm: 0, divisionsDown: 3.2, dbPerDivision: 10, readToDivisions: 0.05, padsInLineDb: 20, amplitudeAccuracyDb: 1 }).value //=> -12
 * @see JCGM 100:2008 (GUM), 5.1.2
 */
export function analyzerReading(input: AnalyzerInput): LevelReading {
  const seen = dBm(input.referenceLevelDbm, 'referenceLevelDbm') - decibelsDown(input, 'divisionsDown');
  const level = dBm(seen + decibels('padsInLineDb', 'Pads in line', input.padsInLineDb));
  const reading = readingOf('analyzer/1', level, 'dBm', [
    resolution('reading resolution', input),
    rectangular(
      'amplitude accuracy',
      accuracy('amplitudeAccuracyDb', 'Amplitude accuracy', input.amplitudeAccuracyDb),
    ),
    rectangular('pads', padLimit(input)),
  ]);
  return { ...reading, watts: wattsFromDbm(level) };
}

/** Two peaks on one screen: the carrier and the harmonic (or spur) to be judged against it. */
export interface HarmonicInput {
  /** How far the fundamental stands below the top line. */
  fundamentalDivisionsDown: number;
  /** How far the harmonic stands below the top line. */
  harmonicDivisionsDown: number;
  dbPerDivision: number;
  readToDivisions: number;
  /** Stated fidelity of the decibel scale, ± dB. */
  scaleFidelityDb: number;
  /** Stated flatness between the two frequencies, ± dB. */
  flatnessDb: number;
}

/**
 * Level of a harmonic below the carrier, both read on one screen, so that reference level and pads cancel.
 *
 * @returns dBc, negative when the harmonic is weaker; uncertainties in dB; four components (each peak's reading
 *   resolution, scale fidelity, flatness).
 * @throws OutOfDomainError naming the input.
 * @example harmonicReading({ fundamentalDivisionsDown: 0.5, harmonicDivisionsDown: 3.7, dbPerDivision: 10, readToDivisions: 0.05, scaleFidelityDb: 0.5, flatnessDb: 0.8 }).value //=> -32
 * @see JCGM 100:2008 (GUM), 5.1.2
 */
export function harmonicReading(input: HarmonicInput): LevelReading {
  const { fundamentalDivisionsDown, harmonicDivisionsDown } = input;
  const fundamental = decibelsDown(
    { ...input, divisionsDown: fundamentalDivisionsDown },
    'fundamentalDivisionsDown',
  );
  const harmonic = decibelsDown({ ...input, divisionsDown: harmonicDivisionsDown }, 'harmonicDivisionsDown');
  return readingOf('harmonic/1', fundamental - harmonic, 'dBc', [
    resolution('reading of the fundamental', input),
    resolution('reading of the harmonic', input),
    rectangular('scale fidelity', accuracy('scaleFidelityDb', 'Scale fidelity', input.scaleFidelityDb)),
    rectangular('flatness', accuracy('flatnessDb', 'Flatness', input.flatnessDb)),
  ]);
}

/** A decibel scale and how well it was read. */
export interface DecibelScale {
  dbPerDivision: number;
  readToDivisions: number;
}

/** How far below the top line, dB. */
export function decibelsDown(seen: DecibelScale & { divisionsDown: number }, input: string): number {
  const divisions = { input, label: 'Divisions down', unit: 'div', atLeast: 0, atMost: ANALYZER_DIVISIONS };
  return requireWithin(divisions, seen.divisionsDown) * perDivision(seen);
}

function perDivision({ dbPerDivision }: DecibelScale): number {
  const domain = {
    input: 'dbPerDivision',
    label: 'Decibels per division',
    unit: 'dB/div',
    above: 0,
    atMost: 20,
  };
  return requireWithin(domain, dbPerDivision);
}

/** What reading a scale to part of a division leaves open. */
export function resolution(name: string, scale: DecibelScale): UncertaintySource {
  const domain = { input: 'readToDivisions', label: 'Read to within', unit: 'div', above: 0, atMost: 2 };
  return rectangular(name, requireWithin(domain, scale.readToDivisions) * perDivision(scale));
}

/** Stated limit of the pads in line, or the assumed one; nothing without pads. */
export function padLimit({
  padsInLineDb,
  padToleranceDb,
}: Pick<AnalyzerInput, 'padsInLineDb' | 'padToleranceDb'>): number {
  const assumed = padsInLineDb === 0 ? 0 : ASSUMED_PAD_TOLERANCE_DB;
  return accuracy('padToleranceDb', 'Pad tolerance', padToleranceDb ?? assumed);
}

/** A number of decibels that only takes away. */
export function decibels(input: string, label: string, value: number): number {
  return requireWithin({ input, label, unit: 'dB', atLeast: 0, atMost: 200 }, value);
}

/** A stated ± accuracy. */
export function accuracy(input: string, label: string, value: number): number {
  return requireWithin({ input, label, unit: 'dB', atLeast: 0, atMost: 20 }, value);
}

/** A source with a stated limit and nothing known inside it. */
export function rectangular(name: string, limit: number): UncertaintySource {
  return { name, limit, distribution: 'rectangular' };
}
