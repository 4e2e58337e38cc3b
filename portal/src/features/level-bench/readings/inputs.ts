import {
  entryFields,
  ENTRY_METHODS,
  METER_UNITS,
  type EntryField,
  type EntryMethod,
  type QuantityUnit,
  type ReadingUnit,
} from '@ferrite-row/levels';
import {
  choice,
  optional,
  quantity,
  type BenchInput,
  type BenchInputs,
  type ShownWhen,
} from '../inputs/fields';
import { ASSUMED_FIGURES } from './assumed';
import { METER_STARTS, METER_WINDOWS, START_WINDOWS, STARTS } from './starts';
import { keyOf, unitOf, WAYS, type Way } from './ways';

type Entries = [string, BenchInput][];

const ENDS = { low: 'From', high: 'Up to', target: 'Aim' } as const;

/** A window is typed in the unit of the reading, but a frequency in megahertz. */
const typedUnit = (unit: ReadingUnit): QuantityUnit => (unit === 'Hz' ? 'MHz' : unit);

function windowOf(
  key: (name: string) => string,
  unit: ReadingUnit,
  when: ShownWhen,
  starts: { low?: string; high?: string; target?: string } = {},
): Entries {
  return (['low', 'high', 'target'] as const).map((end) => [
    key(end),
    { ...optional(ENDS[end], typedUnit(unit), { when }), start: starts[end] ?? '' },
  ]);
}

function fieldInput({ label, unit, choices }: EntryField, start: string, when: ShownWhen): BenchInput {
  if (!choices) return quantity(label, unit, start, { when });
  const options = choices.map((value) => ({ value: String(value), label: `×${value}` }));
  return choice(label, options, start, { when });
}

function methodInputs(method: Exclude<EntryMethod, 'meter'>): Entries {
  return entryFields(method, 'V').map((field) => [
    keyOf(method, field.name),
    fieldInput(field, STARTS[method][field.name] ?? '', { way: [method] }),
  ]);
}

/** A meter's own fields once for each unit it may be read in. */
function meterInputs(): Entries {
  return METER_UNITS.flatMap((unit): Entries => {
    const when = { way: ['meter'], 'meter.unit': [unit] };
    const key = (name: string) => keyOf('meter', name, unit);
    const [value, readTo] = METER_STARTS[unit];
    const fields = entryFields('meter', unit);
    return [
      ...fields.map((field, index): [string, BenchInput] => [
        key(field.name),
        fieldInput(field, index === 0 ? value : readTo, when),
      ]),
      [key('accuracyFixed'), optional('Digits, or part of full scale', unit, { when })],
      ...windowOf(key, unit, when, METER_WINDOWS[unit]),
    ];
  });
}

/** Points a detector's own table may have here; two or more are filled in. */
export const TABLE_POINTS = [1, 2, 3, 4, 5, 6] as const;
const TABLE_STARTS = [
  ['-60', '0.63'],
  ['-40', '1.13'],
  ['-20', '1.62'],
  ['0', '2.12'],
];

function tableInputs(): Entries {
  const when = { way: ['detector-table'] };
  const key = (name: string) => keyOf('detector-table', name);
  return [
    [key('volts'), quantity('Voltage shown', 'V', '1.66', { when })],
    [key('readToVolts'), quantity('Read to within', 'V', '5m', { when })],
    ...TABLE_POINTS.flatMap((point): Entries => {
      const [dbm = '', volts = ''] = TABLE_STARTS[point - 1] ?? [];
      return [
        [key(`dbm${point}`), { ...optional(`Level ${point}`, 'dBm', { when }), start: dbm }],
        [key(`volts${point}`), { ...optional(`Shows ${point}`, 'V', { when }), start: volts }],
      ];
    }),
    [key('padsInLineDb'), quantity('Pads in line', 'dB', '20', { when })],
  ];
}

function otherInputs(): Entries {
  const gain = { when: { way: ['gain'] } };
  const probe = { when: { way: ['probe-loading'] } };
  const rise = { when: { way: ['rise-time'] } };
  return [
    ['gain.output', quantity('Level at the output', 'dBm', '1.5', gain)],
    ['gain.outputUncertainty', quantity('± at 95 %', 'dB', '0.39', gain)],
    ['gain.input', quantity('Level at the input', 'dBm', '-19.2', gain)],
    ['gain.inputUncertainty', quantity('± at 95 %', 'dB', '0.47', gain)],
    ['rise-time.divisions', quantity('Divisions, 10 to 90 %', 'div', '3', rise)],
    ['rise-time.secondsPerDivision', quantity('Time per division', 's/div', '2 ns', rise)],
    ['rise-time.readToDivisions', quantity('Read to within', 'div', '0.1', rise)],
    ['rise-time.bandwidthHertz', quantity('Bandwidth with the probe', 'MHz', '100', rise)],
    ['probe-loading.circuitOhms', quantity('Circuit there', 'ohm', '1k', probe)],
    ['probe-loading.frequencyHertz', quantity('Frequency', 'MHz', '14.1', probe)],
    ['probe-loading.probeOhms', quantity('Probe, resistance', 'ohm', '10M', probe)],
    ['probe-loading.probeFarads', quantity('Probe, capacitance', 'F', '10 pF', probe)],
    [
      'intermodulation.against',
      choice(
        'Told below',
        [
          { value: 'each tone', label: 'Each tone' },
          { value: 'peak envelope power', label: 'PEP' },
        ],
        'each tone',
        { when: { way: ['intermodulation'] } },
      ),
    ],
  ];
}

function assumedInputs(way: Way): Entries {
  return ASSUMED_FIGURES[way].map(({ name, label, unit, start }) => [
    keyOf(way, name),
    { ...optional(label, unit, { when: { way: [way] } }), start },
  ]);
}

function wayWindow(way: Way): Entries {
  if (way === 'meter' || way === 'probe-loading') return [];
  return windowOf((end) => keyOf(way, end), unitOf(way, 'V'), { way: [way] }, START_WINDOWS[way]);
}

/** Every field of every way; only those of the way chosen are on the page. */
export const INPUTS: BenchInputs = {
  way: choice('Read on, or worked out from', WAYS, 'oscilloscope'),
  'meter.unit': choice(
    'Reads',
    METER_UNITS.map((unit) => ({ value: unit, label: unit })),
    'mA',
    { when: { way: ['meter'] } },
  ),
  ...Object.fromEntries([
    ...ENTRY_METHODS.flatMap((method) => (method === 'meter' ? meterInputs() : methodInputs(method))),
    ...tableInputs(),
    ...otherInputs(),
    ...WAYS.flatMap(({ value }) => [...assumedInputs(value), ...wayWindow(value)]),
  ]),
};

const isWindow = (name: string) => /\.(low|high|target)(-\w+)?$/.test(name);

/** The inputs in the groups they stand in. */
export function groupsOf(way: Way): { shown: string[]; window: string[]; assumed: string[] } {
  const own = Object.keys(INPUTS).filter((name) => name.startsWith(`${way}.`));
  const isAssumed = (name: string) =>
    ASSUMED_FIGURES[way].some((figure) => name === keyOf(way, figure.name)) ||
    name.includes('.accuracyFixed');
  return {
    shown: own.filter((name) => !isWindow(name) && !isAssumed(name)),
    window: own.filter(isWindow),
    assumed: own.filter(isAssumed),
  };
}
