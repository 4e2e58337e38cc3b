import { entryFields, isMeterUnit } from './entry-fields';
import type { EntryField, EntryMethod } from './entry-fields';
import { LevelsError, OutOfDomainError } from './errors';
import { readQuantity } from './read-quantity';
import type { MeterUnit } from './reading';

/** What was typed, by field name. */
export type Entry = Readonly<Record<string, string>>;

/** An entry that was read, field by field. */
export interface ReadEntry {
  /** In the units of the fields. */
  inputs: Record<string, number>;
  /** "4,700 ohm" for `4.7k`; only where that is not plain from what was typed. */
  understoodAs: Record<string, string>;
  /** One for each field that cannot be read; empty when all could. */
  problems: LevelsError[];
}

/**
 * Reads every field of an entry. Does not throw: what cannot be read is among the problems, each naming its field.
 *
 * @param unit - of the reading; only a meter's fields depend on it.
 * @example readEntry('meter', { value: '22.4', readToValue: '0.1' }, 'mA').inputs //=> { value: 22.4, readToValue: 0.1 }
 */
export function readEntry(method: EntryMethod, entry: Entry, unit: MeterUnit): ReadEntry {
  const read: ReadEntry = { inputs: {}, understoodAs: {}, problems: [] };
  for (const field of entryFields(method, unit)) readField(field, entry[field.name] ?? '', read);
  return read;
}

function readField({ name, unit, label, choices }: EntryField, text: string, read: ReadEntry): void {
  try {
    const { value, understoodAs } = readQuantity(text, unit, name);
    if (choices && !choices.includes(value)) throw notOffered(name, label, value, choices);
    read.inputs[name] = value;
    if (understoodAs !== undefined) read.understoodAs[name] = understoodAs;
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    read.problems.push(error);
  }
}

/** The number is not among those the field offers. */
export function notOffered(name: string, label: string, value: number, choices: readonly number[]) {
  const permitted = choices.map((choice) => `×${choice}`).join(' or ');
  return new OutOfDomainError(name, value, permitted, `${label}: ${permitted}.`);
}

/**
 * The unit a meter's fields are read in; every other method reads its fields in units of their own.
 *
 * @example meterUnitOf('mA') //=> 'mA'
 */
export function meterUnitOf(unit: string): MeterUnit {
  return isMeterUnit(unit) ? unit : 'V';
}
