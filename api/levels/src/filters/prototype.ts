import { requireOneOf, requireWhole, requireWithin } from '../domain';

/** Shapes of response offered. */
export type FilterFamily = 'Butterworth' | 'Chebyshev';

/** Highest order offered; beyond it real parts no longer keep what the design promises. */
export const GREATEST_FILTER_ORDER = 15;

/** A shape and its order. */
export interface PrototypeInput {
  family: FilterFamily;
  /** 1 to 15. */
  order: number;
  /** Chebyshev only: depth of the ripple in the passband, above 0 to 3 dB. */
  rippleDb?: number;
}

/** Elements of a low-pass between a source of 1 and a load, cutting off at 1. */
export interface Prototype {
  /** g1 to gn, from the source. */
  elements: number[];
  /** g(n+1): 1, or for an even-order Chebyshev what its load must be: a resistance after a shunt capacitor. */
  load: number;
  /** Loss at the cutoff: 3.01 dB for a Butterworth, the ripple for a Chebyshev. */
  cutoffDb: number;
}

/**
 * Normalised elements of a low-pass.
 *
 * @throws OutOfDomainError naming the input; a ripple is needed for a Chebyshev and not taken by a Butterworth.
 * @example prototypeOf({ family: 'Butterworth', order: 3 }).elements //=> [1, 2, 1]
 * @example prototypeOf({ family: 'Chebyshev', order: 2, rippleDb: 0.1 }).load //=> 1.355361
 * @see Microwave Filters, Impedance-Matching Networks and Coupling Structures (1964), chapter 4
 */
export function prototypeOf(input: PrototypeInput): Prototype {
  const { order, rippleDb } = requirePrototype(input);
  return rippleDb === undefined ? butterworth(order) : chebyshev(order, rippleDb);
}

/** A shape that is permitted, with the ripple only where it belongs. */
export function requirePrototype({ family, order, rippleDb }: PrototypeInput): {
  order: number;
  rippleDb?: number;
} {
  requireOneOf({ input: 'family', label: 'Family' }, ['Butterworth', 'Chebyshev'], family);
  requireWhole({ input: 'order', label: 'Order', atLeast: 1, atMost: GREATEST_FILTER_ORDER }, order);
  if (family === 'Butterworth') return { order };
  const domain = { input: 'rippleDb', label: 'Ripple', unit: 'dB', atLeast: 1e-6, atMost: 3 };
  return { order, rippleDb: requireWithin(domain, rippleDb ?? NaN) };
}

function butterworth(order: number): Prototype {
  const elements = Array.from(
    { length: order },
    (_value, k) => 2 * Math.sin(((2 * k + 1) * Math.PI) / (2 * order)),
  );
  return { elements, load: 1, cutoffDb: 10 * Math.log10(2) };
}

function chebyshev(order: number, rippleDb: number): Prototype {
  // The book prints 17.37; it is 40 / ln 10.
  const beta = Math.log(1 / Math.tanh((rippleDb * Math.LN10) / 40));
  const gamma = Math.sinh(beta / (2 * order));
  const a = (k: number) => Math.sin(((2 * k - 1) * Math.PI) / (2 * order));
  const b = (k: number) => gamma ** 2 + Math.sin((k * Math.PI) / order) ** 2;
  const elements = [(2 * a(1)) / gamma];
  for (let k = 2; k <= order; k++) elements.push((4 * a(k - 1) * a(k)) / (b(k - 1) * (elements[k - 2] ?? 1)));
  const load = order % 2 === 1 ? 1 : 1 / Math.tanh(beta / 4) ** 2;
  return { elements, load, cutoffDb: rippleDb };
}
