import { requireWithin } from '../domain';
import { hertz } from '../units';
import { verdictOf } from '../verdict';
import type { Verdict } from '../verdict';
import { convert } from './conversion';
import type { Conversion, WantedProduct } from './conversion';
import { productLevel } from './product-levels';
import type { MixerFigures, MixerLevels } from './product-levels';
import { mixingProducts } from './products';
import type { MixingInput, MixingProduct } from './products';

/** What a mixer's products are judged by. */
export interface JudgeInput extends MixingInput, MixerLevels {
  wanted: WantedProduct;
  mixer: MixerFigures;
  /** Gain of the filter after the mixer at a frequency, dB, a loss negative; no filter where left out. */
  filterGainDb?: (hertz: number) => number;
  /** How far the filter may be from that outside the band, dB (k = 2); 0 where left out. */
  filterPlusMinusDb?: number;
  /** Band in which products come out: no filter takes them. */
  bandLowHertz: number;
  bandHighHertz: number;
  /** How far every other product must lie below the wanted one, dB. */
  goalDb: number;
}

/** A product with what becomes of it. */
export interface JudgedProduct extends MixingProduct {
  isWanted: boolean;
  /** Leaving the mixer. */
  levelDbm: number;
  /** After the filter. */
  filteredDbm: number;
  /** Below the wanted product after the filter; 0 for the wanted one. */
  belowWantedDb: number;
  /** Of `belowWantedDb`, k = 2. */
  plusMinusDb: number;
  /** `belowWantedDb` less its uncertainty and the goal: negative is short. */
  inHandDb: number;
  /** Of the wanted product: whether it lies in the band. */
  verdict: Verdict;
  place: 'below the band' | 'in the band' | 'above the band';
  /** Distance to the nearest edge of the band, Hz; 0 in it. */
  fromBandHertz: number;
}

/** All products, and what is wanted of them. */
export interface JudgedProducts {
  wanted: JudgedProduct;
  conversion: Conversion;
  /** The others, least in hand first: those that do harm stand at the top. */
  others: JudgedProduct[];
  nearestBelow?: JudgedProduct;
  nearestAbove?: JudgedProduct;
}

/**
 * Every product of a mixer judged against a goal, after a filter, sorted by the harm it does.
 *
 * @throws OutOfDomainError naming the input, also when the filter's gain is no finite number.
 * @example judgeProducts({ loHertz: 23.067e6, ifHertz: 8.867e6, maxOrder: 2, loDbm: 7, ifDbm: -10, wanted: 'difference', mixer: DIODE_RING, bandLowHertz: 14e6, bandHighHertz: 14.35e6, goalDb: 60 }).others[0].name //=> 'LO + IF'
 * @see `productLevel`, `verdictOf`
 */
export function judgeProducts(input: JudgeInput): JudgedProducts {
  requireBand(input);
  const conversion = convert(input.loHertz, input.ifHertz, input.wanted);
  const sign = input.wanted === 'sum' ? '+' : '-';
  const isWanted = (product: MixingProduct) =>
    product.loMultiple === 1 && product.ifMultiple === 1 && product.sign === sign;
  const levels = mixingProducts({ ...input, maxOrder: Math.max(input.maxOrder, 2) }).map((product) => {
    return { product, ...levelsOf(product, input), isWanted: isWanted(product) };
  });
  const reference = levels.find((level) => level.isWanted);
  if (reference === undefined) throw new Error('the second order holds both the sum and the difference');
  const judged = levels.map((level) => judgedProduct(level, reference, input));
  const others = judged.filter((product) => !product.isWanted && product.order <= input.maxOrder);
  const [wanted = judgedProduct(reference, reference, input)] = judged.filter((product) => product.isWanted);
  return {
    wanted,
    conversion,
    others: others.sort((a, b) => a.inHandDb - b.inHandDb),
    ...neighbours(others),
  };
}

interface LeveledProduct {
  product: MixingProduct;
  isWanted: boolean;
  levelDbm: number;
  levelPlusMinusDb: number;
  filteredDbm: number;
}

function levelsOf(product: MixingProduct, input: JudgeInput) {
  const { dbm, plusMinusDb } = productLevel(product, input, input.mixer);
  const gain = input.filterGainDb?.(product.hertz) ?? 0;
  requireWithin(
    { input: 'filterGainDb', label: 'Gain of the filter', unit: 'dB', atLeast: -1000, atMost: 100 },
    gain,
  );
  return { levelDbm: dbm, levelPlusMinusDb: plusMinusDb, filteredDbm: dbm + gain };
}

function judgedProduct(level: LeveledProduct, wanted: LeveledProduct, input: JudgeInput): JudgedProduct {
  const { product, isWanted, levelDbm, filteredDbm } = level;
  const where = placeOf(product.hertz, input);
  const belowWantedDb = wanted.filteredDbm - filteredDbm;
  const plusMinusDb = isWanted ? 0 : plusMinus(level, wanted, where.place, input);
  const isIn = where.place === 'in the band';
  return {
    ...product,
    ...where,
    isWanted,
    levelDbm,
    filteredDbm,
    belowWantedDb,
    plusMinusDb,
    inHandDb: belowWantedDb - plusMinusDb - input.goalDb,
    verdict: isWanted
      ? isIn
        ? 'pass'
        : 'not yet'
      : verdictOf(belowWantedDb, plusMinusDb, { low: input.goalDb }),
  };
}

/** Whatever is converted shares the wanted product's conversion loss, so that uncertainty cancels between them. */
function plusMinus(
  level: LeveledProduct,
  wanted: LeveledProduct,
  place: JudgedProduct['place'],
  { filterPlusMinusDb = 0 }: JudgeInput,
): number {
  const { loMultiple, ifMultiple } = level.product;
  const [own, common] = [level.levelPlusMinusDb ** 2, wanted.levelPlusMinusDb ** 2];
  const apart = loMultiple > 0 && ifMultiple > 0 ? Math.max(own - common, 0) : own + common;
  return Math.hypot(Math.sqrt(apart), place === 'in the band' ? 0 : filterPlusMinusDb);
}

function placeOf(at: number, { bandLowHertz, bandHighHertz }: JudgeInput) {
  if (at < bandLowHertz) return { place: 'below the band', fromBandHertz: bandLowHertz - at } as const;
  if (at > bandHighHertz) return { place: 'above the band', fromBandHertz: at - bandHighHertz } as const;
  return { place: 'in the band', fromBandHertz: 0 } as const;
}

function neighbours(others: readonly JudgedProduct[]): Pick<JudgedProducts, 'nearestBelow' | 'nearestAbove'> {
  const nearest = (place: JudgedProduct['place']) =>
    others
      .filter((product) => product.place === place)
      .sort((a, b) => a.fromBandHertz - b.fromBandHertz || a.order - b.order)[0];
  return { nearestBelow: nearest('below the band'), nearestAbove: nearest('above the band') };
}

function requireBand({ bandLowHertz, bandHighHertz, goalDb, filterPlusMinusDb = 0 }: JudgeInput): void {
  const low = hertz(bandLowHertz, 'bandLowHertz');
  requireWithin(
    { input: 'bandHighHertz', label: 'Top of the band', unit: 'Hz', above: low, atMost: 1e15 },
    bandHighHertz,
  );
  requireWithin({ input: 'goalDb', label: 'Goal', unit: 'dB', atLeast: 0, atMost: 200 }, goalDb);
  const filter = { input: 'filterPlusMinusDb', label: 'Spread of the filter', unit: 'dB' };
  requireWithin({ ...filter, atLeast: 0, atMost: 100 }, filterPlusMinusDb);
}
