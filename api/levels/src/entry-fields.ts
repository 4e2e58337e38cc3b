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
  'dummy-load-tap',
  'two-tone-envelope',
  'intermodulation',
  'log-detector',
  'diode-probe',
  'time-base',
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

const READ_TO_VOLTS: EntryField = { name: 'readToVolts', label: 'Read to within', unit: 'V' };
const PADS: EntryField = { name: 'padsInLineDb', label: 'Pads in line', unit: 'dB' };
const LOAD: EntryField = { name: 'loadOhms', label: 'Load', unit: 'ohm' };

const SCOPE: readonly EntryField[] = [
  { name: 'voltsPerDivision', label: 'Volts per division', unit: 'V/div' },
  { name: 'divisionsPeakToPeak', label: 'Divisions, peak to peak', unit: 'div' },
  READ_TO,
  { name: 'probeRatio', label: 'Probe', unit: 'div', choices: [1, 10] },
  LOAD,
];

const ANALYZER: readonly EntryField[] = [
  { name: 'referenceLevelDbm', label: 'Reference level', unit: 'dBm' },
  { name: 'divisionsDown', label: 'Divisions down', unit: 'div' },
  PER_DIVISION,
  READ_TO,
  PADS,
];

const FIELDS: Record<Exclude<EntryMethod, 'meter'>, readonly EntryField[]> = {
  oscilloscope: SCOPE,
  'dummy-load': SCOPE,
  'two-tone-envelope': SCOPE,
  analyzer: ANALYZER,
  'dummy-load-tap': [...ANALYZER, { name: 'tapLossDb', label: 'Loss to the tap', unit: 'dB' }],
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
  intermodulation: [
    { name: 'toneDivisionsDown', label: 'Tones, divisions down', unit: 'div' },
    { name: 'productDivisionsDown', label: 'Product, divisions down', unit: 'div' },
    PER_DIVISION,
    READ_TO,
  ],
  'log-detector': [
    { name: 'volts', label: 'Voltage shown', unit: 'V' },
    READ_TO_VOLTS,
    { name: 'voltsPerDb', label: 'Slope, each decibel', unit: 'V' },
    { name: 'interceptDbm', label: 'Intercept', unit: 'dBm' },
    { name: 'validFromDbm', label: 'The line holds from', unit: 'dBm' },
    { name: 'validToDbm', label: 'The line holds up to', unit: 'dBm' },
    PADS,
  ],
  'diode-probe': [
    { name: 'directVolts', label: 'Direct voltage shown', unit: 'V' },
    READ_TO_VOLTS,
    { name: 'diodeDropVolts', label: 'Drop of the diode', unit: 'V' },
    LOAD,
  ],
  'time-base': [
    { name: 'cycles', label: 'Whole cycles', unit: '' },
    { name: 'divisions', label: 'Divisions they take', unit: 'div' },
    { name: 'secondsPerDivision', label: 'Time per division', unit: 's/div' },
    READ_TO,
  ],
};

const METHOD_UNITS: Record<Exclude<EntryMethod, 'meter'>, ReadingUnit> = {
  oscilloscope: 'dBm',
  'dummy-load': 'W',
  analyzer: 'dBm',
  harmonic: 'dBc',
  counter: 'Hz',
  'dummy-load-tap': 'W',
  'two-tone-envelope': 'dBm',
  intermodulation: 'dBc',
  'log-detector': 'dBm',
  'diode-probe': 'dBm',
  'time-base': 'Hz',
};

/** Units a direct-reading meter shows. */
export const METER_UNITS: readonly MeterUnit[] = ['V', 'mV', 'A', 'mA', 'ohm', 'kohm', 'W', 'mW', 'dB'];

/** Whether a unit is one a direct-reading meter shows. */
export function isMeterUnit(unit: string): unit is MeterUnit {
  return METER_UNITS.some((known) => known === unit);
}

/**
 * Unit of the method's value; of a meter, the one it is read in.
 *
 * @example methodUnit('harmonic', 'V') //=> 'dBc'
 * @example methodUnit('meter', 'mA') //=> 'mA'
 */
export function methodUnit(method: EntryMethod, unit: MeterUnit): ReadingUnit {
  return method === 'meter' ? unit : METHOD_UNITS[method];
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
