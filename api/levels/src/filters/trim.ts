import { OutOfDomainError } from '../errors';
import { hertz } from '../units';
import type { Ladder } from './ladder';
import { packedLadder } from './response';
import type { PackedLadder } from './response';

const SERIES_COIL = 0;
const SERIES_CAPACITOR = 1;
const SHUNT_COIL = 2;
const SHUNT_CAPACITOR = 3;

/** A resonator to ground: where its coil, its capacitor and the capacitors that couple it lie in a packed ladder. */
export interface Resonator {
  coil: number;
  capacitor: number;
  couplings: readonly number[];
}

/** Smallest a trimmer can be set to, F: nothing of it is left. */
const LEAST_FARADS = 1e-15;

/**
 * Resonators of a ladder whose every branch in series is a capacitor.
 *
 * @throws OutOfDomainError when it has none.
 */
export function resonatorsOf({ kinds }: Pick<PackedLadder, 'kinds'>): Resonator[] {
  const found: Resonator[] = [];
  for (const [index, kind] of kinds.entries()) {
    const pair = kinds[index + 1] ?? SERIES_COIL;
    const isPair = Math.min(kind, pair) === SHUNT_COIL && Math.max(kind, pair) === SHUNT_CAPACITOR;
    if (!isPair) continue;
    const coil = kind === SHUNT_COIL ? index : index + 1;
    const couplings = [index - 1, index + 2].filter((place) => kinds[place] === SERIES_CAPACITOR);
    found.push({ coil, capacitor: 2 * index + 1 - coil, couplings });
  }
  if (found.length > 0) return found;
  const permitted = 'a coil and a capacitor to ground side by side';
  throw new OutOfDomainError('ladder', kinds.length, permitted, `To be trimmed it needs ${permitted}.`);
}

/**
 * Turns each resonator's capacitor until its node resonates, its couplings counted: at an end through the resistance.
 * Where coil and couplings would need less than nothing of it, it stays at its least.
 *
 * @returns whether every resonator came to the centre.
 */
export function trim(
  { sourceOhms, loadOhms }: Pick<PackedLadder, 'sourceOhms' | 'loadOhms'>,
  resonators: readonly Resonator[],
  values: Float64Array,
  omega: number,
): boolean {
  let isReached = true;
  const seen = (place: number): number => {
    const farads = values[place] ?? 0;
    const end = place === 0 ? loadOhms : place === values.length - 1 ? sourceOhms : 0;
    return farads / (1 + (omega * farads * end) ** 2);
  };
  for (const { coil, capacitor, couplings } of resonators) {
    const resonant = 1 / (omega * omega * (values[coil] ?? 0));
    const taken = couplings.reduce((sum, place) => sum + seen(place), 0);
    values[capacitor] = Math.max(resonant - taken, LEAST_FARADS);
    isReached &&= resonant - taken >= LEAST_FARADS;
  }
  return isReached;
}

/**
 * A band-pass of parallel resonators with each of them trimmed to the centre, as a builder does with a screwdriver.
 *
 * @param centreHertz - to which every resonator is set while its neighbours count as what they take from it.
 * @throws OutOfDomainError naming the input; a ladder without a resonator to ground too, or one whose coils and couplings
 * resonate below the centre with nothing of the trimmer left.
 * @example trimmedLadder({ elements: [{ name: 'C1', place: 'shunt', part: 'capacitor', value: 90e-12 }, { name: 'L2', place: 'shunt', part: 'inductor', value: 1e-6 }], sourceOhms: 50, loadOhms: 50 }, 15915494.30919).elements[0].value * 1e12 //=> 100
 * @see as `coupledResonatorBandPass`, whose own parts it leaves as they are
 */
export function trimmedLadder(ladder: Ladder, centreHertz: number): Ladder {
  const packed = packedLadder(ladder, {});
  const omega = 2 * Math.PI * hertz(centreHertz, 'centreHertz');
  if (!trim(packed, resonatorsOf(packed), packed.values, omega)) {
    const permitted = 'coils and couplings that resonate above the centre';
    const message = `No trimmer brings these resonators to the centre: needed are ${permitted}. Take less inductance.`;
    throw new OutOfDomainError('ladder', centreHertz, permitted, message);
  }
  const values = [...packed.values].reverse();
  const elements = ladder.elements.map((element, index) => ({
    ...element,
    value: values[index] ?? element.value,
  }));
  return { ...ladder, elements };
}
