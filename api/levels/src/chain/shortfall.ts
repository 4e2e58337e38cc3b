import { requireSome, requireWithin } from '../domain';
import { formatFixed } from '../format';
import { dBm } from '../units';

/** A stage's output as planned and, where it was, as measured. */
export interface PlannedStage {
  name: string;
  plannedDbm: number;
  /** The window, ± dB, 0 or more. */
  toleranceDb: number;
  measuredDbm?: number;
  /** Of the measured level, k = 2; 0 where left out. */
  expandedUncertaintyDb?: number;
}

/** A measured stage's part in where the level stands. */
export interface StageShare {
  name: string;
  /** Measured less planned level at its output, dB. */
  offPlanDb: number;
  /** How much of `offPlanDb` arose since the last measured stage: its gain less the planned one. */
  changeDb: number;
  /** Planned gain from the last measured stage to here; absent for the first one measured. */
  plannedGainDb?: number;
  /** Stages skipped in between, whose gain is in `changeDb` too. */
  across: string[];
  isInWindow: boolean;
  /** Whether `changeDb` is more than the two readings' uncertainty together. */
  isCertain: boolean;
}

/** Where a level went. */
export interface Shortfall {
  /** At the last measured stage: negative is missing, positive is too much. */
  offPlanDb: number;
  isInWindow: boolean;
  stages: StageShare[];
  /** Stages that moved the level the way it is off, the most first, over a quarter of it; empty when it is inside. */
  causes: StageShare[];
  /** Measured stages that went the other way and hide part of it. */
  hiding: StageShare[];
}

/** Less than this part of what is missing is not worth naming; the portal's own choice. */
const WORTH_NAMING = 0.25;

/**
 * Where a level that is missing (or too much) at the end of a chain arose.
 *
 * @param stages - in signal order; at least one measured. The input of the chain is taken as planned.
 * @throws OutOfDomainError naming the input, a stage's by its place: `stages[2].measuredDbm`; also when none is measured.
 * @example explainShortfall([{ name: 'Balanced modulator', plannedDbm: -18, toleranceDb: 2, measuredDbm: -18.2 }, { name: 'Crystal filter', plannedDbm: -24, toleranceDb: 2, measuredDbm: -27.3 }]).causes.map(({ name, changeDb }) => [name, changeDb]) //=> [['Crystal filter', -3.1]]
 * @see gains in decibels add
 */
export function explainShortfall(stages: readonly PlannedStage[]): Shortfall {
  requireSome({ input: 'stages', label: 'Stages' }, stages, 100);
  const shares = sharesOf(stages);
  requireSome({ input: 'measuredDbm', label: 'Measured stages' }, shares, 100);
  const last = shares.at(-1);
  const offPlanDb = last?.offPlanDb ?? NaN;
  const isInWindow = last?.isInWindow ?? false;
  const bySize = [...shares].sort((a, b) => Math.abs(b.changeDb) - Math.abs(a.changeDb));
  const isWorth = ({ changeDb }: StageShare) => Math.abs(changeDb) >= WORTH_NAMING * Math.abs(offPlanDb);
  const sameWay = ({ changeDb }: StageShare) => changeDb * offPlanDb > 0;
  const otherWay = ({ changeDb }: StageShare) => changeDb * offPlanDb < 0;
  return {
    offPlanDb,
    isInWindow,
    stages: shares,
    causes: isInWindow ? [] : bySize.filter((share) => isWorth(share) && sameWay(share)),
    hiding: isInWindow ? [] : bySize.filter((share) => isWorth(share) && otherWay(share)),
  };
}

function sharesOf(stages: readonly PlannedStage[]): StageShare[] {
  const shares: StageShare[] = [];
  let before: { offPlanDb: number; uncertaintyDb: number; plannedDbm?: number } = {
    offPlanDb: 0,
    uncertaintyDb: 0,
  };
  let across: string[] = [];
  stages.forEach((stage, index) => {
    const { offPlanDb, uncertaintyDb } = requirePlanned(stage, `stages[${index}]`);
    if (offPlanDb === undefined) {
      across.push(stage.name);
      return;
    }
    const changeDb = Number((offPlanDb - before.offPlanDb).toPrecision(12));
    shares.push({
      name: stage.name,
      offPlanDb,
      changeDb,
      plannedGainDb: before.plannedDbm === undefined ? undefined : stage.plannedDbm - before.plannedDbm,
      across,
      isInWindow: Math.abs(offPlanDb) <= stage.toleranceDb,
      isCertain: Math.abs(changeDb) > Math.hypot(uncertaintyDb, before.uncertaintyDb),
    });
    before = { offPlanDb, uncertaintyDb, plannedDbm: stage.plannedDbm };
    across = [];
  });
  return shares;
}

function requirePlanned(stage: PlannedStage, place: string) {
  const { plannedDbm, toleranceDb, measuredDbm, expandedUncertaintyDb = 0 } = stage;
  const decibel = { unit: 'dB', atLeast: 0, atMost: 200 };
  dBm(plannedDbm, `${place}.plannedDbm`);
  requireWithin(
    { ...decibel, input: `${place}.toleranceDb`, label: `Tolerance of ${stage.name}` },
    toleranceDb,
  );
  const uncertainty = {
    ...decibel,
    input: `${place}.expandedUncertaintyDb`,
    label: `Uncertainty of ${stage.name}`,
  };
  requireWithin(uncertainty, expandedUncertaintyDb);
  if (measuredDbm === undefined) return { offPlanDb: undefined, uncertaintyDb: 0 };
  const off = dBm(measuredDbm, `${place}.measuredDbm`) - plannedDbm;
  return { offPlanDb: Number(off.toPrecision(12)), uncertaintyDb: expandedUncertaintyDb };
}

/**
 * The same in words for a member.
 *
 * @returns one or two sentences.
 * @throws OutOfDomainError as `explainShortfall`.
 * @example shortfallText(explainShortfall([{ name: 'Balanced modulator', plannedDbm: -18, toleranceDb: 2, measuredDbm: -18.2 }, { name: 'Crystal filter', plannedDbm: -24, toleranceDb: 2, measuredDbm: -27.3 }])) //=> '3.3 dB are missing at the Crystal filter. The Crystal filter takes 3.1 dB more than planned; the stage before it is inside.'
 */
export function shortfallText(shortfall: Shortfall): string {
  const { offPlanDb, isInWindow, stages, causes } = shortfall;
  const last = stages.at(-1)?.name ?? '';
  if (isInWindow) return `The level at the ${last} is inside its window.`;
  const size = formatFixed(Math.abs(offPlanDb), 1);
  const state = offPlanDb < 0 ? `${size} dB are missing` : `${size} dB are too much`;
  const [first] = causes;
  if (first === undefined) {
    return `${state} at the ${last}. No one stage stands out: each moved the level a little.`;
  }
  return `${state} at the ${last}. ${causes.map(causeText).join('; ')}; ${beforeText(first, stages)}.`;
}

function causeText(share: StageShare, index: number): string {
  const { name, across, isCertain } = share;
  const also = across.length === 0 ? '' : `, with what lies before it unmeasured (${across.join(', ')}),`;
  const doubt = isCertain ? '' : ', which the readings leave open';
  return `${index === 0 ? 'The' : 'the'} ${name}${also} ${changeText(share)}${doubt}`;
}

/** A loss takes, an amplifier gives, and the first one measured has no gain to speak of. */
function changeText({ changeDb, plannedGainDb }: StageShare): string {
  const size = `${formatFixed(Math.abs(changeDb), 1)} dB`;
  if (plannedGainDb === undefined) return `comes out ${size} ${changeDb < 0 ? 'low' : 'high'}`;
  const isLoss = plannedGainDb < 0;
  const isMore = changeDb < 0 === isLoss;
  return `${isLoss ? 'takes' : 'gives'} ${size} ${isMore ? 'more' : 'less'} than planned`;
}

function beforeText(cause: StageShare, stages: readonly StageShare[]): string {
  const before = stages.slice(0, stages.indexOf(cause));
  if (before.length === 0) return 'it is the first one measured';
  const outside = before.filter(({ isInWindow }) => !isInWindow).map(({ name }) => name);
  if (outside.length > 0) return `before it, outside already: ${outside.join(', ')}`;
  return before.length === 1 ? 'the stage before it is inside' : 'the stages before it are inside';
}
