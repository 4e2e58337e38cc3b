import { requireSome, requireWhole, requireWithin } from '../domain';
import { hertz } from '../units';
import type { Ladder } from './ladder';
import { ladderResponse } from './response';
import type { PartQ } from './response';
import { ladderBuilds } from './spread';
import type { SpreadInput } from './spread';

/** What must be taken at a harmonic of the carrier, against the carrier. */
export interface HarmonicNeed {
  /** 2 for the second harmonic. */
  harmonic: number;
  neededDb: number;
}

/** What a filter takes there. */
export interface HarmonicRejection extends HarmonicNeed {
  hertz: number;
  /** By the filter as fitted, against the carrier: its own loss counts. */
  takenDb: number;
  /** By the worst of the builds. */
  worstDb: number;
  /** Worst less needed: negative is short. */
  inHandDb: number;
  /** Every build's rejection, in the order built: for a histogram. */
  builds: Float64Array;
  /** How many builds take as much as is needed. */
  passing: number;
}

/**
 * Rejection at the harmonics of a carrier, nominal and over many builds.
 *
 * @param needs - one to twenty harmonics.
 * @returns in the order asked.
 * @throws OutOfDomainError naming the input.
 * @example harmonicRejections({ ladder: lowPassLadder({ family: 'Chebyshev', order: 5, rippleDb: 0.1, cutoffHertz: 10e6, sourceOhms: 50, first: 'shunt' }), capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 1, seed: 1 }, 10e6, [{ harmonic: 2, neededDb: 30 }])[0].takenDb //=> 34.747847
 * @see `ladderBuilds`
 */
export function harmonicRejections(
  input: SpreadInput,
  carrierHertz: number,
  needs: readonly HarmonicNeed[],
): HarmonicRejection[] {
  const carrier = hertz(carrierHertz, 'carrierHertz');
  requireSome({ input: 'needs', label: 'Harmonics' }, needs, 20);
  for (const { harmonic, neededDb } of needs) {
    requireWhole({ input: 'harmonic', label: 'Harmonic', atLeast: 2, atMost: 100 }, harmonic);
    requireWithin({ input: 'neededDb', label: 'Needed', unit: 'dB', atLeast: -200, atMost: 200 }, neededDb);
  }
  const at = Float64Array.of(carrier, ...needs.map(({ harmonic }) => harmonic * carrier));
  const nominal = ladderResponse(input.ladder, at, input).gainDb;
  const made = ladderBuilds(input, at);
  return needs.map((need, index) => {
    const builds = rejectionsAt(made.gainDb, at.length, index + 1);
    const worstDb = builds.reduce((worst, taken) => Math.min(worst, taken), Infinity);
    return {
      ...need,
      hertz: at[index + 1] ?? NaN,
      takenDb: (nominal[0] ?? NaN) - (nominal[index + 1] ?? NaN),
      worstDb,
      inHandDb: worstDb - need.neededDb,
      builds,
      passing: builds.filter((taken) => taken >= need.neededDb).length,
    };
  });
}

function rejectionsAt(gainDb: Float64Array, stride: number, column: number): Float64Array {
  const rejections = new Float64Array(gainDb.length / stride);
  for (let build = 0; build < rejections.length; build++) {
    rejections[build] = (gainDb[build * stride] ?? NaN) - (gainDb[build * stride + column] ?? NaN);
  }
  return rejections;
}

/** What a filter does to the power at one frequency. */
export interface PowerShares {
  insertionLossDb: number;
  returnLossDb: number;
  /** Parts of the power available from the source; the three make 1. */
  delivered: number;
  reflected: number;
  heat: number;
}

/**
 * Where the power goes at one frequency: to the load, back to the source, or into heat in the parts.
 *
 * @throws OutOfDomainError naming the input.
 * @example powerShares(lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }), 10e6).delivered //=> 0.5
 * @see conservation of energy
 */
export function powerShares(ladder: Ladder, atHertz: number, q: PartQ = {}): PowerShares {
  const response = ladderResponse(ladder, Float64Array.of(hertz(atHertz, 'atHertz')), q);
  const [gainDb = NaN, returnLossDb = NaN] = [response.gainDb[0], response.returnLossDb[0]];
  const delivered = 10 ** (gainDb / 10);
  const reflected = 10 ** (-returnLossDb / 10);
  return {
    insertionLossDb: -gainDb,
    returnLossDb,
    delivered,
    reflected,
    heat: Math.max(1 - delivered - reflected, 0),
  };
}
