import { decimalsFor, formatAtLeast, formatAtMost, formatFixed, formatSigned } from './format';
import { formatQuantity } from './format-quantity';
import type { LevelReading } from './reading';
import type { TighterScale } from './tighter-scale';
import { whyTooClose } from './verdict';
import type { StraddledEnd, VerdictWindow } from './verdict';

type JudgedReading = Pick<LevelReading, 'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty'>;

/**
 * In words: which end is too close, by how much, and what would settle it.
 *
 * @param tighter - advice from `tighterScale`, when the reading came from an oscilloscope.
 * @returns sentences for a member; empty unless the verdict is 'too close to call'.
 * @throws OutOfDomainError as `whyTooClose`.
 * @example tooCloseText({ value: 14.59, unit: 'dB', uncertaintyUnit: 'dB', expandedUncertainty: 0.61 }, { low: 13, high: 15 }) //=> 'The high end of your reading is +15.20 dB, 0.20 dB over the window. With ± 0.61, +14.39 or less would pass.'
 */
export function tooCloseText(reading: JudgedReading, window: VerdictWindow, tighter?: TighterScale): string {
  const ends = whyTooClose(reading.value, reading.expandedUncertainty, window);
  if (ends.length === 0) return '';
  const reasons = ends.map((end) => reasonText(end, reading));
  return [...reasons, adviceText(ends, reading, tighter)].join(' ');
}

function reasonText({ end, reach, past }: StraddledEnd, reading: JudgedReading): string {
  const decimals = decimalsFor(reading.expandedUncertainty);
  const shown = formatFixed(past, decimals);
  const distance = Number(shown) === 0 ? `less than ${formatFixed(10 ** -decimals, decimals)}` : shown;
  const side = end === 'low' ? 'under' : 'over';
  const reached = numberText(reading)(reach, decimals);
  return `The ${end} end of your reading is ${reached} ${reading.unit}, ${distance} ${reading.uncertaintyUnit} ${side} the window.`;
}

function adviceText(ends: readonly StraddledEnd[], reading: JudgedReading, tighter?: TighterScale): string {
  if (tighter !== undefined) {
    const text = tighterText(ends, tighter);
    if (text !== undefined) return text;
  }
  const [only, other] = ends;
  if (only === undefined || other !== undefined)
    return 'The window is narrower than this reading can settle.';
  return `With ± ${uncertaintyText(reading.expandedUncertainty)}, ${passText(only.end, only.passesFrom, reading)} would pass.`;
}

function tighterText(ends: readonly StraddledEnd[], tighter: TighterScale): string | undefined {
  const setting = formatQuantity(tighter.voltsPerDivision, 'V/div');
  const opening = `At ${setting} it tightens to ± ${uncertaintyText(tighter.expandedUncertainty)}`;
  if (tighter.wouldPass) return `${opening}, and this level would pass.`;
  const dbm = { unit: 'dBm', expandedUncertainty: tighter.expandedUncertainty } as const;
  const passes = ends.map(({ end }) => {
    const from = end === 'low' ? tighter.passesFrom : tighter.passesUpTo;
    return from === undefined ? undefined : passText(end, from, dbm);
  });
  if (passes.some((text) => text === undefined)) return undefined;
  return `${opening}, and ${passes.join(' and ')} would pass.`;
}

/** Rounded to the safe side, so that a value just as shown does pass. */
function passText(
  end: 'low' | 'high',
  from: number,
  reading: Pick<JudgedReading, 'unit' | 'expandedUncertainty'>,
): string {
  const decimals = decimalsFor(reading.expandedUncertainty);
  const text = end === 'low' ? formatAtLeast(from, decimals) : formatAtMost(from, decimals);
  const shown = reading.unit.startsWith('dB') ? text : text.replace('+', '');
  return `${shown} or ${end === 'low' ? 'more' : 'less'}`;
}

function uncertaintyText(expandedUncertainty: number): string {
  return formatFixed(expandedUncertainty, decimalsFor(expandedUncertainty));
}

function numberText({ unit }: JudgedReading): (value: number, decimals: number) => string {
  return unit.startsWith('dB') ? formatSigned : formatFixed;
}
