import { requireOneOf } from '../domain';
import { hertz, ohms } from '../units';
import { named } from './ladder';
import type { Ladder } from './ladder';
import { prototypeOf } from './prototype';
import type { PrototypeInput } from './prototype';

/** Whether the first element from the source lies in the line or goes to ground. */
export type FirstElement = 'series' | 'shunt';

/** A low-pass or high-pass to be designed. */
export interface LadderInput extends PrototypeInput {
  /** Butterworth: half power. Chebyshev: edge of the ripple. */
  cutoffHertz: number;
  sourceOhms: number;
  first: FirstElement;
}

/**
 * Exact elements of a low-pass ladder.
 *
 * An even-order Chebyshev needs a load that differs from its source: `loadOhms` says which.
 *
 * @returns coils in series, capacitors to ground.
 * @throws OutOfDomainError naming the input.
 * @example lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }).elements.map(({ name }) => name) //=> ['L1', 'C2', 'L3']
 * @example lowPassLadder({ family: 'Chebyshev', order: 4, rippleDb: 0.5, cutoffHertz: 15e6, sourceOhms: 50, first: 'series' }).loadOhms //=> 99.202786
 * @see Microwave Filters, Impedance-Matching Networks and Coupling Structures (1964), chapter 4: L = g·R/ωc, C = g/(R·ωc)
 */
export function lowPassLadder(input: LadderInput): Ladder {
  return scaled(input, (place, g, omega, r) => {
    if (place === 'series') return { place, part: 'inductor', value: (g * r) / omega };
    return { place, part: 'capacitor', value: g / (r * omega) };
  });
}

/**
 * Exact elements of a high-pass ladder: the low-pass with ω turned over.
 *
 * @returns capacitors in series, coils to ground; ends as for the low-pass.
 * @throws OutOfDomainError naming the input.
 * @example highPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }).elements.map(({ name }) => name) //=> ['C1', 'L2', 'C3']
 * @see as `lowPassLadder`: C = 1/(g·R·ωc), L = R/(g·ωc)
 */
export function highPassLadder(input: LadderInput): Ladder {
  return scaled(input, (place, g, omega, r) => {
    if (place === 'series') return { place, part: 'capacitor', value: 1 / (g * r * omega) };
    return { place, part: 'inductor', value: r / (g * omega) };
  });
}

type Scale = (
  place: FirstElement,
  g: number,
  omega: number,
  r: number,
) => Omit<Ladder['elements'][number], 'name'>;

function scaled(input: LadderInput, scale: Scale): Ladder {
  const prototype = prototypeOf(input);
  const sourceOhms = ohms(input.sourceOhms, 'sourceOhms');
  const omega = 2 * Math.PI * hertz(input.cutoffHertz, 'cutoffHertz');
  requireOneOf({ input: 'first', label: 'First element' }, ['series', 'shunt'], input.first);
  const placeOf = (index: number): FirstElement =>
    (index % 2 === 0) === (input.first === 'series') ? 'series' : 'shunt';
  const elements = prototype.elements.map((g, index) => scale(placeOf(index), g, omega, sourceOhms));
  // g(n+1) is a resistance behind an element to ground and a conductance behind one in the line.
  const isBehindShunt = placeOf(input.order - 1) === 'shunt';
  const loadOhms = isBehindShunt ? sourceOhms * prototype.load : sourceOhms / prototype.load;
  return { elements: named(elements), sourceOhms, loadOhms };
}
