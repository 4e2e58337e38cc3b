import {
  ENTRY_METHODS,
  methodUnit,
  type EntryMethod,
  type MeterUnit,
  type ReadingUnit,
} from '@ferrite-row/levels';

const NAMES = {
  oscilloscope: 'Oscilloscope across a load',
  analyzer: 'Spectrum analyzer',
  harmonic: 'Harmonic below the carrier',
  meter: 'Meter',
  counter: 'Frequency counter',
  'dummy-load': 'Power in a dummy load',
  'dummy-load-tap': 'Dummy load, by its tap',
  'two-tone-envelope': 'Two tones, their envelope',
  intermodulation: 'Two tones, intermodulation',
  'log-detector': 'Log detector, by its line',
  'detector-table': 'Log detector, by its table',
  'diode-probe': 'Diode probe',
  'time-base': 'Frequency by the time base',
  'rise-time': 'Rise time of an edge',
  gain: 'Gain of two levels',
  'probe-loading': 'What a probe takes',
} as const;

/** Ways to a figure, by the name they have in an address. */
export type Way = keyof typeof NAMES;

export const WAYS = (Object.keys(NAMES) as Way[]).map((value) => ({ value, label: NAMES[value] }));

export const wayName = (way: Way): string => NAMES[way];

/** Ways whose fields the levels package knows, because checks ask for them too. */
export const entryMethodOf = (way: string): EntryMethod | undefined =>
  ENTRY_METHODS.find((method) => method === way);

const OTHER_UNITS = {
  'detector-table': 'dBm',
  'rise-time': 'ns',
  gain: 'dB',
  'probe-loading': 'dB',
} as const;

/** Unit of what a way gives. */
export function unitOf(way: Way, meterUnit: MeterUnit): ReadingUnit {
  const method = entryMethodOf(way);
  if (method) return methodUnit(method, meterUnit);
  return OTHER_UNITS[way as keyof typeof OTHER_UNITS];
}

/**
 * The input of a way's field in the address: `analyzer.divisionsDown`. A meter's are told apart by unit too, so that
 * 22.4 mA does not become 22.4 V when another unit is chosen.
 */
export const keyOf = (way: string, name: string, meterUnit?: string): string =>
  way === 'meter' && meterUnit !== undefined ? `meter.${name}-${meterUnit}` : `${way}.${name}`;

/** Addresses from before there was a page for each family named the two ways' fields without the way. */
export function withWayInNames(search: string): string {
  const before = new URLSearchParams(search);
  const way = before.get('way') ?? 'oscilloscope';
  const renamed = [...before].map(([name, text]) => [name === 'way' ? name : keyOf(way, name), text]);
  return new URLSearchParams(renamed).toString();
}
