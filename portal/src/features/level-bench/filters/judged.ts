import type { Verdict } from '@ferrite-row/levels';
import { BUILDS, least, type FilterBuilds } from './builds';
import type { FilterFigures, TakenLimit } from './figures';

/** A limit with what a thousand builds make of it; without, while they are still being built. */
export interface JudgedLimit extends TakenLimit {
  verdict: Verdict;
  worstDb?: number;
  /** How many builds take what is needed. */
  passing?: number;
  /** Rejection of every build, dB. */
  builds?: Float64Array;
}

/** Return loss in the band against what is wanted there. */
export interface JudgedReturnLoss {
  wantedDb: number;
  /** The least in the band, as fitted. */
  db: number;
  worstDb?: number;
  passing?: number;
  verdict: Verdict;
}

export interface Judged {
  limits: JudgedLimit[];
  returnLoss: JudgedReturnLoss;
}

/** All builds good: pass. None: not yet. Else it depends on the parts that come to hand, and only measuring tells. */
function verdictOn(isNominalGood: boolean, passing: number | undefined): Verdict {
  if (passing === undefined) return isNominalGood ? 'pass' : 'not yet';
  if (passing === BUILDS && isNominalGood) return 'pass';
  return passing === 0 && !isNominalGood ? 'not yet' : 'too close to call';
}

const passingOf = (builds: Float64Array, needed: number): number =>
  builds.filter((one) => one >= needed).length;

function judgeLimit(limit: TakenLimit, builds: Float64Array | undefined): JudgedLimit {
  const isGood = limit.takenDb >= limit.neededDb;
  if (!builds) return { ...limit, verdict: verdictOn(isGood, undefined) };
  const passing = passingOf(builds, limit.neededDb);
  return { ...limit, builds, passing, worstDb: least(builds), verdict: verdictOn(isGood, passing) };
}

/** What is in hand at every limit. Builds from before serve where they were looked at at the same frequency. */
export function judge(figures: FilterFigures, built: FilterBuilds | undefined): Judged {
  const { returnLossDb: db, values } = figures;
  const wantedDb = values.wantedReturnLossDb;
  const inBand = built?.bandReturnLossDb;
  const passing = inBand && passingOf(inBand, wantedDb);
  return {
    limits: figures.limits.map((limit) => {
      const at = built?.limitHertz.indexOf(limit.hertz) ?? -1;
      return judgeLimit(limit, at < 0 ? undefined : built?.rejectionsDb[at]);
    }),
    returnLoss: {
      wantedDb,
      db,
      passing,
      worstDb: inBand && least(inBand),
      verdict: verdictOn(db >= wantedDb, passing),
    },
  };
}

/** What is in hand in the worst build, or as fitted while there are none; negative is short. */
export const inHand = ({ worstDb, takenDb, neededDb }: JudgedLimit): number =>
  (worstDb ?? takenDb) - neededDb;

/** The limit with the least in hand. */
export const tightest = (limits: readonly JudgedLimit[]): JudgedLimit | undefined =>
  [...limits].sort((a, b) => inHand(a) - inHand(b))[0];
