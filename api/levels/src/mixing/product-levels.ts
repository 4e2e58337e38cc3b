import { requireWithin } from '../domain';
import { dBm } from '../units';
import type { MixingProduct } from './products';

/** A figure in dB, with the half width of what it may be in a given mixer (k = 2). */
export interface FigureDb {
  db: number;
  plusMinusDb: number;
}

/** What is known, or assumed, about a mixer. */
export interface MixerFigures {
  /** Loss from the intermediate frequency to either second-order product, positive. */
  conversionLoss: FigureDb;
  /** Local oscillator at the output, below its drive. */
  loLeakage: FigureDb;
  /** Intermediate frequency at the output, below its level at the input. */
  ifLeakage: FigureDb;
  /** Third-order intercept at the input, dBm. */
  inputInterceptDbm: number;
  /** How far its balance takes down products with an even multiple of the oscillator, further than an odd one. */
  evenLoBalanceDb: number;
  /** The same for even multiples of the intermediate frequency, and for even harmonics of the oscillator alone. */
  evenIfBalanceDb: number;
  /** Half width of what an estimated product of higher order may be, dB (k = 2). */
  higherOrderPlusMinusDb: number;
}

/**
 * Figures of a double-balanced diode ring, for when a member has measured none.
 *
 * Common practice for the class: loss 5.5 to 7 dB, isolation at HF 25 to 50 dB, intercept some 5 to 10 dB above the
 * drive. How the balance takes down even products differs widely from part to part.
 */
export const DIODE_RING: MixerFigures = {
  conversionLoss: { db: 6.5, plusMinusDb: 1 },
  loLeakage: { db: 35, plusMinusDb: 10 },
  ifLeakage: { db: 30, plusMinusDb: 10 },
  inputInterceptDbm: 15,
  evenLoBalanceDb: 35,
  evenIfBalanceDb: 20,
  higherOrderPlusMinusDb: 10,
};

/**
 * Where a diode ring compresses and intercepts, as decibels from its drive: common practice for the class, the lower
 * ends from memory. A measured ring may lie outside by two or three.
 */
export const DIODE_RING_RANGES = {
  compressionBelowDriveDb: { least: 4, greatest: 7 },
  interceptAboveDriveDb: { least: 5, greatest: 10 },
} as const;

/** Drive and signal of a mixer. */
export interface MixerLevels {
  loDbm: number;
  ifDbm: number;
}

/** Level at which a product is to be expected, and how far it may be from it. */
export interface ProductLevel {
  dbm: number;
  /** Expanded uncertainty of the level itself, dB (k = 2). */
  plusMinusDb: number;
}

/** No product is believed weaker than this: it is far under any noise. */
const FLOOR_DBM = -300;

/**
 * Level at which a product is to be expected at the mixer's output.
 *
 * An estimate (common practice): the wanted products lie the conversion loss below the signal; a switching mixer's
 * m-th harmonic of the oscillator converts 20 log m worse; each further order in the signal costs its distance under the
 * intercept; balance takes even products down further.
 *
 * @throws OutOfDomainError naming the input.
 * @example productLevel({ hertz: 28.4e6, loMultiple: 2, ifMultiple: 2, sign: '-', order: 4, name: '', isInverted: true }, { loDbm: 7, ifDbm: -10 }, DIODE_RING).dbm //=> -102.5206
 * @see common practice; the third-order law 2·(intercept − level) is textbook
 */
export function productLevel(
  product: MixingProduct,
  levels: MixerLevels,
  figures: MixerFigures,
): ProductLevel {
  const lo = dBm(levels.loDbm, 'loDbm');
  const signal = dBm(levels.ifDbm, 'ifDbm');
  requireFigures(figures);
  const { loMultiple: m, ifMultiple: n } = product;
  const order = n === 0 ? 0 : (n - 1) * (figures.inputInterceptDbm - signal);
  const harmonic = m === 0 ? 0 : 20 * Math.log10(m);
  const taken = order + harmonic + evenBalance(m, n, figures);
  const from = n === 0 ? lo : signal;
  const path = pathOf(m, n, figures);
  const isEstimated = m > 1 || n > 1;
  return {
    dbm: Math.max(from - path.db - Math.max(taken, 0), FLOOR_DBM),
    plusMinusDb: isEstimated
      ? Math.hypot(path.plusMinusDb, figures.higherOrderPlusMinusDb)
      : path.plusMinusDb,
  };
}

function pathOf(m: number, n: number, figures: MixerFigures): FigureDb {
  if (n === 0) return figures.loLeakage;
  return m === 0 ? figures.ifLeakage : figures.conversionLoss;
}

function evenBalance(m: number, n: number, figures: MixerFigures): number {
  if (m === 0) return 0;
  if (n === 0) return m % 2 === 0 ? figures.evenIfBalanceDb : 0;
  return (m % 2 === 0 ? figures.evenLoBalanceDb : 0) + (n % 2 === 0 ? figures.evenIfBalanceDb : 0);
}

function requireFigures(figures: MixerFigures): void {
  const { inputInterceptDbm, evenLoBalanceDb, evenIfBalanceDb, higherOrderPlusMinusDb } = figures;
  const decibels: [string, string, number][] = [
    ['evenLoBalanceDb', 'Balance of even products', evenLoBalanceDb],
    ['evenIfBalanceDb', 'Balance of even products', evenIfBalanceDb],
    ['higherOrderPlusMinusDb', 'Spread of higher products', higherOrderPlusMinusDb],
    ...(['conversionLoss', 'loLeakage', 'ifLeakage'] as const).flatMap((name): [string, string, number][] => [
      [name, 'Figure of the mixer', figures[name].db],
      [name, 'Spread of a figure of the mixer', figures[name].plusMinusDb],
    ]),
  ];
  for (const [input, label, value] of decibels) {
    requireWithin({ input, label, unit: 'dB', atLeast: 0, atMost: 200 }, value);
  }
  dBm(inputInterceptDbm, 'inputInterceptDbm');
}
