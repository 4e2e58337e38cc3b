import {
  dBm,
  dbmFromWatts,
  figuresFor,
  formatQuantity,
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

export const isReadEachTime = (name: string): boolean => SHOWN.has(name);

const FROM_PLAN = 'from the plan';

/** A setting, and where it came from. */
type Found = readonly [text: string, source: string] | undefined;

interface Known {
  check: BuildCheck;
  figures: Readonly<Record<string, number>>;
  tag: string;
  earlier: readonly Reading[];
}

/** A pad in line is a setting of the bench, even where one is built in; the rest of a sheet stays true. */
const isSetting = (name: string): boolean => name === 'padsInLineDb';

function fromInstrument({ figures, tag }: Known, name: string): Found {
  const figure = figures[name];
  return figure === undefined || isSetting(name) ? undefined : [String(figure), `from ${tag}`];
}

function fromReading({ earlier }: Known, name: string): Found {
  const reading = earlier.find(({ entry }) => typeof entry[name] === 'string' && entry[name] !== '');
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

/** The least setting on which the highest level that passes is still on the screen. */
function voltsPerDivision({ unit, windowHigh, target, defaults }: BuildCheck): number | undefined {
  const most = windowHigh ?? target;
  if (most === null || (unit === 'W' && most <= 0)) return undefined;
  const level = unit === 'W' ? dbmFromWatts(watts(most)) : dBm(most);
  const volts = voltsPeakToPeakFromDbm(level, ohms(defaults.loadOhms ?? 50));
  return stepAtLeast(volts / (defaults.probeRatio ?? 10) / SCREEN_DIVISIONS);
}

/** The lowest line of tens over the highest level that passes. */
function referenceLevel({ unit, windowHigh, target, defaults }: BuildCheck): number | undefined {
  const most = windowHigh ?? target;
  if (most === null || unit !== 'dBm') return undefined;
  return Math.ceil((most - (defaults.padsInLineDb ?? 0)) / 10) * 10;
}

/** Three cycles at least, along ten divisions. */
const secondsPerDivision = ({ target }: BuildCheck): number | undefined =>
  target === null || target <= 0 ? undefined : stepAtLeast(3 / target / 10);

const RANGES: Readonly<Record<string, (check: BuildCheck) => number | undefined>> = {
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
function fromTarget({ check }: Known, name: string): Found {
  const value = RANGES[name]?.(check);
  if (value === undefined) return undefined;
  const unit = UNITS[name];
  return [unit ? formatQuantity(value, unit) : String(value), `${FROM_PLAN}, for its window`];
}

/**
 * What stands in every field of a check before it is typed over: figures of the instrument's own sheet, then the
 * setting last typed, then the plan, then a range that suits the planned value.
 *
 * @param stageChecks - those of the same stage; a reading of the same kind on one of them tells the settings too.
 */
export function prefillOf(
  check: BuildCheck,
  stageChecks: readonly BuildCheck[],
  instrument?: Pick<InstrumentChoice, 'tag' | 'figures'>,
): Prefill {
  const method = entryMethod(check);
  if (!method) return { entry: {}, sources: {} };
  const known: Known = {
    check,
    figures: figuresFor(method, meterUnitOf(check.unit ?? ''), instrument?.figures ?? {}),
    tag: instrument?.tag ?? '',
    earlier: earlierOf(check, stageChecks),
  };
  const sources: Record<string, string> = {};
  const entry = fieldsOf(check).map(({ name, choices }): [string, string] => {
    if (isReadEachTime(name)) return [name, ''];
    const found =
      fromInstrument(known, name) ??
      fromReading(known, name) ??
      fromPlan(known, name) ??
      fromTarget(known, name);
    if (found) sources[name] = found[1];
    return [name, found?.[0] ?? String(choices?.at(-1) ?? '')];
  });
  return { entry: Object.fromEntries(entry), sources };
}

/** Readings of this check, the latest first, then those of the stage's others that are taken the same way. */
function earlierOf(check: BuildCheck, stageChecks: readonly BuildCheck[]): Reading[] {
  const alike = stageChecks.filter(
    ({ id, method, unit }) => id !== check.id && method === check.method && unit === check.unit,
  );
  const latestFirst = (readings: readonly Reading[]) =>
    [...readings].sort((one, other) => other.takenAt.localeCompare(one.takenAt));
  return [...latestFirst(check.readings), ...latestFirst(alike.flatMap(({ readings }) => readings))];
}
