import {
  assumptionsWith,
  ENTRY_METHODS,
  entryFields,
  gainReading,
  LevelsError,
  meterUnitOf,
  readEntry,
  readingFromInputs,
  verdictOf,
  type EntryMethod,
  type InstrumentFigures,
  type LevelReading,
  type Verdict,
  type VerdictWindow,
} from '@ferrite-row/levels';
import type { FieldProblem } from '../common/domain-error';
import type { PlanCheck } from '../plans/plan-check.entity';
import type { Caution } from '../plans/stage.entity';

/** What a check of the plan asks of a reading. */
export type AskedMeasure = Pick<PlanCheck, 'method' | 'unit' | 'windowLow' | 'windowHigh' | 'defaults'>;

/** A reading worked out and judged, as it will be kept. */
export interface JudgedReading {
  reading: Omit<LevelReading, 'calculation'> & { calculation: string };
  inputs: Record<string, number>;
  verdict: Verdict;
}

export type Judgement = JudgedReading | { problems: FieldProblem[] };

/**
 * Reads what was typed, works it out and judges it. Decides alone: nothing the sender worked out is looked at.
 *
 * @param figures - of the instrument, as far as it states any.
 */
export function judgeEntry(
  asked: AskedMeasure,
  method: string,
  entry: Readonly<Record<string, unknown>>,
  figures: InstrumentFigures = {},
): Judgement {
  if (!isEntryMethod(asked.method)) return problem('method', 'This value works itself out.');
  if (method !== asked.method) return problem('method', `This check is taken by ${asked.method}.`);
  const unit = meterUnitOf(asked.unit ?? '');
  const known = new Set(entryFields(asked.method, unit).map(({ name }) => name));
  const strange = Object.keys(entry).filter((name) => !known.has(name) || typeof entry[name] !== 'string');
  if (strange.length > 0) return { problems: strange.map((name) => strangeField(name, known)) };
  const { inputs, problems } = readEntry(asked.method, entry as Record<string, string>, unit);
  if (problems.length > 0) return { problems: problems.map(entryProblem) };
  const assumptions = assumptionsWith(asked.method, asked.unit ?? '', asked.defaults, figures);
  try {
    const reading = readingFromInputs(asked.method, inputs, assumptions, unit);
    return { reading, inputs: { ...assumptions, ...inputs }, verdict: judge(reading, asked) };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return { problems: [entryProblem(error)] };
  }
}

function isEntryMethod(method: string | null): method is EntryMethod {
  return ENTRY_METHODS.some((known) => known === method);
}

function strangeField(name: string, known: ReadonlySet<string>): FieldProblem {
  const detail = known.has(name)
    ? 'Send what was typed, as text.'
    : `There is no field named ${name.slice(0, 40)}.`;
  return { pointer: `#/entry/${name.slice(0, 40).replaceAll('~', '~0').replaceAll('/', '~1')}`, detail };
}

function entryProblem({ input, message }: LevelsError): FieldProblem {
  return { pointer: `#/entry/${input}`, detail: message };
}

function problem(field: string, detail: string): Judgement {
  return { problems: [{ pointer: `#/${field}`, detail }] };
}

export function windowOf({
  windowLow,
  windowHigh,
}: Pick<AskedMeasure, 'windowLow' | 'windowHigh'>): VerdictWindow {
  return { low: windowLow ?? undefined, high: windowHigh ?? undefined };
}

function judge(reading: Pick<LevelReading, 'value' | 'expandedUncertainty'>, asked: AskedMeasure): Verdict {
  return verdictOf(reading.value, reading.expandedUncertainty, windowOf(asked));
}

/** A reading in the record, as far as another can be made of it. */
export interface SourceReading {
  value: number;
  unit: string;
  uncertaintyUnit: string;
  standardUncertainty: number;
  expandedUncertainty: number;
  components: LevelReading['components'];
  voltsPeakToPeak: number | null;
  watts: number | null;
  calculation: string;
}

/**
 * A value that works itself out, judged: a gain from output and input, or a level carried over from an earlier stage.
 *
 * @param sources - the readings in force of the checks it is made of, in that order.
 */
export function judgeDerived(
  asked: AskedMeasure,
  sources: readonly SourceReading[],
): JudgedReading | undefined {
  const [first, second] = sources;
  if (!first) return undefined;
  if (asked.method === 'carried')
    return { reading: carried(first), inputs: {}, verdict: judge(first, asked) };
  if (asked.method !== 'gain' || !second) return undefined;
  const reading = gainReading({ output: measuredLevel(first), input: measuredLevel(second) });
  return { reading, inputs: {}, verdict: judge(reading, asked) };
}

/** Units in the record are those of the plan, which was checked when it was published. */
function measuredLevel({ value, unit, expandedUncertainty }: SourceReading) {
  return { value, unit: unit as LevelReading['unit'], expandedUncertainty };
}

function carried(source: SourceReading): JudgedReading['reading'] {
  const { value, standardUncertainty, expandedUncertainty, components, calculation } = source;
  return {
    ...{ value, standardUncertainty, expandedUncertainty, components, calculation },
    unit: source.unit as LevelReading['unit'],
    uncertaintyUnit: source.uncertaintyUnit as LevelReading['uncertaintyUnit'],
    voltsPeakToPeak: source.voltsPeakToPeak ?? undefined,
    watts: source.watts ?? undefined,
  };
}

const GRAVE: readonly Caution[] = ['rf power', 'mains', 'rf exposure', 'licence needed'];

/** Stages that can burn or be heard ask for a tick with every single reading. */
export function asksForTick(cautions: readonly Caution[]): boolean {
  return cautions.some((caution) => GRAVE.includes(caution));
}
