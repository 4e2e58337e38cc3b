import { requireWithin } from '../domain';
import { padPerformance } from './pad-performance';
import type { PadEnds } from './pad-performance';
import type { PadResistor } from './pad-values';

/** Limits of a pad whose resistors lie anywhere within their tolerance. */
export interface PadWorstCase {
  leastLossDb: number;
  greatestLossDb: number;
  /** Absent when every corner is a perfect match, which takes a tolerance of 0. */
  leastInputReturnLossDb?: number;
  leastOutputReturnLossDb?: number;
}

/**
 * Worst case of a pad over the tolerance of its resistors.
 *
 * Loss and reflection each move one way with any one resistor (a quotient of two straight lines), so the extremes lie
 * where every resistor stands at one end of its tolerance; all 2ⁿ such corners are worked out.
 *
 * @param toleranceRel - 0.05 for 5 %, 0 to 0.5.
 * @throws OutOfDomainError naming the input.
 * @example padWorstCase(padValues({ kind: 'pi', lossDb: 10, sourceOhms: 50, loadOhms: 50 }), { sourceOhms: 50, loadOhms: 50 }, 0.05).greatestLossDb //=> 10.460337
 * @see Kirchhoff's laws
 */
export function padWorstCase(
  resistors: readonly PadResistor[],
  ends: PadEnds,
  toleranceRel: number,
): PadWorstCase {
  requireWithin({ input: 'toleranceRel', label: 'Tolerance', atLeast: 0, atMost: 0.5 }, toleranceRel);
  const corners = Array.from({ length: 2 ** resistors.length }, (_value, corner) => {
    const moved = resistors.map((resistor, index) => {
      const sign = (corner >> index) & 1 ? 1 : -1;
      return { ...resistor, ohms: resistor.ohms * (1 + sign * toleranceRel) };
    });
    return padPerformance(moved, ends);
  });
  const losses = corners.map(({ lossDb }) => lossDb);
  return {
    leastLossDb: Math.min(...losses),
    greatestLossDb: Math.max(...losses),
    leastInputReturnLossDb: least(corners.map(({ input }) => input.returnLossDb)),
    leastOutputReturnLossDb: least(corners.map(({ output }) => output.returnLossDb)),
  };
}

function least(figures: readonly (number | undefined)[]): number | undefined {
  const known = figures.filter((figure) => figure !== undefined);
  return known.length === 0 ? undefined : Math.min(...known);
}
