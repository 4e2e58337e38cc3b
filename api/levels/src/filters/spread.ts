import { requireSome, requireWhole, requireWithin } from '../domain';
import { hertz as hertzOf } from '../units';
import { requireLadder } from './ladder';
import type { Ladder } from './ladder';
import { valueAtRank } from './quantile';
import { seededRandom } from './random';
import { fillResponse, packedLadder, requireFrequencies } from './response';
import type { PackedLadder, PartQ } from './response';
import { resonatorsOf, trim } from './trim';

/** How a ladder's parts scatter, and how many are built. */
export interface SpreadInput extends PartQ {
  ladder: Ladder;
  /** Every part lies anywhere within, 0.05 for ± 5 %. */
  capacitorToleranceRel: number;
  inductorToleranceRel: number;
  /** Every resonator to ground is trimmed to this frequency after it is built; left out, parts stay as they are. */
  trimmedAtHertz?: number;
  /** 1 to 20,000. */
  builds: number;
  /** The same seed gives the same builds on every machine. */
  seed: number;
}

/** Every build at every frequency: build after build, each as long as `hertz`. */
export interface Builds {
  hertz: Float64Array;
  builds: number;
  gainDb: Float64Array;
  returnLossDb: Float64Array;
}

/** Most figures kept, builds times frequencies: two arrays of 32 MB. */
const GREATEST_FIGURES = 4e6;

/**
 * Builds a ladder many times over from parts that scatter within their tolerance, evenly and each for itself.
 *
 * @param hertz - frequencies of interest: all of a plot, or only a few harmonics for a histogram.
 * @returns every build's gain and return loss; time grows with builds times frequencies.
 * @throws OutOfDomainError naming the input.
 * @example ladderBuilds({ ladder: lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }), capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 2, seed: 1 }, Float64Array.of(10e6)).gainDb[1] //=> -3.0103
 * @see JCGM 101:2008, propagation of distributions by a Monte Carlo method; rectangular as in JCGM 100:2008, 4.3.7
 */
export function ladderBuilds(input: SpreadInput, hertz: Float64Array): Builds {
  const packed = packedLadder(requireLadder(input.ladder), input);
  requireFrequencies(hertz);
  const builds = requireBuilds(input, hertz.length);
  const tolerances = tolerancesOf(packed, input);
  const random = seededRandom(input.seed);
  const values = new Float64Array(packed.values.length);
  const trimmed = trimmingOf(packed, input);
  const figures = builds * hertz.length;
  const made = { hertz, builds, gainDb: new Float64Array(figures), returnLossDb: new Float64Array(figures) };
  for (let build = 0; build < builds; build++) {
    for (let index = 0; index < values.length; index++) {
      values[index] = (packed.values[index] ?? 0) * (1 + (2 * random() - 1) * (tolerances[index] ?? 0));
    }
    trimmed(values);
    fillResponse(packed, values, hertz, made.gainDb, made.returnLossDb, build * hertz.length);
  }
  return made;
}

/** What is done to a build's values before it is looked at. */
function trimmingOf(packed: PackedLadder, { trimmedAtHertz }: SpreadInput): (values: Float64Array) => void {
  if (trimmedAtHertz === undefined) return () => undefined;
  const omega = 2 * Math.PI * hertzOf(trimmedAtHertz, 'trimmedAtHertz');
  const resonators = resonatorsOf(packed);
  return (values) => trim(packed, resonators, values, omega);
}

function requireBuilds({ builds, seed }: SpreadInput, points: number): number {
  requireWhole({ input: 'seed', label: 'Seed', atLeast: -(2 ** 31), atMost: 2 ** 32 - 1 }, seed);
  const atMost = Math.max(1, Math.min(20_000, Math.floor(GREATEST_FIGURES / points)));
  return requireWhole({ input: 'builds', label: 'Builds', atLeast: 1, atMost }, builds);
}

function tolerancesOf(packed: PackedLadder, input: SpreadInput): Float64Array {
  const domain = { label: 'Tolerance', atLeast: 0, atMost: 0.5 };
  requireWithin({ ...domain, input: 'capacitorToleranceRel' }, input.capacitorToleranceRel);
  requireWithin({ ...domain, input: 'inductorToleranceRel' }, input.inductorToleranceRel);
  return Float64Array.from(packed.kinds, (kind) =>
    kind % 2 === 1 ? input.capacitorToleranceRel : input.inductorToleranceRel,
  );
}

/** Percentiles over frequency, one array for each asked for, in that order. */
export interface SpreadBands {
  hertz: Float64Array;
  percentiles: readonly number[];
  gainDb: Float64Array[];
  returnLossDb: Float64Array[];
}

/**
 * Percentiles of many builds at each frequency: 2.5 and 97.5 hold the middle 95 %, 0 and 100 are the extremes.
 *
 * @param percentiles - 0 to 100, up to ten; the value of the build nearest to that place, none made up between two.
 * @throws OutOfDomainError naming the input.
 * @example spreadBands(ladderBuilds({ ladder: lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }), capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 5, seed: 1 }, Float64Array.of(10e6)), [50]).gainDb[0][0] //=> -3.0103
 * @see nearest-rank percentile, textbook
 */
export function spreadBands(made: Builds, percentiles: readonly number[] = [2.5, 97.5]): SpreadBands {
  requireSome({ input: 'percentiles', label: 'Percentiles' }, percentiles, 10);
  for (const percentile of percentiles) {
    requireWithin({ input: 'percentiles', label: 'Percentile', atLeast: 0, atMost: 100 }, percentile);
  }
  return {
    hertz: made.hertz,
    percentiles,
    gainDb: bandsOf(made, made.gainDb, percentiles),
    returnLossDb: bandsOf(made, made.returnLossDb, percentiles),
  };
}

/** Builds lie one after the other, so a column is gathered a cache line at a time, eight frequencies together. */
const TILE = 8;

function bandsOf(
  { hertz, builds }: Builds,
  figures: Float64Array,
  percentiles: readonly number[],
): Float64Array[] {
  const bands = percentiles.map(() => new Float64Array(hertz.length));
  const columns = new Float64Array(TILE * builds);
  for (let start = 0; start < hertz.length; start += TILE) {
    const width = Math.min(TILE, hertz.length - start);
    for (let build = 0; build < builds; build++) {
      const from = build * hertz.length + start;
      for (let k = 0; k < width; k++) columns[k * builds + build] = figures[from + k] ?? 0;
    }
    for (let k = 0; k < width; k++) {
      const column = columns.subarray(k * builds, (k + 1) * builds);
      percentiles.forEach((percentile, index) => {
        const band = bands[index];
        if (band) band[start + k] = valueAtRank(column, Math.round((percentile / 100) * (builds - 1)));
      });
    }
  }
  return bands;
}
