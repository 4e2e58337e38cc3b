import {
  dBm,
  dbmFromWatts,
  figuresFor,
  formatQuantity,
  INSTRUMENT_FIGURES,
  meterUnitOf,
  ohms,
  SCREEN_DIVISIONS,
  voltsPeakToPeakFromDbm,
  watts,
  type QuantityUnit,
} from '@ferrite-row/levels';
import { clubDay } from '../../../lib/club-time';
import { dateText } from '../../../lib/club-time-text';
import type { BuildCheck, InstrumentChoice, Reading } from '../api/builds';
import { entryMethod, fieldsOf, type Entry } from './live-reading';

/** What the form holds before anybody types, and beside each field where that came from. */
export interface Prefill {
  entry: Entry;
  sources: Readonly<Record<string, string>>;
}

/** Read anew off the instrument each time; nothing stands in for them. */
const SHOWN = new Set([
  ...['divisionsPeakToPeak', 'divisionsDown', 'fundamentalDivisionsDown', 'harmonicDivisionsDown'],
  ...['toneDivisionsDown', 'productDivisionsDown', 'frequencyMegahertz', 'volts', 'directVolts'],
  ...['cycles', 'divisions', 'value'],
]);

const isReadEachTime = (name: string): boolean => SHOWN.has(name);

const FROM_PLAN = 'from the plan';

/** A setting, and where it came from. */
type Found = readonly [text: string, source: string] | undefined;

interface Known {
  check: BuildCheck;
  /** Null where none is chosen. */
  instrumentId: string | null;
  figures: Readonly<Record<string, number>>;
  tag: string;
}

/** A pad in line is a setting of the bench, even where one is built in; the rest of a sheet stays true. */
const isSetting = (name: string): boolean => name === 'padsInLineDb';

function fromInstrument({ figures, tag }: Known, name: string): Found {
  const figure = figures[name];
  return figure === undefined || isSetting(name) ? undefined : [String(figure), `from ${tag}`];
}

/** What belongs to an instrument, its built-in pads too, is taken only from a reading on that same one. */
function fromReading(earlier: readonly Reading[], { instrumentId }: Known, name: string): Found {
  const reading = earlier.find(
    ({ entry, instrumentId: takenOn }) =>
      typeof entry[name] === 'string' &&
      entry[name] !== '' &&
      (takenOn === instrumentId || !INSTRUMENT_FIGURES.includes(name)),
  );
  return reading && [String(reading.entry[name]), `from your reading of ${shortDay(reading.takenAt)}`];
}

/** '14 Nov'. */
const shortDay = (instant: string): string => dateText(clubDay(instant)).replace(/ \d+$/, '');

function fromPlan({ check, figures, tag }: Known, name: string): Found {
  const planned = check.defaults[name];
  const builtIn = isSetting(name) ? figures[name] : undefined;
  if (builtIn !== undefined)
    return [
      String((planned ?? 0) + builtIn),
      planned ? `${planned} dB ${FROM_PLAN}, the rest built into ${tag}` : `from ${tag}`,
    ];
  return planned === undefined ? undefined : [String(planned), FROM_PLAN];
}

/** 1, 2 and 5 in every decade: the steps of a bench oscilloscope, common practice. */
function stepAtLeast(value: number): number {
  const decade = Math.floor(Math.log10(value));
  const steps = [1, 2, 5, 10].map((step) => Number(`${step}e${decade}`));
  return steps.find((step) => step >= value * (1 - 1e-9)) ?? value;
}

/** A number that stands in another field of the form, or else what is usual. */
type Standing = (name: string, otherwise: number) => number;

/** The least setting on which the highest level that passes is still on the screen. */
function voltsPerDivision({ unit, windowHigh, target }: BuildCheck, standing: Standing): number | undefined {
  const most = windowHigh ?? target;
  if (most === null || (unit === 'W' && most <= 0)) return undefined;
  const level = unit === 'W' ? dbmFromWatts(watts(most)) : dBm(most);
  const volts = voltsPeakToPeakFromDbm(level, ohms(standing('loadOhms', 50)));
  return stepAtLeast(volts / standing('probeRatio', 10) / SCREEN_DIVISIONS);
}

/** The lowest line of tens over the highest level that passes. */
function referenceLevel({ unit, windowHigh, target }: BuildCheck, standing: Standing): number | undefined {
  const most = windowHigh ?? target;
  if (most === null || unit !== 'dBm') return undefined;
  return Math.ceil((most - standing('padsInLineDb', 0)) / 10) * 10;
}

/** Three cycles at least, along ten divisions. */
const secondsPerDivision = ({ target }: BuildCheck): number | undefined =>
  target === null || target <= 0 ? undefined : stepAtLeast(3 / target / 10);

const RANGES: Readonly<Record<string, (check: BuildCheck, standing: Standing) => number | undefined>> = {
  voltsPerDivision,
  referenceLevelDbm: referenceLevel,
  secondsPerDivision,
};

/** Those whose numbers read better with a prefix: 20 mV/div. */
const UNITS: Readonly<Record<string, QuantityUnit>> = {
  voltsPerDivision: 'V/div',
  secondsPerDivision: 's/div',
};

/** A range that suits the planned value. */
function fromTarget({ check }: Known, name: string, standing: Standing): Found {
  const value = RANGES[name]?.(check, standing);
  if (value === undefined) return undefined;
  const unit = UNITS[name];
  return [unit ? formatQuantity(value, unit) : String(value), `${FROM_PLAN}, for its window`];
}

/**
 * What stands in every field of a check before it is typed over: figures of the instrument's own sheet, then the
 * setting last typed on this check, then the plan, then one typed on another check, then a range that suits the window.
 *
 * @param stageChecks - those of the same stage; a reading taken the same way on one of them tells what the plan does not.
 */
export function prefillOf(
  check: BuildCheck,
  stageChecks: readonly BuildCheck[],
  instrument?: Pick<InstrumentChoice, 'id' | 'tag' | 'figures'>,
): Prefill {
  const method = entryMethod(check);
  if (!method) return { entry: {}, sources: {} };
  const known: Known = {
    check,
    figures: figuresFor(method, meterUnitOf(check.unit ?? ''), instrument?.figures ?? {}),
    tag: instrument?.tag ?? '',
    instrumentId: instrument?.id ?? null,
  };
  const [own, others] = [latestFirst(check.readings), latestFirst(alikeOf(check, stageChecks))];
  const settled = (name: string): Found =>
    fromInstrument(known, name) ??
    fromReading(own, known, name) ??
    fromPlan(known, name) ??
    fromReading(others, known, name);
  const standing: Standing = (name, otherwise) => {
    const value = Number(settled(name)?.[0]);
    return Number.isFinite(value) ? value : otherwise;
  };
  const sources: Record<string, string> = {};
  const entry = fieldsOf(check).map(({ name, choices }): [string, string] => {
    if (isReadEachTime(name)) return [name, ''];
    const found = settled(name) ?? fromTarget(known, name, standing);
    if (found) sources[name] = found[1];
    return [name, found?.[0] ?? String(choices?.at(-1) ?? '')];
  });
  return { entry: Object.fromEntries(entry), sources };
}

/** Readings of the stage's other checks that are taken the same way. */
const alikeOf = (check: BuildCheck, stageChecks: readonly BuildCheck[]): Reading[] =>
  stageChecks
    .filter(({ id, method, unit }) => id !== check.id && method === check.method && unit === check.unit)
    .flatMap(({ readings }) => readings);

const latestFirst = (readings: readonly Reading[]): Reading[] =>
  [...readings].sort((one, other) => other.takenAt.localeCompare(one.takenAt));
