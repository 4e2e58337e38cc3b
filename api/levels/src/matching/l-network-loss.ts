import { requireWithin } from '../domain';
import type { LadderElement } from '../filters/ladder';
import type { PartQ } from '../filters/response';
import { hertz, ohms } from '../units';
import { requireImpedance } from './match';
import type { LNetwork, LNetworkInput } from './l-network';

/** What a network of real parts takes. */
export interface LNetworkLoss {
  /** Turned to heat in its parts, dB. */
  partsDb: number;
  /** That, and what the parts' resistance leaves unmatched, dB. */
  lossDb: number;
}

interface Complex {
  re: number;
  im: number;
}

const inverse = ({ re, im }: Complex): Complex => {
  const size = re * re + im * im;
  return { re: re / size, im: -im / size };
};

/**
 * Loss of an L-network at its frequency from the Q of its coils and capacitors.
 *
 * For a high Q of the network and a low one of its parts it is about Q over the parts' Q, as a part of the power.
 *
 * @param network - one of `lNetworks(input)`, or the same with the nearest parts.
 * @param q - of the parts; what is left out is without loss.
 * @throws OutOfDomainError naming the input.
 * @example lNetworkLoss(lNetworks({ sourceOhms: 50, load: { resistanceOhms: 12.5, reactanceOhms: 0 }, frequencyHertz: 7e6 })[0], { sourceOhms: 50, load: { resistanceOhms: 12.5, reactanceOhms: 0 }, frequencyHertz: 7e6 }, { inductorQ: 100 }).lossDb //=> 0.074898
 * @see power divides as the resistances in series and the conductances side by side; textbook
 */
export function lNetworkLoss(
  { elements }: Pick<LNetwork, 'elements'>,
  input: LNetworkInput,
  { inductorQ, capacitorQ }: PartQ,
): LNetworkLoss {
  const source = ohms(input.sourceOhms, 'sourceOhms');
  const omega = 2 * Math.PI * hertz(input.frequencyHertz, 'frequencyHertz');
  const { resistanceOhms, reactanceOhms } = requireImpedance(input.load);
  requireWithin(
    { input: 'resistanceOhms', label: 'Resistance of the load', unit: 'ohm', above: 0 },
    resistanceOhms,
  );
  const loss = { inductor: partLoss('inductorQ', inductorQ), capacitor: partLoss('capacitorQ', capacitorQ) };
  let impedance: Complex = { re: resistanceOhms, im: reactanceOhms };
  let kept = 1;
  for (const element of [...elements].reverse()) {
    const own = ownOf(element, omega, loss[element.part]);
    const isSeries = element.place === 'series';
    const before = isSeries ? impedance : inverse(impedance);
    const added = isSeries ? own : inverse(own);
    const whole = { re: before.re + added.re, im: before.im + added.im };
    kept *= before.re / whole.re;
    impedance = isSeries ? whole : inverse(whole);
  }
  const partsDb = -10 * Math.log10(kept);
  const goesIn = (4 * source * impedance.re) / ((source + impedance.re) ** 2 + impedance.im ** 2);
  return { partsDb, lossDb: partsDb - 10 * Math.log10(goesIn) };
}

/** A coil's loss lies in series with it, a capacitor's beside it, as in `ladderResponse`. */
function ownOf({ part, value }: LadderElement, omega: number, loss: number): Complex {
  const size = omega * value;
  return part === 'inductor' ? { re: size * loss, im: size } : inverse({ re: size * loss, im: size });
}

function partLoss(input: string, q: number | undefined): number {
  if (q === undefined) return 0;
  return 1 / requireWithin({ input, label: 'Q', atLeast: 0.1, atMost: 1e9 }, q);
}
