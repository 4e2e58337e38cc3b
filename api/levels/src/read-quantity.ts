import { formatUnderstood } from './format-quantity';
import { normalised, typedNumber } from './quantity-number';
import type { TypedNumber } from './quantity-number';
import { suffixOf } from './quantity-suffix';
import { impossiblePrefix, LONGEST, twoWays, unreadable, wrongUnit } from './quantity-questions';
import { PREFIX_EXPONENT, splitUnit } from './quantity-units';
import type { Prefix, QuantityUnit } from './quantity-units';

/** A number in the unit asked for. */
export interface ReadQuantity {
  value: number;
  /** How it was read, when that is not plain from what was typed: "4,700 ohm" for `4.7k`. */
  understoodAs?: string;
}

/**
 * Reads what a member types into a field: `4.7k`, `4k7`, `300m`, `20 mV`, `0.2 us/div`, `−20dBm`, `10 µW`, `1,5`, `±0.1`.
 *
 * `m` and `M` are different. A comma is a decimal comma where it can only be one. `±` is a way to write a tolerance and
 * is dropped, except before a level.
 *
 * @param unit - unit of the field; a number without letters is in it, and so is the result. `300m` in a mA field is
 *   300 mA: a prefix counts from the unit without prefix.
 * @param input - name to report in an error.
 * @throws UnreadableQuantityError for what is no quantity; WrongUnitError for a unit of another kind; AskingError, with
 *   candidates, for `4,700` (4.7 or 4700) and for a prefix no bench has (14.1 mHz).
 * @example readQuantity('4.7k', 'ohm') //=> { value: 4700, understoodAs: '4,700 ohm' }
 * @example readQuantity('4k7', 'ohm').value //=> 4700
 * @example readQuantity('20 mV', 'V/div').value //=> 0.02
 * @example readQuantity('−20dBm', 'dBm') //=> { value: -20 }
 * @example readQuantity('1,5', 'div') //=> { value: 1.5, understoodAs: '1.5 div' }
 * @example readQuantity('14.1 mHz', 'Hz') //=> throws AskingError
 * @example readQuantity('20 dB', 'ohm') //=> throws WrongUnitError
 * @see SI brochure, prefixes; IEC 60062 for `4k7` (both from memory)
 */
export function readQuantity(text: string, unit: QuantityUnit, input = 'quantity'): ReadQuantity {
  const number = numberIn(text, unit, input);
  const coded = letterCoded(number);
  const { digits, exponent, rest, sign } = coded ?? number;
  const target = splitUnit(unit);
  if (sign === '±' && (unit === 'dBm' || unit === 'dBc')) throw unreadable(text, unit, input);
  const suffix = suffixOf(rest, target.base);
  if (suffix.kind === 'other unit') throw wrongUnit(text, unit, input);
  if (suffix.kind === 'unreadable') throw unreadable(text, unit, input);
  if (suffix.kind === 'impossible prefix') throw impossiblePrefix(text, unit, input, digits, suffix.prefix);
  const prefix = suffix.kind === 'none' ? target.prefix : suffix.prefix;
  const power = exponent + powerOf(prefix) - powerOf(target.prefix);
  // Adding zero turns −0 into 0: nobody means a negative nothing.
  const value = Number(`${sign === '-' ? '-' : ''}${digits}e${power}`) + 0;
  requireRepresentable(value, digits, text, unit, input);
  const isPlain = !number.isUnusual && coded === undefined && (suffix.kind === 'none' || suffix.isWritten);
  const inFieldUnit = target.prefix === undefined || prefix === target.prefix;
  return isPlain && inFieldUnit ? { value } : { value, understoodAs: formatUnderstood(value, unit) };
}

const LETTER_CODED = /^(?<letter>[pnuµmkKMGR])(?<fraction>\d+)(?<rest>.*)$/s;

function powerOf(prefix: Prefix | undefined): number {
  return prefix === undefined ? 0 : PREFIX_EXPONENT[prefix];
}

function numberIn(text: string, unit: QuantityUnit, input: string): TypedNumber {
  const number = text.length > LONGEST ? undefined : typedNumber(normalised(text));
  if (number === undefined) throw unreadable(text, unit, input);
  if ('digits' in number) return number;
  throw twoWays(text, unit, input, number);
}

/** `4k7`: the letter stands where the point would, R for no prefix. Only between whole numbers. */
function letterCoded(number: TypedNumber): TypedNumber | undefined {
  const { letter, fraction, rest = '' } = LETTER_CODED.exec(number.rest)?.groups ?? {};
  if (letter === undefined || number.isUnusual || number.digits.includes('.')) return undefined;
  const unit = rest.trim();
  const withPrefix = letter === 'R' ? unit || 'ohm' : `${letter}${unit}`;
  return { ...number, digits: `${number.digits}.${fraction}`, rest: withPrefix };
}

/** 1e400 has no number and 1e-400 would silently be nothing. */
function requireRepresentable(
  value: number,
  digits: string,
  text: string,
  unit: QuantityUnit,
  input: string,
): void {
  const isLost = value === 0 && /[1-9]/.test(digits);
  if (!Number.isFinite(value) || isLost) throw unreadable(text, unit, input);
}
