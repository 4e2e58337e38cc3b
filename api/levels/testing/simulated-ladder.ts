import type { Ladder, LadderElement } from '../src';
import { simulate } from './ngspice';

/** What a simulation finds at one frequency. */
export interface SimulatedPoint {
  hertz: number;
  gainDb: number;
  returnLossDb: number;
}

/**
 * A ladder in ngspice, with each coil's loss as a resistor in series and each capacitor's as one beside it, set anew for
 * every frequency so that Q stays the same.
 */
export function simulatedLadder(
  { elements, sourceOhms, loadOhms }: Ladder,
  hertz: readonly number[],
  q: Q = {},
): SimulatedPoint[] {
  const lines = [`V1 emf 0 dc 0 ac 1`, `RS emf n0 ${sourceOhms}`];
  let node = 0;
  for (const [index, element] of elements.entries()) {
    const from = `n${node}`;
    const to = element.place === 'shunt' ? '0' : `n${++node}`;
    lines.push(...partLines(element, index, from, to, qOf(element, q) !== undefined));
    // A node between capacitors has no way to ground for direct current.
    if (to !== '0') lines.push(`RG${index} ${to} 0 1e14`);
  }
  lines.push(`RL n${node} 0 ${loadOhms}`);
  const scale = (4 * sourceOhms) / loadOhms;
  const commands = hertz.flatMap((frequency, point) => [
    ...elements.flatMap((element, index) => lossLines(element, index, frequency, qOf(element, q))),
    `ac lin 1 ${frequency} ${frequency}`,
    `let re${point} = vr(n0)`,
    `let im${point} = vi(n0)`,
    `let out${point} = vm(n${node})`,
    `print re${point} im${point} out${point}`,
  ]);
  const found = simulate(lines, ['set numdgt=12', ...commands]);
  return hertz.map((frequency, point) => {
    const { [`re${point}`]: re = NaN, [`im${point}`]: im = NaN, [`out${point}`]: out = NaN } = found;
    return {
      hertz: frequency,
      gainDb: 10 * Math.log10(scale * out ** 2),
      returnLossDb: -20 * Math.log10(Math.hypot(2 * re - 1, 2 * im)),
    };
  });
}

interface Q {
  inductorQ?: number;
  capacitorQ?: number;
}

function qOf({ part }: LadderElement, { inductorQ, capacitorQ }: Q): number | undefined {
  return part === 'inductor' ? inductorQ : capacitorQ;
}

/** A part without loss has no resistor: the simulator makes 1 milliohm of any that is smaller. */
function partLines(
  element: LadderElement,
  index: number,
  from: string,
  to: string,
  isLossy: boolean,
): string[] {
  const { part, value } = element;
  const inner = isLossy && part === 'inductor' ? `q${index}` : to;
  const itself = `${part === 'capacitor' ? 'C' : 'L'}${index} ${from} ${inner} ${value}`;
  if (!isLossy) return [itself];
  return [itself, `RQ${index} ${part === 'capacitor' ? from : inner} ${to} 1`];
}

function lossLines(
  { part, value }: LadderElement,
  index: number,
  hertz: number,
  q: number | undefined,
): string[] {
  if (q === undefined) return [];
  const x = 2 * Math.PI * hertz * value;
  return [`alter rq${index} = ${part === 'inductor' ? x / q : q / x}`];
}
