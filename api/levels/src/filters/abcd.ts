import { hertz as requireHertz } from '../units';
import { requireLadder } from './ladder';
import type { Ladder, LadderElement } from './ladder';

/** A complex number. */
export interface Complex {
  re: number;
  im: number;
}

/** Chain matrix of a two-port: V1 = A·V2 + B·I2, I1 = C·V2 + D·I2. B in ohms, C in siemens. */
export interface ChainMatrix {
  a: Complex;
  b: Complex;
  c: Complex;
  d: Complex;
}

/**
 * Chain matrix of a ladder of loss-free parts at one frequency, by multiplying those of its elements.
 *
 * The plain way; `ladderResponse` is the fast one.
 *
 * @throws OutOfDomainError naming the input.
 * @example ladderMatrix(lowPassLadder({ family: 'Butterworth', order: 1, cutoffHertz: 1e6, sourceOhms: 50, first: 'series' }), 1e6) //=> { a: { re: 1, im: 0 }, b: { re: 0, im: 100 }, c: { re: 0, im: 0 }, d: { re: 1, im: 0 } }
 * @see Microwave Engineering (textbook), ABCD matrices
 */
export function ladderMatrix(ladder: Ladder, hertz: number): ChainMatrix {
  const omega = 2 * Math.PI * requireHertz(hertz, 'hertz');
  const one = { re: 1, im: 0 };
  const zero = { re: 0, im: 0 };
  return requireLadder(ladder).elements.reduce<ChainMatrix>(
    (before, element) => times(before, elementMatrix(element, omega)),
    { a: one, b: zero, c: zero, d: one },
  );
}

function elementMatrix({ place, part, value }: LadderElement, omega: number): ChainMatrix {
  const one = { re: 1, im: 0 };
  const zero = { re: 0, im: 0 };
  const x = omega * value;
  const impedance = part === 'inductor' ? x : -1 / x;
  if (place === 'series') return { a: one, b: { re: 0, im: impedance }, c: zero, d: one };
  return { a: one, b: zero, c: { re: 0, im: -1 / impedance }, d: one };
}

function times(m: ChainMatrix, n: ChainMatrix): ChainMatrix {
  return {
    a: sum(product(m.a, n.a), product(m.b, n.c)),
    b: sum(product(m.a, n.b), product(m.b, n.d)),
    c: sum(product(m.c, n.a), product(m.d, n.c)),
    d: sum(product(m.c, n.b), product(m.d, n.d)),
  };
}

function product(x: Complex, y: Complex): Complex {
  return { re: x.re * y.re - x.im * y.im, im: x.re * y.im + x.im * y.re };
}

function sum(x: Complex, y: Complex): Complex {
  return { re: x.re + y.re, im: x.im + y.im };
}
