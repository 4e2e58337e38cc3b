import { requireWithin } from './domain';
import type { LevelReading } from './reading';

// Text for members. Only what is shown is rounded; every judgement is made on the unrounded value.

/**
 * A number with a fixed count of decimals, true minus, no sign on zero.
 *
 * @param decimals - 0 to 12.
 * @example formatFixed(-19.44, 1) //=> '−19.4'
 * @example formatFixed(-0.04, 1) //=> '0.0'
 */
export function formatFixed(value: number, decimals: number): string {
  requireWithin({ input: 'value', label: 'Value' }, value);
  const text = Math.abs(value).toFixed(requireDecimals(decimals));
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/**
 * The same with a plus before what is more than zero, as levels and gains are written.
 *
 * @example formatSigned(0.3705, 2) //=> '+0.37'
 */
export function formatSigned(value: number, decimals: number): string {
  const text = formatFixed(value, decimals);
  return value > 0 && Number(text) !== 0 ? `+${text}` : text;
}

/**
 * Decimals that show an uncertainty with so many significant digits.
 *
 * @param significantDigits - 1 or 2: more is never justified.
 * @returns 0 to 12; 2 for an uncertainty of zero.
 * @example decimalsFor(0.473) //=> 2
 * @example decimalsFor(0.28, 1) //=> 1
 * @see JCGM 100:2008, 7.2.6 (from memory)
 */
export function decimalsFor(expandedUncertainty: number, significantDigits: 1 | 2 = 2): number {
  requireWithin({ input: 'expandedUncertainty', label: 'Uncertainty', atLeast: 0 }, expandedUncertainty);
  if (expandedUncertainty === 0) return 2;
  const leading = Number(expandedUncertainty.toExponential(significantDigits - 1).split('e')[1]);
  return Math.min(Math.max(significantDigits - 1 - leading, 0), 12);
}

/**
 * A reading with its uncertainty, both to the same decimals.
 *
 * @param decimals - as many as the uncertainty deserves where left out; raised when it would be shown as zero.
 * @example formatReading(meterReading({ value: 22.4, unit: 'mA', readToValue: 0.1, accuracyRel: 0.01 }), 1) //=> '22.4 ± 0.3 mA'
 */
export function formatReading(
  reading: Pick<LevelReading, 'value' | 'unit' | 'expandedUncertainty'>,
  decimals?: number,
): string {
  const { value, unit, expandedUncertainty } = reading;
  const asked = decimals ?? decimalsFor(expandedUncertainty);
  const isHidden = expandedUncertainty > 0 && Number(expandedUncertainty.toFixed(asked)) === 0;
  const shown = isHidden ? decimalsFor(expandedUncertainty, 1) : asked;
  const text = unit.startsWith('dB') ? formatSigned(value, shown) : formatFixed(value, shown);
  return `${text} ± ${formatFixed(expandedUncertainty, shown)} ${unit}`;
}

/**
 * The least of the shown numbers that is no less than the value: safe for "… or more would pass".
 *
 * @example formatAtLeast(0.392903, 2) //=> '+0.40'
 */
export function formatAtLeast(value: number, decimals: number): string {
  return formatSigned(towards(Math.ceil, value, decimals), decimals);
}

/**
 * The greatest of the shown numbers that is no more than the value: safe for "… or less would pass".
 *
 * @example formatAtMost(2.607, 2) //=> '+2.60'
 */
export function formatAtMost(value: number, decimals: number): string {
  return formatSigned(towards(Math.floor, value, decimals), decimals);
}

/** The ninth decimal is far below any reading and only binary noise, which must not move 0.40 to 0.41. */
function towards(round: (scaled: number) => number, value: number, decimals: number): number {
  requireWithin({ input: 'value', label: 'Value', atLeast: -1e15, atMost: 1e15 }, value);
  const scale = 10 ** requireDecimals(decimals);
  return round(Number((value * scale).toPrecision(12))) / scale;
}

function requireDecimals(decimals: number): number {
  const domain = { input: 'decimals', label: 'Decimals', atLeast: 0, atMost: 12 };
  return requireWithin(domain, decimals);
}
