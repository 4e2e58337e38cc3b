import {
  frequencyGrid,
  ladderResponse,
  powerShares,
  type FittedLadder,
  type LadderResponse,
} from '@ferrite-row/levels';
import { least, type BuildsAsked } from './builds';
import { carrierOf, type Carrier } from './carrier';
import { outside } from './field-names';
import { axisFor, plotFrequencies, type Axis } from './frequencies';
import type { FilterValues } from './inputs';
import { exactLadder, fittedLadder, setUp, trimmedAt } from './ladder';
import { limitsOf, type Limit, type Limits } from './limits';

/** A limit, and what the filter as fitted takes there. */
export interface TakenLimit extends Limit {
  takenDb: number;
}

/** Everything of a filter but its spread. All of it is of the parts as fitted, with their Q. */
export interface FilterFigures {
  values: FilterValues;
  fitted: FittedLadder;
  carrier: Carrier;
  axis: Axis;
  response: LadderResponse;
  against: Limits;
  limits: TakenLimit[];
  /** The least in the band. */
  returnLossDb: number;
  /** The greatest in the band, and the heat there. */
  insertionLossDb: number;
  heatWatts: number;
  /** For the spread. */
  asked: BuildsAsked;
}

const BAND_POINTS = 15;

function bandPoints({ lowHertz, highHertz }: Carrier): Float64Array {
  return highHertz > lowHertz ? frequencyGrid(lowHertz, highHertz, BAND_POINTS) : Float64Array.of(lowHertz);
}

/** A band-pass is looked at closely over thrice its bandwidth. */
function closeLook({ kind, centreHertz, bandwidthHertz }: FilterValues) {
  if (kind !== 'band-pass') return undefined;
  return { lowHertz: centreHertz - 1.5 * bandwidthHertz, highHertz: centreHertz + 1.5 * bandwidthHertz };
}

const GREATEST_SEED = 2 ** 32 - 1;

/** What the builds will be made from, checked before they are: in the units it was typed in, and at once. */
function requireSpread({ toleranceRel, seed }: FilterValues): void {
  if (!(toleranceRel >= 0 && toleranceRel <= 0.5)) {
    throw outside('toleranceRel', 'Part tolerance', toleranceRel, '0 to 50 %');
  }
  if (!Number.isInteger(seed) || seed < 0 || seed > GREATEST_SEED) {
    throw outside('seed', 'Seed of the builds', seed, `a whole number from 0 to ${GREATEST_SEED}`);
  }
}

/** What a filter does, as its parts will make it. */
export function workFilter(values: FilterValues): FilterFigures {
  requireSpread(values);
  const fitted = fittedLadder(exactLadder(values), values);
  const ladder = setUp(fitted, values);
  const trimmedAtHertz = trimmedAt(values);
  const { inductorQ, capacitorQ, toleranceRel, seed } = values;
  const q = { inductorQ, capacitorQ };
  const carrier = carrierOf(values);
  const against = limitsOf(values, carrier);
  const bandHertz = bandPoints(carrier);
  const limitHertz = Float64Array.from(against.limits, ({ hertz }) => hertz);
  const axis = axisFor(carrier.lowHertz);
  const plotHertz = plotFrequencies(axis, [...bandHertz, ...limitHertz], closeLook(values));
  const inBand = ladderResponse(ladder, bandHertz, q);
  const atLimits = ladderResponse(ladder, limitHertz, q).gainDb;
  const carrierHertz = carrier.lowHertz;
  const worstAt = bandHertz[inBand.gainDb.indexOf(least(inBand.gainDb))] ?? carrierHertz;
  const shares = powerShares(ladder, worstAt, q);
  return {
    values,
    fitted,
    carrier,
    axis,
    response: ladderResponse(ladder, plotHertz, q),
    against,
    limits: against.limits.map((limit, index) => ({
      ...limit,
      takenDb: inBand.gainDb[0] - atLimits[index],
    })),
    returnLossDb: least(inBand.returnLossDb),
    insertionLossDb: shares.insertionLossDb,
    heatWatts: shares.heat * against.carrierWatts,
    asked: {
      ...{ ladder, ...q, toleranceRel, seed, trimmedAtHertz },
      ...{ plotHertz, carrierHertz, bandHertz, limitHertz },
    },
  };
}
