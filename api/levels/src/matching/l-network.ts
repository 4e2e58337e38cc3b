import { requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import type { LadderElement } from '../filters/ladder';
import { hertz, ohms } from '../units';
import { requireImpedance } from './match';
import type { Impedance } from './match';

/** What is to be matched. */
export interface LNetworkInput {
  sourceOhms: number;
  load: Impedance;
  frequencyHertz: number;
}

/** Two elements that match a load to a source at one frequency. */
export interface LNetwork {
  /** From the source to the load: elements of a ladder. */
  elements: LadderElement[];
  /** What it does far from its frequency, where its elements are of two kinds. */
  passes: 'low' | 'high' | 'neither';
  /** Reactance in series over resistance beside it: the higher, the narrower. */
  q: number;
}

/** Nearer than this, as part of the source, nothing is to be matched. */
const MATCHED_REL = 1e-9;

/**
 * Every L-network that matches a load to a source, with loss-free parts.
 *
 * A resistive load has two: one low-pass, one high-pass. With reactance in it there are up to four, the element to
 * ground at either end.
 *
 * @returns at least two, the lowest Q first.
 * @throws OutOfDomainError naming the input: a load without resistance, one that is matched already, or one that needs
 *   only a single element because its resistance (or conductance) is the source's.
 * @example lNetworks({ sourceOhms: 50, load: { resistanceOhms: 12.5, reactanceOhms: 0 }, frequencyHertz: 7e6 }).map(({ passes, q }) => [passes, q]) //=> [['low', 1.732051], ['high', 1.732051]]
 * @see textbook: Q = √(Rhigh/Rlow − 1); solved here for any reactance of the load
 */
export function lNetworks(input: LNetworkInput): LNetwork[] {
  const source = ohms(input.sourceOhms, 'sourceOhms');
  const omega = 2 * Math.PI * hertz(input.frequencyHertz, 'frequencyHertz');
  const { resistanceOhms: r, reactanceOhms: x } = requireImpedance(input.load);
  requireWithin({ input: 'resistanceOhms', label: 'Resistance of the load', unit: 'ohm', above: 0 }, r);
  const networks = [...groundAtSource(source, r, x, omega), ...groundAtLoad(source, r, x, omega)];
  if (networks.length === 0) throw oneElement(r);
  return networks.sort((a, b) => a.q - b.q);
}

function oneElement(resistance: number): OutOfDomainError {
  const permitted = 'another resistance than the source has';
  const message = `Resistance of the load: it must be ${permitted}; as it is, at most one element in series is wanted.`;
  return new OutOfDomainError('resistanceOhms', resistance, permitted, message);
}

/** In series with the load until its conductance is the source's, then to ground: for a load lower than the source. */
function groundAtSource(source: number, r: number, x: number, omega: number): LNetwork[] {
  if (!(r < source * (1 - MATCHED_REL))) return [];
  const whole = Math.sqrt(r * (source - r));
  return [whole, -whole].map((total) => {
    const series = total - x;
    const shunt = total / (r * r + total * total);
    return network([shuntElement(shunt, omega), seriesElement(series, omega)], Math.abs(total) / r);
  });
}

/** To ground across the load until its resistance is the source's, then in series. */
function groundAtLoad(source: number, r: number, x: number, omega: number): LNetwork[] {
  const size = r * r + x * x;
  const [conductance, susceptance] = [r / size, -x / size];
  if (!(conductance * source < 1 - MATCHED_REL)) return [];
  const whole = Math.sqrt(conductance / source - conductance ** 2);
  return [whole, -whole].map((total) => {
    const shunt = total - susceptance;
    const series = total / (conductance ** 2 + total ** 2);
    return network([seriesElement(series, omega), shuntElement(shunt, omega)], Math.abs(total) / conductance);
  });
}

/** An element too small to matter is left out: its place is a wire, or nothing. */
function network(elements: readonly (Omit<LadderElement, 'name'> | undefined)[], q: number): LNetwork {
  const present = elements.filter((element) => element !== undefined);
  const named = present.map((element, index) => {
    return { name: `${element.part === 'inductor' ? 'L' : 'C'}${index + 1}`, ...element };
  });
  return { elements: named, passes: passesOf(named), q };
}

function passesOf(elements: readonly LadderElement[]): LNetwork['passes'] {
  const goesLow = ({ place, part }: LadderElement) => (place === 'series') === (part === 'inductor');
  if (elements.every(goesLow)) return 'low';
  return elements.some(goesLow) ? 'neither' : 'high';
}

const NOTHING = 1e-12;

function seriesElement(reactance: number, omega: number): Omit<LadderElement, 'name'> | undefined {
  if (Math.abs(reactance) < NOTHING) return undefined;
  if (reactance > 0) return { place: 'series', part: 'inductor', value: reactance / omega };
  return { place: 'series', part: 'capacitor', value: -1 / (omega * reactance) };
}

function shuntElement(susceptance: number, omega: number): Omit<LadderElement, 'name'> | undefined {
  if (Math.abs(susceptance) < NOTHING) return undefined;
  if (susceptance > 0) return { place: 'shunt', part: 'capacitor', value: susceptance / omega };
  return { place: 'shunt', part: 'inductor', value: -1 / (omega * susceptance) };
}
