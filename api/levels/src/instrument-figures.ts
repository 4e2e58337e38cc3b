import { isMeterUnit } from './entry-fields';
import type { EntryMethod } from './entry-fields';
import { formatQuantity } from './format-quantity';
import type { QuantityUnit } from './quantity-units';

/** Figures by name, as they stand on an instrument's sheet; relative ones as fractions. */
export type InstrumentFigures = Readonly<Record<string, number>>;

interface FigureKind {
  label: string;
  unit: QuantityUnit;
  /** A limit of uncertainty, ±; otherwise a figure of the instrument that stands in a field of the form. */
  isLimit?: boolean;
}

const limit = (label: string, unit: QuantityUnit): FigureKind => ({ label, unit, isLimit: true });

/** What an instrument may say of itself, by the name its figure has in the methods. */
const FIGURES: Readonly<Record<string, FigureKind>> = {
  amplitudeAccuracyDb: limit('Levels', 'dB'),
  scaleFidelityDb: limit('Decibel scale', 'dB'),
  flatnessDb: limit('Flatness', 'dB'),
  verticalGainToleranceRel: limit('Vertical gain', '%'),
  timeBaseToleranceRel: limit('Time base', '%'),
  timeBasePpm: limit('Time base', 'ppm'),
  accuracyRel: limit('Shown value', '%'),
  conformityDb: limit('Fit of its line', 'dB'),
  voltsPerDb: { label: 'Slope, each decibel', unit: 'V' },
  interceptDbm: { label: 'Intercept', unit: 'dBm' },
  validFromDbm: { label: 'The line holds from', unit: 'dBm' },
  validToDbm: { label: 'The line holds up to', unit: 'dBm' },
  padsInLineDb: { label: 'Attenuation built in', unit: 'dB' },
};

/** Names of the figures an instrument may state. */
export const INSTRUMENT_FIGURES: readonly string[] = Object.keys(FIGURES);

const SCOPE = ['verticalGainToleranceRel'];
const SCREEN = ['scaleFidelityDb', 'flatnessDb'];
const LINE = ['voltsPerDb', 'interceptDbm', 'validFromDbm', 'validToDbm', 'padsInLineDb'];

/** Which of them a method works with. */
const USED: Record<EntryMethod, readonly string[]> = {
  oscilloscope: SCOPE,
  'dummy-load': SCOPE,
  'two-tone-envelope': SCOPE,
  'time-base': ['timeBaseToleranceRel'],
  analyzer: ['amplitudeAccuracyDb', 'padsInLineDb'],
  'dummy-load-tap': ['amplitudeAccuracyDb', 'padsInLineDb'],
  harmonic: SCREEN,
  intermodulation: ['scaleFidelityDb'],
  meter: ['accuracyRel'],
  'diode-probe': ['accuracyRel'],
  counter: ['timeBasePpm'],
  'log-detector': ['conformityDb', 'accuracyRel', ...LINE],
};

/**
 * Those figures of an instrument that a method works with, by their own names.
 *
 * @param unit - of the reading: decibels shown by a meter are a difference, so no part of its value is in them.
 * @example figuresFor('counter', 'Hz', { timeBasePpm: 0.5, flatnessDb: 0.8 }) //=> { timeBasePpm: 0.5 }
 * @example figuresFor('meter', 'dB', { accuracyRel: 0.01 }) //=> {}
 */
export function figuresFor(method: EntryMethod, unit: string, figures: InstrumentFigures): InstrumentFigures {
  if (method === 'meter' && (unit === 'dB' || !isMeterUnit(unit))) return {};
  const named = USED[method].map((name) => [name, figures[name]] as const);
  return Object.fromEntries(named.filter((pair): pair is [string, number] => pair[1] !== undefined));
}

/**
 * What a method is to take for granted: the plan's own accuracies, and over them those the instrument states.
 *
 * @example assumptionsWith('analyzer', 'dBm', { amplitudeAccuracyDb: 1.5 }, { amplitudeAccuracyDb: 0.8 }) //=> { amplitudeAccuracyDb: 0.8 }
 * @example assumptionsWith('diode-probe', 'dBm', {}, { accuracyRel: 0.005 }) //=> { meterAccuracyRel: 0.005 }
 */
export function assumptionsWith(
  method: EntryMethod,
  unit: string,
  planned: Readonly<Record<string, number>>,
  figures: InstrumentFigures,
): Record<string, number> {
  const { accuracyRel, ...own } = figuresFor(method, unit, figures);
  // Behind a probe or a detector the meter is one part of several, and has a name of its own.
  const name = method === 'meter' ? 'accuracyRel' : 'meterAccuracyRel';
  return { ...planned, ...own, ...(accuracyRel !== undefined && { [name]: accuracyRel }) };
}

/** One figure, to be shown. */
export interface FigureWords {
  name: string;
  label: string;
  /** '± 3 %', '25 mV'. */
  words: string;
}

/**
 * An instrument's figures in words, in a fixed order; a name that is not known is left out.
 *
 * @example figureWords({ verticalGainToleranceRel: 0.03 }) //=> [{ name: 'verticalGainToleranceRel', label: 'Vertical gain', words: '± 3 %' }]
 * @example figureWords({ voltsPerDb: 0.025 }) //=> [{ name: 'voltsPerDb', label: 'Slope, each decibel', words: '25 mV' }]
 */
export function figureWords(figures: InstrumentFigures): FigureWords[] {
  return Object.entries(FIGURES).flatMap(([name, { label, unit, isLimit }]) => {
    const value = figures[name];
    if (value === undefined) return [];
    const shown = formatQuantity(unit === '%' ? value * 100 : value, unit);
    return [{ name, label, words: isLimit ? `± ${shown}` : shown }];
  });
}
