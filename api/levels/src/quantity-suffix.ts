import { BASE_UNITS, prefixOf } from './quantity-units';
import type { BaseUnit, Prefix } from './quantity-units';

/** What the letters after a number mean for a field that asks for a base unit. */
export type Suffix =
  | { kind: 'none' }
  | { kind: 'unit'; prefix?: Prefix; isWritten: boolean }
  | { kind: 'impossible prefix'; prefix: Prefix }
  | { kind: 'other unit' }
  | { kind: 'unreadable' };

/**
 * Reads the letters after a number.
 *
 * | letters, field in Hz | read as |
 * | --- | --- |
 * | none | the field's own unit |
 * | `M`, `MHz`, `Mhz` | mega |
 * | `mHz` | an impossible prefix: no bench has millihertz |
 * | `V`, `dBm` | another unit |
 * | `x` | unreadable |
 */
export function suffixOf(letters: string, base: BaseUnit): Suffix {
  const suffix = letters.replace(/ /g, '').replace(/per(?=div)/i, '/');
  if (suffix === '') return { kind: 'none' };
  return suffixFor(suffix, base) ?? (isOtherUnit(suffix) ? { kind: 'other unit' } : { kind: 'unreadable' });
}

function suffixFor(suffix: string, base: BaseUnit): Suffix | undefined {
  if (isSpelling(suffix, base)) return { kind: 'unit', isWritten: true };
  const prefix = prefixOf(suffix.slice(0, 1));
  const unit = suffix.slice(1);
  if (prefix === undefined || (unit !== '' && !isSpelling(unit, base))) return undefined;
  if (!BASE_UNITS[base].prefixes.includes(prefix)) return { kind: 'impossible prefix', prefix };
  // K and u are read as k and µ; saying so does no harm.
  const isWritten = unit !== '' && suffix.startsWith(prefix);
  return { kind: 'unit', prefix, isWritten };
}

function isSpelling(text: string, base: BaseUnit): boolean {
  return BASE_UNITS[base].spellings.includes(text.toLowerCase());
}

function isOtherUnit(suffix: string): boolean {
  const unprefixed = prefixOf(suffix.slice(0, 1)) === undefined ? suffix : suffix.slice(1);
  return Object.values(BASE_UNITS).some(({ spellings }) => {
    return spellings.includes(suffix.toLowerCase()) || spellings.includes(unprefixed.toLowerCase());
  });
}
