import { ladderBuilds, spreadBands, type Ladder, type PartQ, type SpreadBands } from '@ferrite-row/levels';
import { named } from './field-names';

/** How many times the filter is built, each time from other parts. */
export const BUILDS = 1000;

/** The middle 95 %. */
const PERCENTILES = [2.5, 97.5];

export interface BuildsAsked extends PartQ {
  ladder: Ladder;
  toleranceRel: number;
  /** Each resonator of each build is trimmed to this frequency. */
  trimmedAtHertz?: number;
  seed: number;
  /** Where the band of the builds is drawn. */
  plotHertz: Float64Array;
  /** Rejection counts against the gain here. */
  carrierHertz: number;
  /** Points of the wanted band, for the return loss in it. */
  bandHertz: Float64Array;
  /** Where rejection is looked at. */
  limitHertz: Float64Array;
}

export interface FilterBuilds {
  limitHertz: Float64Array;
  bands: SpreadBands;
  /** For each of `limitHertz`: every build's rejection against the carrier, dB. */
  rejectionsDb: Float64Array[];
  /** Every build's least return loss in the band, dB. */
  bandReturnLossDb: Float64Array;
}

/** The filter built a thousand times from parts that scatter: the band of its response, and what each build does at the limits. */
export function filterBuilds(asked: BuildsAsked): FilterBuilds {
  const { plotHertz, carrierHertz, bandHertz, limitHertz, toleranceRel, ...rest } = asked;
  const tolerances = { capacitorToleranceRel: toleranceRel, inductorToleranceRel: toleranceRel };
  const names = { capacitorToleranceRel: 'toleranceRel', inductorToleranceRel: 'toleranceRel' };
  const built = (hertz: Float64Array) =>
    named(names, () => ladderBuilds({ ...rest, ...tolerances, builds: BUILDS }, hertz));
  // The same seed gives the same thousand builds, whatever frequencies they are looked at.
  const atLimits = built(Float64Array.of(carrierHertz, ...limitHertz));
  const inBand = built(bandHertz);
  return {
    limitHertz,
    bands: spreadBands(built(plotHertz), PERCENTILES),
    rejectionsDb: Array.from(limitHertz, (_hertz, index) =>
      eachBuild((build) => {
        const row = build * (limitHertz.length + 1);
        return atLimits.gainDb[row] - atLimits.gainDb[row + index + 1];
      }),
    ),
    bandReturnLossDb: eachBuild((build) =>
      least(inBand.returnLossDb.subarray(build * bandHertz.length, (build + 1) * bandHertz.length)),
    ),
  };
}

const eachBuild = (figure: (build: number) => number): Float64Array =>
  Float64Array.from({ length: BUILDS }, (_build, index) => figure(index));

/** The least of some figures. */
export const least = (figures: Float64Array): number =>
  figures.reduce((smallest, one) => Math.min(smallest, one), Infinity);
