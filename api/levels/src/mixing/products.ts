import { requireWhole } from '../domain';
import { hertz } from '../units';

/** Highest order worked out. */
export const GREATEST_ORDER = 15;

/** How two multiples are joined: their sum, their difference, or only one of them. */
export type ProductSign = '+' | '-' | '';

/** One product |m·LO ± n·IF| of a mixer. */
export interface MixingProduct {
  /** 0 when both multiples meet. */
  hertz: number;
  /** m, 0 or more. */
  loMultiple: number;
  /** n, 0 or more. */
  ifMultiple: number;
  sign: ProductSign;
  /** m + n. */
  order: number;
  /** As a member writes it, with the larger part first: `LO − IF`, `2·LO + 3·IF`, `4·IF − LO`. */
  name: string;
  /** Whether the intermediate frequency comes with a minus sign, so that upper and lower sideband change places. */
  isInverted: boolean;
}

/** What goes into a mixer. */
export interface MixingInput {
  loHertz: number;
  ifHertz: number;
  /** m + n at most, 1 to 15. */
  maxOrder: number;
}

/** Every pair of multiples up to an order, as typed arrays for the loops that run over many settings. */
export interface ProductTable {
  /** m, 0 or more. */
  lo: Int8Array;
  /** n with its sign: negative where it is subtracted. */
  if: Int8Array;
}

/**
 * All pairs of multiples m·LO ± n·IF with 1 ≤ m + n ≤ the order, by rising order.
 *
 * @returns N·(N + 1) pairs for order N.
 * @throws OutOfDomainError when the order is no whole number from 1 to 15.
 * @example productTable(7).lo.length //=> 56
 */
export function productTable(maxOrder: number): ProductTable {
  const domain = { input: 'maxOrder', label: 'Highest order', atLeast: 1, atMost: GREATEST_ORDER };
  requireWhole(domain, maxOrder);
  const pairs: [number, number][] = [];
  for (let order = 1; order <= maxOrder; order++) {
    for (let n = 0; n <= order; n++) {
      pairs.push([order - n, n]);
      if (n > 0 && n < order) pairs.push([order - n, -n]);
    }
  }
  return { lo: Int8Array.from(pairs, ([m]) => m), if: Int8Array.from(pairs, ([, n]) => n) };
}

/**
 * Every product of a mixer up to an order, by rising frequency.
 *
 * @throws OutOfDomainError naming the input.
 * @example mixingProducts({ loHertz: 9.3e6, ifHertz: 5.5e6, maxOrder: 2 }).map(({ name }) => name) //=> ['LO − IF', 'IF', 'LO', '2·IF', 'LO + IF', '2·LO']
 * @see arithmetic: a mixer's output holds the sums and differences of the multiples of what goes in
 */
export function mixingProducts(input: MixingInput): MixingProduct[] {
  const lo = hertz(input.loHertz, 'loHertz');
  const intermediate = hertz(input.ifHertz, 'ifHertz');
  const table = productTable(input.maxOrder);
  const products = Array.from(table.lo, (m, index) => productOf(m, table.if[index] ?? 0, lo, intermediate));
  return products.sort((a, b) => a.hertz - b.hertz || a.order - b.order);
}

/** @param n - with its sign. */
function productOf(m: number, n: number, lo: number, intermediate: number): MixingProduct {
  const signed = m * lo + n * intermediate;
  const sign = m === 0 || n === 0 ? '' : n > 0 ? '+' : '-';
  return {
    hertz: Math.abs(signed),
    loMultiple: m,
    ifMultiple: Math.abs(n),
    sign,
    order: m + Math.abs(n),
    name: nameOf(m, Math.abs(n), sign, signed < 0),
    // Below zero the whole difference is turned about, and the intermediate frequency is the one that counts up.
    isInverted: n < 0 && signed > 0,
  };
}

function nameOf(m: number, n: number, sign: ProductSign, isTurned: boolean): string {
  const [lo, intermediate] = [multipleName(m, 'LO'), multipleName(n, 'IF')];
  if (sign === '') return m === 0 ? intermediate : lo;
  if (sign === '+') return `${lo} + ${intermediate}`;
  return isTurned ? `${intermediate} − ${lo}` : `${lo} − ${intermediate}`;
}

function multipleName(multiple: number, of: 'LO' | 'IF'): string {
  return multiple === 1 ? of : `${multiple}·${of}`;
}
