import { requireSome } from '../domain';
import { returnLossOrNone } from '../matching/return-loss';
import { ohms } from '../units';
import type { PadResistor } from './pad-values';
import { pointVoltages } from './resistor-network';

/** What a pad stands between. */
export interface PadEnds {
  sourceOhms: number;
  loadOhms: number;
}

/** How one end of a pad, with the other end terminated, meets what it is connected to. */
export interface PadPort {
  /** Resistance seen into it. */
  ohms: number;
  vswr: number;
  /** Absent for a perfect match. */
  returnLossDb?: number;
}

/** What a pad really does. */
export interface PadPerformance {
  /** Power available from the source over power in the load. */
  lossDb: number;
  input: PadPort;
  output: PadPort;
  /** Watts in each resistor for each watt available from the source, in the order given. */
  dissipationShares: number[];
}

/**
 * What resistors as given do between a source and a load, by nodal analysis.
 *
 * @param resistors - two to four, as from `padValues`, of any value above 0.
 * @throws OutOfDomainError when there are none or a resistance is not positive.
 * @example padPerformance([{ name: 'R1', from: 'in', to: 'ground', ohms: 300 }, { name: 'R2', from: 'in', to: 'out', ohms: 18 }, { name: 'R3', from: 'out', to: 'ground', ohms: 300 }], { sourceOhms: 50, loadOhms: 50 }).lossDb //=> 2.994643
 * @see Kirchhoff's laws; transducer loss as in any textbook on two-ports
 */
export function padPerformance(resistors: readonly PadResistor[], ends: PadEnds): PadPerformance {
  requireSome({ input: 'resistors', label: 'Resistors' }, resistors, 4);
  for (const resistor of resistors) ohms(resistor.ohms, resistor.name);
  const source = ohms(ends.sourceOhms, 'sourceOhms');
  const load = ohms(ends.loadOhms, 'loadOhms');
  // A source that has 1 W to give, as a current beside its resistance.
  const volts = pointVoltages(terminated(resistors, source, load), { in: 2 / Math.sqrt(source) });
  return {
    lossDb: -10 * Math.log10(volts.out ** 2 / load),
    input: portOf(seenInto(resistors, 'in', load), source),
    output: portOf(seenInto(resistors, 'out', source), load),
    dissipationShares: resistors.map(({ from, to, ohms: value }) => (volts[from] - volts[to]) ** 2 / value),
  };
}

function terminated(resistors: readonly PadResistor[], source: number, load: number) {
  return [
    ...resistors,
    { from: 'in', to: 'ground', ohms: source } as const,
    { from: 'out', to: 'ground', ohms: load } as const,
  ];
}

/** One ampere in, with the far end terminated. */
function seenInto(resistors: readonly PadResistor[], end: 'in' | 'out', farOhms: number): number {
  const far = { from: end === 'in' ? 'out' : 'in', to: 'ground', ohms: farOhms } as const;
  return pointVoltages([...resistors, far], { [end]: 1 })[end];
}

function portOf(seen: number, reference: number): PadPort {
  const reflection = Math.abs(seen - reference) / (seen + reference);
  const vswr = (1 + reflection) / (1 - reflection);
  return { ohms: seen, vswr, returnLossDb: returnLossOrNone(reflection) };
}
