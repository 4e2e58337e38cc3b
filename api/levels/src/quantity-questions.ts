import { AskingError, UnreadableQuantityError, WrongUnitError } from './errors';
import type { AmbiguousNumber } from './quantity-number';
import { BASE_UNITS, splitUnit } from './quantity-units';
import type { Prefix, QuantityUnit } from './quantity-units';

/** Longer than any quantity; a whole page pasted by mistake should not be searched. */
export const LONGEST = 60;

function example(unit: QuantityUnit): string {
  if (unit === '') return 'a plain number';
  const { prefixes } = BASE_UNITS[splitUnit(unit).base];
  const taken = prefixes.length === 0 ? 'no prefix' : `the prefixes ${prefixes.join(', ')}`;
  return `a number in ${unit}, with ${taken}`;
}

export function unreadable(text: string, unit: QuantityUnit, input: string): UnreadableQuantityError {
  const permitted = example(unit);
  const message =
    text.trim() === ''
      ? `Type ${permitted}.`
      : `"${shortened(text)}" cannot be read here. Type ${permitted}.`;
  return new UnreadableQuantityError(input, text, permitted, message);
}

export function wrongUnit(text: string, unit: QuantityUnit, input: string): WrongUnitError {
  return new WrongUnitError(
    input,
    text,
    example(unit),
    `"${text}" is in another unit. Type ${example(unit)}.`,
  );
}

/** m and M are the pair that gets mixed up, so the other one is what was probably meant. */
export function impossiblePrefix(
  text: string,
  unit: QuantityUnit,
  input: string,
  digits: string,
  prefix: Prefix,
): AskingError {
  const { base } = splitUnit(unit);
  const other = prefix === 'm' ? 'M' : prefix === 'M' ? 'm' : undefined;
  const isLikely = other !== undefined && BASE_UNITS[base].prefixes.includes(other);
  const candidates = isLikely ? [`${digits} ${other}${base}`] : [];
  const question = isLikely ? ` Did you mean ${candidates.join()}?` : ` Type ${example(unit)}.`;
  const message = `"${text}" would be ${digits} ${prefix}${base}, which is not met on a bench.${question}`;
  return new AskingError(input, text, example(unit), message, candidates);
}

function shortened(text: string): string {
  return text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text;
}

/** Both readings of a comma before three digits. */
export function twoWays(
  text: string,
  unit: QuantityUnit,
  input: string,
  number: AmbiguousNumber,
): AskingError {
  const sign = number.sign === '-' ? '−' : '';
  const letters = number.rest === '' ? '' : ` ${number.rest}`;
  const candidates = [number.asDecimal, number.asThousands].map(
    (digits) => `${sign}${Number(digits)}${letters}`,
  );
  const question = `"${text}" can be read two ways. Did you mean ${candidates.join(' or ')}?`;
  return new AskingError(input, text, example(unit), question, candidates);
}
