import { decimalsFor } from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import type { BuildCheck, Reading } from '../api/builds';

const HERTZ_PER_MEGAHERTZ = 1e6;
/** By eye along a screen, not by a counter: to be told in megahertz. */
const COARSE_HERTZ = 10_000;

type Measured = Pick<Reading, 'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty'>;
type Asked = Pick<BuildCheck, 'windowLow' | 'windowHigh' | 'unit'>;

/** A value with its unit and uncertainty, each as a text of its own, so that a row can set them apart. */
export interface ReadingWords {
  value: string;
  unit: string;
  plusMinus: string;
}

/** Levels, gains and ratios carry their sign; a current does not need one. */
const numberText = (value: number, unit: string, decimals: number): string =>
  unit.startsWith('dB') ? signed(value, decimals) : fixed(value, decimals);

/**
 * A reading for a row of a list (one figure of uncertainty) or for a form (two).
 * @example readingWords({ value: -19.4, unit: 'dBm', uncertaintyUnit: 'dB', expandedUncertainty: 0.47 }, 1) //=> { value: '−19.4', unit: 'dBm', plusMinus: '± 0.5' }
 */
export function readingWords(reading: Measured, figures: 1 | 2): ReadingWords {
  const { value, unit, expandedUncertainty } = reading;
  if (unit === 'Hz' && expandedUncertainty >= COARSE_HERTZ) {
    const megahertz = expandedUncertainty / HERTZ_PER_MEGAHERTZ;
    const decimals = decimalsFor(megahertz, figures);
    return {
      value: fixed(value / HERTZ_PER_MEGAHERTZ, decimals),
      unit: 'MHz',
      plusMinus: `± ${fixed(megahertz, decimals)} MHz`,
    };
  }
  if (unit === 'Hz')
    return {
      value: fixed(value / HERTZ_PER_MEGAHERTZ, 6),
      unit: 'MHz',
      plusMinus: `± ${fixed(expandedUncertainty, 0)} Hz`,
    };
  // A level is always told to a tenth at least, so that a column of them lines up.
  const least = unit.startsWith('dB') ? figures : 0;
  const decimals = Math.max(least, Math.min(decimalsFor(expandedUncertainty, figures), 3));
  return {
    value: numberText(value, unit, decimals),
    unit,
    plusMinus: `± ${fixed(expandedUncertainty, decimals)}`,
  };
}

/** '+0.37 ± 0.47 dBm', for a sentence. */
export function readingSentence(reading: Measured, figures: 1 | 2 = 2): string {
  const { value, unit, plusMinus } = readingWords(reading, figures);
  return unit === 'MHz' ? `${value} MHz ${plusMinus}` : `${value} ${plusMinus} ${unit}`;
}

/** Decimals that say a window's end exactly, at least one. */
const decimalsOf = (value: number): number => {
  const [, fraction = ''] = String(value).split('.');
  return Math.min(Math.max(fraction.length, 1), 6);
};

/** '0.0 to +3.0 dBm', 'at most −25.0 dBc', '14.0 dB or more'. */
export function windowText({ windowLow, windowHigh, unit }: Asked, withUnit = true): string {
  const isHertz = unit === 'Hz';
  const scale = isHertz ? HERTZ_PER_MEGAHERTZ : 1;
  const end = (value: number): string => numberText(value / scale, unit ?? '', decimalsOf(value / scale));
  const shownUnit = withUnit ? ` ${isHertz ? 'MHz' : (unit ?? '')}` : '';
  if (windowLow !== null && windowHigh !== null) return `${end(windowLow)} to ${end(windowHigh)}${shownUnit}`;
  if (windowHigh !== null) return `at most ${end(windowHigh)}${shownUnit}`;
  return windowLow === null ? '' : `${end(windowLow)}${shownUnit} or more`;
}

/** 'serial 07'. */
export const serialText = (serial: number): string => `serial ${String(serial).padStart(2, '0')}`;
