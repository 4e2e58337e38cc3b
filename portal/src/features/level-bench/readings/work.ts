import {
  baseUnitsIn,
  entryFields,
  gainReading,
  LevelsError,
  logDetectorReading,
  METER_UNITS,
  OutOfDomainError,
  probeLoading,
  readingFromInputs,
  riseTimeReading,
  scopeInput,
  tighterScale,
  tooCloseText,
  uncertaintyBudget,
  verdictOf,
  type EntryMethod,
  type LevelReading,
  type MeterUnit,
  type TighterScale,
  type Verdict,
  type VerdictWindow,
} from '@ferrite-row/levels';
import type { BenchInputs, BenchValues } from '../inputs/fields';
import { ASSUMED_FIGURES } from './assumed';
import { INPUTS, TABLE_POINTS } from './inputs';
import { entryMethodOf, keyOf, unitOf, WAYS, type Way } from './ways';

/** What the page shows of a reading, however it was come by. */
export type ShownReading = Pick<
  LevelReading,
  'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty' | 'components' | 'voltsPeakToPeak' | 'watts'
> & {
  averageWatts?: number;
  averageDbm?: number;
  eachToneDbm?: number;
  shownSeconds?: number;
  instrumentSeconds?: number;
};

export interface WorkedReading {
  way: Way;
  reading: ShownReading;
  /** Where an end was typed; in the unit of the reading. */
  window?: VerdictWindow & { target?: number };
  verdict?: Verdict;
  /** Why it is too close to call and what would settle it; empty otherwise. */
  advice: string;
}

type Values = BenchValues<BenchInputs>;

/** The values of one way by the names the levels package has for them. */
interface Given {
  way: Way;
  meterUnit: MeterUnit;
  of: (name: string) => number | undefined;
  word: (name: string) => string | undefined;
  key: (name: string) => string;
}

function givenOf(values: Values): Given {
  const way = WAYS.find(({ value }) => value === values.way)?.value ?? 'oscilloscope';
  const meterUnit = METER_UNITS.find((unit) => unit === values['meter.unit']) ?? 'V';
  const key = (name: string) => {
    const withUnit = keyOf(way, name, meterUnit);
    return withUnit in INPUTS ? withUnit : keyOf(way, name);
  };
  const at = (name: string) => values[key(name)] as number | string | undefined;
  const of = (name: string) => {
    const value = at(name);
    return typeof value === 'number' ? value : undefined;
  };
  const word = (name: string) => {
    const value = at(name);
    return typeof value === 'string' ? value : undefined;
  };
  return { way, meterUnit, of, word, key };
}

/** Numbers in the units the levels package's fields have, which are not all SI. */
function entryInputs(method: EntryMethod, { of, word, meterUnit }: Given): Record<string, number> {
  return Object.fromEntries(
    entryFields(method, meterUnit).map(({ name, unit, choices }) => [
      name,
      choices ? Number(word(name)) : (of(name) ?? NaN) / baseUnitsIn(unit),
    ]),
  );
}

function assumptionsOf({ way, of, word, meterUnit }: Given): Record<string, number> {
  const named = ASSUMED_FIGURES[way].flatMap(({ name, unit }): [string, number][] => {
    const value = of(name);
    // A tolerance is a fraction there; parts per million stay what they are.
    return value === undefined ? [] : [[name, unit === 'ppm' ? value / baseUnitsIn('ppm') : value]];
  });
  const fixed = of('accuracyFixed');
  return {
    ...Object.fromEntries(named),
    ...(fixed !== undefined && { accuracyFixed: fixed / baseUnitsIn(meterUnit) }),
    ...(word('against') === 'peak envelope power' && { againstPeakEnvelopePower: 1 }),
  };
}

function tableReading(given: Given): ShownReading {
  const { of } = given;
  const points = TABLE_POINTS.flatMap((point) => {
    const [dbm, volts] = [of(`dbm${point}`), of(`volts${point}`)];
    return dbm === undefined || volts === undefined ? [] : [{ dbm, volts }];
  });
  const assumptions = assumptionsOf(given);
  return logDetectorReading({
    volts: of('volts') ?? NaN,
    readToVolts: of('readToVolts') ?? NaN,
    padsInLineDb: of('padsInLineDb') ?? NaN,
    conformityDb: assumptions.conformityDb ?? NaN,
    calibration: { points },
    meterAccuracyRel: assumptions.meterAccuracyRel,
    padToleranceDb: assumptions.padToleranceDb,
  });
}

const levelOf = ({ of }: Given, name: 'output' | 'input') => {
  return {
    value: of(name) ?? NaN,
    unit: 'dBm' as const,
    expandedUncertainty: of(`${name}Uncertainty`) ?? NaN,
  };
};

/** What a probe takes away is a loss, and left uncorrected it is a part of another reading's budget. */
function loadingReading({ of }: Given): ShownReading {
  const { lossDb, source } = probeLoading({
    circuitOhms: of('circuitOhms') ?? NaN,
    probeOhms: of('probeOhms') ?? NaN,
    probeFarads: of('probeFarads') ?? NaN,
    frequencyHertz: of('frequencyHertz') ?? NaN,
  });
  return { value: -lossDb, unit: 'dB', uncertaintyUnit: 'dB', ...uncertaintyBudget([source]) };
}

function readingOf(given: Given): ShownReading {
  const method = entryMethodOf(given.way);
  if (method)
    return readingFromInputs(method, entryInputs(method, given), assumptionsOf(given), given.meterUnit);
  if (given.way === 'detector-table') return tableReading(given);
  if (given.way === 'rise-time') {
    const { of } = given;
    return riseTimeReading({
      divisions: (of('divisions') ?? NaN) / baseUnitsIn('div'),
      secondsPerDivision: of('secondsPerDivision') ?? NaN,
      readToDivisions: (of('readToDivisions') ?? NaN) / baseUnitsIn('div'),
      bandwidthHertz: of('bandwidthHertz') ?? NaN,
      ...assumptionsOf(given),
    });
  }
  if (given.way === 'gain')
    return gainReading({ output: levelOf(given, 'output'), input: levelOf(given, 'input') });
  return loadingReading(given);
}

function windowOf({ way, meterUnit, of }: Given): WorkedReading['window'] {
  const scale = baseUnitsIn(unitOf(way, meterUnit));
  const [low, high, target] = ['low', 'high', 'target'].map((end) => {
    const value = of(end);
    return value === undefined ? undefined : Number((value / scale).toPrecision(14));
  });
  return low === undefined && high === undefined ? undefined : { low, high, target };
}

/** A smaller setting of the oscilloscope, where the reading is a level taken on one. */
function tighterOf(given: Given, window: VerdictWindow): TighterScale | undefined {
  if (given.way !== 'oscilloscope' && given.way !== 'two-tone-envelope') return undefined;
  return tighterScale(scopeInput(entryInputs(given.way, given), assumptionsOf(given)), window);
}

function judged(given: Given): WorkedReading {
  const { way } = given;
  const reading = readingOf(given);
  const window = windowOf(given);
  if (!window) return { way, reading, advice: '' };
  const verdict = verdictOf(reading.value, reading.expandedUncertainty, window);
  const isTooClose = verdict === 'too close to call';
  const advice = isTooClose ? tooCloseText(reading, window, tighterOf(given, window)) : '';
  return { way, reading, window, verdict, advice };
}

/** The reading of the way chosen; what is out of its domain is named by the page's own input. */
export function work(values: Values): WorkedReading {
  const given = givenOf(values);
  try {
    return judged(given);
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    throw new OutOfDomainError(given.key(error.input), error.value, error.permitted, error.message);
  }
}
