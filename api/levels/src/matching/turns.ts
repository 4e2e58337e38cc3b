import { requireWhole, requireWithin } from '../domain';

/** Whole turns on a core. */
export interface Turns {
  exactTurns: number;
  /** Of the whole numbers either side, the one with the nearer inductance; at least 1. */
  turns: number;
  /** With those turns. */
  henries: number;
  /** Relative to what was wanted. */
  errorRel: number;
}

const A_L = { input: 'alNanohenry', label: 'A_L', unit: 'nH per turn squared', atLeast: 1e-3, atMost: 1e6 };
const HENRIES = { input: 'henries', label: 'Inductance', unit: 'H', atLeast: 1e-12, atMost: 1e3 };

/**
 * Turns for an inductance on a core.
 *
 * A turn is counted each time the wire passes through the hole of a ring.
 *
 * @param alNanohenry - inductance per turn squared, nH; tables print it so, or per 100 or 1000 turns: see
 *   `alFromMicrohenriesPer100`, `alFromMillihenriesPer1000`.
 * @throws OutOfDomainError naming the input.
 * @example turnsFor(2.6e-6, 4.9).turns //=> 23
 * @see L = A_L·N², the definition of A_L
 */
export function turnsFor(henries: number, alNanohenry: number): Turns {
  const perTurn = requireWithin(A_L, alNanohenry) * 1e-9;
  const exactTurns = Math.sqrt(requireWithin(HENRIES, henries) / perTurn);
  const below = Math.max(Math.floor(exactTurns), 1);
  const isBelow = Math.abs(perTurn * below ** 2 - henries) <= Math.abs(perTurn * (below + 1) ** 2 - henries);
  const turns = isBelow ? below : below + 1;
  const made = perTurn * turns ** 2;
  return { exactTurns, turns, henries: made, errorRel: made / henries - 1 };
}

/**
 * Inductance of so many turns on a core.
 *
 * @param turns - a whole number, 1 to 10,000.
 * @returns henry.
 * @throws OutOfDomainError naming the input.
 * @example 1e6 * henriesOfTurns(20, 4) //=> 1.6
 * @see L = A_L·N²
 */
export function henriesOfTurns(turns: number, alNanohenry: number): number {
  requireWhole({ input: 'turns', label: 'Turns', atLeast: 1, atMost: 1e4 }, turns);
  return requireWithin(A_L, alNanohenry) * 1e-9 * turns ** 2;
}

/**
 * A_L in nH per turn squared from µH per 100 turns, as tables of iron-powder cores print it.
 *
 * @throws OutOfDomainError when not above 0.
 * @example alFromMicrohenriesPer100(49) //=> 4.9
 * @see 1 µH per 100 turns is 0.1 nH per turn squared
 */
export function alFromMicrohenriesPer100(microhenries: number): number {
  const unit = 'µH per 100 turns';
  return (
    requireWithin({ ...A_L, input: 'microhenries', unit, atLeast: 1e-2, atMost: 1e7 }, microhenries) / 10
  );
}

/**
 * A_L in nH per turn squared from mH per 1000 turns, as tables of ferrite cores print it.
 *
 * @throws OutOfDomainError when not above 0.
 * @example alFromMillihenriesPer1000(885) //=> 885
 * @see 1 mH per 1000 turns is 1 nH per turn squared
 */
export function alFromMillihenriesPer1000(millihenries: number): number {
  return requireWithin({ ...A_L, input: 'millihenries', unit: 'mH per 1000 turns' }, millihenries);
}

/**
 * A_L of a core from a measured winding.
 *
 * @returns nH per turn squared.
 * @throws OutOfDomainError naming the input.
 * @example alFromWinding(10, 0.57e-6) //=> 5.7
 * @see A_L = L / N²
 */
export function alFromWinding(turns: number, henries: number): number {
  requireWhole({ input: 'turns', label: 'Turns', atLeast: 1, atMost: 1e4 }, turns);
  return (requireWithin(HENRIES, henries) * 1e9) / turns ** 2;
}
