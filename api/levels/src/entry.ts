import { analyzerReading, harmonicReading } from './analyzer';
import { counterReading } from './counter';
import { dummyLoadReading } from './dummy-load';
import { entryFields, isMeterUnit } from './entry-fields';
import type { EntryField, EntryMethod } from './entry-fields';
import { LevelsError, OutOfDomainError } from './errors';
import { meterReading } from './meter';
import { oscilloscopeReading } from './oscilloscope';
import type { OscilloscopeInput } from './oscilloscope';
import { readQuantity } from './read-quantity';
import type { LevelReading, MeterUnit } from './reading';

/** What was typed, by field name. */
export type Entry = Readonly<Record<string, string>>;

/** What the method takes for granted: accuracies of the instrument and of the plan, by name, as numbers. */
export type Assumptions = Readonly<Record<string, number>>;

/**
 * Taken where neither instrument nor plan states its own. Common practice for the club's class of instrument, not from
 * any one data sheet: a bench analyzer within 1.5 dB, its scale within 0.5 dB and its flatness within 0.8 dB; a hand-held
 * meter within 1 %; a counter's time base within 1 ppm.
 */
export const ASSUMED = {
  amplitudeAccuracyDb: 1.5,
  scaleFidelityDb: 0.5,
  flatnessDb: 0.8,
  accuracyRel: 0.01,
  timeBasePpm: 1,
} as const;

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

function notOffered(name: string, label: string, value: number, choices: readonly number[]) {
  const permitted = choices.map((choice) => `×${choice}`).join(' or ');
  return new OutOfDomainError(name, value, permitted, `${label}: ${permitted}.`);
}

/**
 * The reading of an entry whose every field could be read.
 *
 * @param inputs - from `readEntry`.
 * @param unit - of the reading; only a meter depends on it.
 * @throws OutOfDomainError naming the field.
 * @example readingFromInputs('counter', { frequencyMegahertz: 14.1, gateSeconds: 1 }, { timeBasePpm: 1 }, 'W').value //=> 14100000
 */
export function readingFromInputs(
  method: EntryMethod,
  inputs: Readonly<Record<string, number>>,
  assumptions: Assumptions,
  unit: MeterUnit,
): LevelReading {
  const of = (name: string): number => inputs[name] ?? Number.NaN;
  const assumed = (name: keyof typeof ASSUMED): number => assumptions[name] ?? ASSUMED[name];
  const scale = { dbPerDivision: of('dbPerDivision'), readToDivisions: of('readToDivisions') };
  switch (method) {
    case 'oscilloscope':
      return oscilloscopeReading(scopeInput(inputs, assumptions));
    case 'dummy-load':
      return dummyLoadReading(scopeInput(inputs, assumptions));
    case 'analyzer':
      return analyzerReading({
        ...scale,
        referenceLevelDbm: of('referenceLevelDbm'),
        divisionsDown: of('divisionsDown'),
        padsInLineDb: of('padsInLineDb'),
        padToleranceDb: assumptions.padToleranceDb,
        amplitudeAccuracyDb: assumed('amplitudeAccuracyDb'),
      });
    case 'harmonic':
      return harmonicReading({
        ...scale,
        fundamentalDivisionsDown: of('fundamentalDivisionsDown'),
        harmonicDivisionsDown: of('harmonicDivisionsDown'),
        scaleFidelityDb: assumed('scaleFidelityDb'),
        flatnessDb: assumed('flatnessDb'),
      });
    case 'meter': {
      const [value, readToValue] = [of('value'), of('readToValue')];
      const accuracyRel = assumed('accuracyRel');
      return meterReading({
        value,
        readToValue,
        unit,
        accuracyRel,
        accuracyFixed: assumptions.accuracyFixed,
      });
    }
    case 'counter': {
      const frequencyHertz = of('frequencyMegahertz') * 1e6;
      return namingTheField('frequencyHertz', 'frequencyMegahertz', () =>
        counterReading({
          frequencyHertz,
          gateSeconds: of('gateSeconds'),
          timeBasePpm: assumed('timeBasePpm'),
          prescaler: assumptions.prescaler,
        }),
      );
    }
  }
}

/**
 * What a scope's inputs mean to its calculation.
 *
 * @throws OutOfDomainError when the probe is neither ×1 nor ×10.
 * @example scopeInput({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }, {}).probeRatio //=> 10
 */
export function scopeInput(
  inputs: Readonly<Record<string, number>>,
  assumptions: Assumptions,
): OscilloscopeInput {
  const { voltsPerDivision = NaN, divisionsPeakToPeak = NaN, readToDivisions = NaN } = inputs;
  const { probeRatio = NaN, loadOhms = NaN } = inputs;
  const { verticalGainToleranceRel, probeToleranceRel, loadToleranceRel } = assumptions;
  if (probeRatio !== 1 && probeRatio !== 10) throw notOffered('probeRatio', 'Probe', probeRatio, [1, 10]);
  return {
    ...{ voltsPerDivision, divisionsPeakToPeak, readToDivisions, probeRatio, loadOhms },
    ...{ verticalGainToleranceRel, probeToleranceRel, loadToleranceRel },
  };
}

/** The member typed megahertz, so that is the field an error is about. */
function namingTheField<T>(inside: string, field: string, work: () => T): T {
  try {
    return work();
  } catch (error) {
    if (error instanceof OutOfDomainError && error.input === inside)
      throw new OutOfDomainError(field, error.value, error.permitted, error.message);
    throw error;
  }
}

/**
 * The unit a meter's fields are read in; every other method reads its fields in units of their own.
 *
 * @example meterUnitOf('mA') //=> 'mA'
 */
export function meterUnitOf(unit: string): MeterUnit {
  return isMeterUnit(unit) ? unit : 'V';
}
