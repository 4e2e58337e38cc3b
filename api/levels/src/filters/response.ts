import { requireSome, requireWithin } from '../domain';
import { requireLadder } from './ladder';
import type { Ladder } from './ladder';

/** Q of the parts, the same at every frequency; a part without loss where left out. */
export interface PartQ {
  inductorQ?: number;
  capacitorQ?: number;
}

/** Response over frequency; arrays of one length. */
export interface LadderResponse {
  hertz: Float64Array;
  /** Power in the load over power available from the source, dB; a loss is negative. */
  gainDb: Float64Array;
  /** Of the input, with the load connected, dB; {@link PERFECT_RETURN_LOSS_DB} at most. */
  returnLossDb: Float64Array;
}

/** Stands for a match without reflection, which has no figure: no bench can see it. */
export const PERFECT_RETURN_LOSS_DB = 200;

const GREATEST_HERTZ = 1e15;

/** Stands for no transmission at all. */
const LEAST_GAIN_DB = -1000;

/**
 * Response of a ladder from its real parts with their Q.
 *
 * Each element's chain matrix is applied to voltage and current, from the load back to the source: ABCD analysis with
 * one column, in plain real and imaginary numbers, nothing allocated on the way.
 *
 * @param hertz - frequencies, each above 0, in any order; 1 to 1,000,000.
 * @throws OutOfDomainError naming the input.
 * @example Array.from(ladderResponse(lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }), Float64Array.of(10e6, 30e6)).gainDb) //=> [-3.0103, -28.633229]
 * @see Microwave Engineering (textbook), ABCD matrices; transducer gain 4·Rs·RL⁻¹·|VL/VS|²
 */
export function ladderResponse(ladder: Ladder, hertz: Float64Array, q: PartQ = {}): LadderResponse {
  const packed = packedLadder(ladder, q);
  requireFrequencies(hertz);
  const response = {
    hertz,
    gainDb: new Float64Array(hertz.length),
    returnLossDb: new Float64Array(hertz.length),
  };
  fillResponse(packed, packed.values, hertz, response.gainDb, response.returnLossDb, 0);
  return response;
}

/**
 * Frequencies at equal steps, both ends included.
 *
 * @param points - 2 to 1,000,000.
 * @throws OutOfDomainError naming the input.
 * @example Array.from(frequencyGrid(10e6, 30e6, 3)) //=> [10000000, 20000000, 30000000]
 */
export function frequencyGrid(lowHertz: number, highHertz: number, points: number): Float64Array {
  requireWithin(
    { input: 'lowHertz', label: 'Lowest frequency', unit: 'Hz', above: 0, atMost: 1e15 },
    lowHertz,
  );
  requireWithin(
    { input: 'highHertz', label: 'Highest frequency', unit: 'Hz', above: lowHertz, atMost: 1e15 },
    highHertz,
  );
  requireWithin({ input: 'points', label: 'Points', atLeast: 2, atMost: 1e6 }, points);
  const grid = new Float64Array(Math.floor(points));
  const step = (highHertz - lowHertz) / (grid.length - 1);
  for (let index = 0; index < grid.length; index++) grid[index] = lowHertz + index * step;
  return grid;
}

/** A ladder as typed arrays, from the load to the source. */
export interface PackedLadder {
  /** 0 coil in series, 1 capacitor in series, 2 coil to ground, 3 capacitor to ground. */
  kinds: Uint8Array;
  values: Float64Array;
  sourceOhms: number;
  loadOhms: number;
  /** 1/Q, 0 without loss. */
  inductorLoss: number;
  capacitorLoss: number;
}

/** Checks a ladder and packs it for the loops. */
export function packedLadder(ladder: Ladder, { inductorQ, capacitorQ }: PartQ): PackedLadder {
  requireLadder(ladder);
  const backwards = [...ladder.elements].reverse();
  return {
    kinds: Uint8Array.from(backwards, ({ place, part }) => {
      return (place === 'shunt' ? 2 : 0) + (part === 'capacitor' ? 1 : 0);
    }),
    values: Float64Array.from(backwards, ({ value }) => value),
    sourceOhms: ladder.sourceOhms,
    loadOhms: ladder.loadOhms,
    inductorLoss: lossOf('inductorQ', 'Q of the coils', inductorQ),
    capacitorLoss: lossOf('capacitorQ', 'Q of the capacitors', capacitorQ),
  };
}

function lossOf(input: string, label: string, q: number | undefined): number {
  return q === undefined ? 0 : 1 / requireWithin({ input, label, atLeast: 1, atMost: 1e9 }, q);
}

/** Frequencies that can be worked with. The bare comparison goes first: there may be thousands. */
export function requireFrequencies(hertz: Float64Array): void {
  requireSome({ input: 'hertz', label: 'Frequencies' }, hertz, 1e6);
  for (const frequency of hertz) {
    if (frequency > 0 && frequency <= GREATEST_HERTZ) continue;
    requireWithin(
      { input: 'hertz', label: 'Frequency', unit: 'Hz', above: 0, atMost: GREATEST_HERTZ },
      frequency,
    );
  }
}

/**
 * The loop itself, in one piece because it is the heaviest of the package. `values` stands apart so that a spread can
 * hand in those of one build after another.
 *
 * @param offset - where in the outputs to begin.
 */
export function fillResponse(
  packed: PackedLadder,
  values: Float64Array,
  hertz: Float64Array,
  gainDb: Float64Array,
  returnLossDb: Float64Array,
  offset: number,
): void {
  const { kinds, sourceOhms, loadOhms, inductorLoss, capacitorLoss } = packed;
  const count = kinds.length;
  const most = (4 * sourceOhms) / loadOhms;
  for (let point = 0; point < hertz.length; point++) {
    const omega = 2 * Math.PI * (hertz[point] ?? 0);
    let vRe = 1;
    let vIm = 0;
    let iRe = 1 / loadOhms;
    let iIm = 0;
    for (let index = 0; index < count; index++) {
      const kind = kinds[index] ?? 0;
      const x = omega * (values[index] ?? 0);
      // An element's impedance (in series) or admittance (to ground), real and imaginary.
      let re: number;
      let im: number;
      if (kind === 0 || kind === 3) {
        re = x * (kind === 0 ? inductorLoss : capacitorLoss);
        im = x;
      } else {
        const loss = kind === 1 ? capacitorLoss : inductorLoss;
        const scale = 1 / (x * (1 + loss * loss));
        re = loss * scale;
        im = -scale;
      }
      if (kind < 2) {
        vRe += re * iRe - im * iIm;
        vIm += re * iIm + im * iRe;
      } else {
        iRe += re * vRe - im * vIm;
        iIm += re * vIm + im * vRe;
      }
    }
    const forward = (vRe + sourceOhms * iRe) ** 2 + (vIm + sourceOhms * iIm) ** 2;
    const back = (vRe - sourceOhms * iRe) ** 2 + (vIm - sourceOhms * iIm) ** 2;
    gainDb[offset + point] = decibelsOf(most / forward, LEAST_GAIN_DB);
    // So far out that the numbers overflow, everything comes back.
    returnLossDb[offset + point] =
      forward === Infinity ? 0 : -decibelsOf(back / forward, -PERFECT_RETURN_LOSS_DB);
  }
}

/** The natural logarithm is the faster one, and half of the time goes into it. */
const DB_PER_NATURAL = 10 / Math.LN10;

/** Held to a finite figure: what lies under `least` is `least`. */
function decibelsOf(ratio: number, least: number): number {
  const decibels = DB_PER_NATURAL * Math.log(ratio);
  return decibels > least ? decibels : least;
}
