import {
  AskingError,
  chainOf,
  explainShortfall,
  LevelsError,
  OutOfDomainError,
  readQuantity,
  shortfallText,
  twoToneFromIntercept,
  twoToneProducts,
  verdictOf,
  type ChainRow,
  type TwoTone,
  type TwoToneProducts,
  type Verdict,
} from '@ferrite-row/levels';
import { PEAK_OVER_AVERAGE_DB, type ChainValues } from './inputs';
import { COLUMNS, stagesOf, type ColumnName, type StageTexts } from './stages';

/** A stage read, with what was measured at its output. */
export interface WorkedStage extends ChainRow {
  toleranceDb: number;
  limitDbm?: number;
  measured?: { levelDbm: number; expandedUncertaintyDb: number };
  verdict?: Verdict;
}

export interface WorkedChain {
  inputDbm: number;
  stages: WorkedStage[];
  whole: WorkedStage;
  leastHeadroom?: WorkedStage;
  /** Where the level went; only when something was measured. */
  shortfall?: string;
  /** From the chain's own intercept; absent without one, or when the tones are at it. */
  twoTone?: TwoTone;
  products: TwoToneProducts;
}

type StageNumbers = Partial<Record<ColumnName, number>>;

const placeOf = (index: number, name: string): string => `stages[${index}].${name}`;

function numbersOf(stage: StageTexts, index: number): StageNumbers & { gainDb: number } {
  const read = COLUMNS.flatMap(({ name, unit }): [ColumnName, number][] =>
    stage[name].trim() === '' ? [] : [[name, readQuantity(stage[name], unit, placeOf(index, name)).value]],
  );
  const numbers: StageNumbers = Object.fromEntries(read);
  if (numbers.gainDb === undefined) {
    const message = `Gain of ${stage.name || 'the stage'}: a number is needed, 0 for none.`;
    throw new AskingError(placeOf(index, 'gainDb'), stage.gainDb, 'a number', message, []);
  }
  return { ...numbers, gainDb: numbers.gainDb };
}

const overAverage = ({ signal, peakOverAverageDb }: ChainValues): number =>
  signal === 'own' ? peakOverAverageDb : PEAK_OVER_AVERAGE_DB[signal];

function measuredOf({ measuredDbm, expandedUncertaintyDb = 0, toleranceDb }: StageNumbers, planDbm: number) {
  if (measuredDbm === undefined) return {};
  const measured = { levelDbm: measuredDbm, expandedUncertaintyDb };
  if (toleranceDb === undefined) return { measured };
  const window = { low: planDbm - toleranceDb, high: planDbm + toleranceDb };
  return { measured, verdict: verdictOf(measuredDbm, expandedUncertaintyDb, window) };
}

function shortfallOf(stages: readonly WorkedStage[]): string | undefined {
  if (stages.every(({ measured }) => measured === undefined)) return undefined;
  const planned = stages.map(({ name, peakDbm, toleranceDb, measured }) => ({
    ...{ name, plannedDbm: peakDbm, toleranceDb, measuredDbm: measured?.levelDbm },
    expandedUncertaintyDb: measured?.expandedUncertaintyDb,
  }));
  return shortfallText(explainShortfall(planned));
}

const TONE_UNDER_PEAK_DB = 20 * Math.log10(2);

function twoToneOf({ peakDbm, outputInterceptDbm }: ChainRow): TwoTone | undefined {
  const tone = peakDbm - TONE_UNDER_PEAK_DB;
  if (outputInterceptDbm === undefined || tone >= outputInterceptDbm) return undefined;
  return twoToneFromIntercept(tone, outputInterceptDbm);
}

function leastOf(stages: readonly WorkedStage[]): WorkedStage | undefined {
  const limited = stages.filter(({ headroomDb }) => headroomDb !== undefined);
  return [...limited].sort((a, b) => (a.headroomDb ?? 0) - (b.headroomDb ?? 0))[0];
}

function reckon(values: ChainValues): WorkedChain {
  const texts = stagesOf(values.stages);
  const numbers = texts.map(numbersOf);
  const peakOverAverageDb = overAverage(values);
  const rows = chainOf({
    inputDbm: values.inputDbm - peakOverAverageDb,
    peakOverAverageDb,
    stages: numbers.map((stage, index) => ({ name: texts[index]?.name || `Stage ${index + 1}`, ...stage })),
  });
  const stages = rows.map((row, index): WorkedStage => {
    const { toleranceDb = 0, limitDbm } = numbers[index] ?? {};
    return { ...row, toleranceDb, limitDbm, ...measuredOf(numbers[index] ?? {}, row.peakDbm) };
  });
  return {
    inputDbm: values.inputDbm,
    stages,
    whole: stages[stages.length - 1],
    leastHeadroom: leastOf(stages),
    shortfall: shortfallOf(stages),
    twoTone: twoToneOf(rows[rows.length - 1]),
    products: twoToneProducts(values.firstHertz, values.secondHertz),
  };
}

const IN_A_STAGE = /^stages(\[|$)/;

/** What the typed stages come to; whatever is wrong in one of them is the list's. */
export function work(values: ChainValues): WorkedChain {
  try {
    return reckon(values);
  } catch (error) {
    if (!(error instanceof LevelsError) || !IN_A_STAGE.test(error.input)) throw error;
    throw new OutOfDomainError('stages', error.value, error.permitted, error.message);
  }
}

/** The field of a stage that keeps the chain from being worked out, by its place: `stages[2].gainDb`. */
export function problemIn(stages: string): Record<string, string> {
  try {
    chainOf({
      inputDbm: 0,
      stages: stagesOf(stages).map((stage, index) => ({ name: stage.name, ...numbersOf(stage, index) })),
    });
    return {};
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return { [error.input]: error.message };
  }
}
