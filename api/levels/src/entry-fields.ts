import type { MeterUnit, ReadingUnit } from './reading';
import type { QuantityUnit } from './quantity-units';

/** Ways of measuring that begin with somebody typing what an instrument shows. */
export const ENTRY_METHODS = [
  'oscilloscope',
  'dummy-load',
  'analyzer',
  'harmonic',
  'meter',
  'counter',
] as const;
export type EntryMethod = (typeof ENTRY_METHODS)[number];

/** One field of the form a method is typed into. */
export interface EntryField {
  /** Its name in an entry, and in an error. */
  name: string;
  label: string;
  /** Unit of the field; what is typed without letters is in it. */
  unit: QuantityUnit;
  /** Only these numbers, offered as a choice in place of a field. */
  choices?: readonly number[];
}

const READ_TO: EntryField = { name: 'readToDivisions', label: 'Read to within', unit: 'div' };
const PER_DIVISION: EntryField = { name: 'dbPerDivision', label: 'Decibels per division', unit: 'dB/div' };

const SCOPE: readonly EntryField[] = [
  { name: 'voltsPerDivision', label: 'Volts per division', unit: 'V/div' },
  { name: 'divisionsPeakToPeak', label: 'Divisions, peak to peak', unit: 'div' },
  READ_TO,
  { name: 'probeRatio', label: 'Probe', unit: 'div', choices: [1, 10] },
  { name: 'loadOhms', label: 'Load', unit: 'ohm' },
];

const FIELDS: Record<Exclude<EntryMethod, 'meter'>, readonly EntryField[]> = {
  oscilloscope: SCOPE,
  'dummy-load': SCOPE,
  analyzer: [
    { name: 'referenceLevelDbm', label: 'Reference level', unit: 'dBm' },
    { name: 'divisionsDown', label: 'Divisions down', unit: 'div' },
    PER_DIVISION,
    READ_TO,
    { name: 'padsInLineDb', label: 'Pads in line', unit: 'dB' },
  ],
  harmonic: [
    { name: 'fundamentalDivisionsDown', label: 'Carrier, divisions down', unit: 'div' },
    { name: 'harmonicDivisionsDown', label: 'The other, divisions down', unit: 'div' },
    PER_DIVISION,
    READ_TO,
  ],
  counter: [
    { name: 'frequencyMegahertz', label: 'Frequency', unit: 'MHz' },
    { name: 'gateSeconds', label: 'Gate time', unit: 's' },
  ],
};

const METHOD_UNITS: Record<Exclude<EntryMethod, 'meter'>, ReadingUnit> = {
  oscilloscope: 'dBm',
  'dummy-load': 'W',
  analyzer: 'dBm',
  harmonic: 'dBc',
  counter: 'Hz',
};

const METER_UNITS: readonly MeterUnit[] = ['V', 'mV', 'A', 'mA', 'ohm', 'kohm', 'W', 'mW', 'dB'];

/** Whether a unit is one a direct-reading meter shows. */
export function isMeterUnit(unit: string): unit is MeterUnit {
  return METER_UNITS.some((known) => known === unit);
}

/**
 * Whether the method gives its value in that unit.
 *
 * @example methodGives('analyzer', 'dBm') //=> true
 * @example methodGives('meter', 'dBm') //=> false
 */
export function methodGives(method: EntryMethod, unit: string): boolean {
  return method === 'meter' ? isMeterUnit(unit) : METHOD_UNITS[method] === unit;
}

/**
 * The fields of a method's form, in the order they are typed.
 *
 * @param unit - of the reading; a meter is read in it.
 * @example entryFields('meter', 'mA').map(({ name }) => name) //=> ['value', 'readToValue']
 */
export function entryFields(method: EntryMethod, unit: MeterUnit): readonly EntryField[] {
  if (method !== 'meter') return FIELDS[method];
  return [
    { name: 'value', label: 'Shown', unit },
    { name: 'readToValue', label: 'Read to within', unit },
  ];
}
