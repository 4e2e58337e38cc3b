import { powerRatioFromDb, voltageRatioFromDb } from '../conversions';
import { requireOneOf, requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { dB, ohms } from '../units';

/** Pads offered. A minimum-loss pad has two resistors and its loss follows from its two resistances. */
export type PadKind = 'pi' | 'tee' | 'bridged tee' | 'minimum loss';

/** Where a resistor stands; 'in', 'mid' and 'out' are the pad's own points, 'ground' the common one. */
export type PadPoint = 'in' | 'mid' | 'out' | 'ground';

/** One resistor of a pad. */
export interface PadResistor {
  name: 'R1' | 'R2' | 'R3' | 'R4';
  from: PadPoint;
  to: PadPoint;
  ohms: number;
}

/** What a pad is to do. */
export interface PadInput {
  kind: PadKind;
  /** Loss between its two resistances, above 0 to 120 dB; left out for a minimum-loss pad. */
  lossDb?: number;
  sourceOhms: number;
  loadOhms: number;
}

const GREATEST_LOSS_DB = 120;
const GREATEST_OHMS = 1e9;

/**
 * Least loss a resistive pad between two resistances can have.
 *
 * @returns dB, 0 for equal resistances.
 * @throws OutOfDomainError when a resistance is not positive.
 * @example minimumLossDb(75, 50) //=> 5.719475
 * @see minimum-loss L pad, 20 log10(√(Zh/Zl) + √(Zh/Zl − 1)); textbook
 */
export function minimumLossDb(sourceOhms: number, loadOhms: number): number {
  const source = ohms(sourceOhms, 'sourceOhms');
  const load = ohms(loadOhms, 'loadOhms');
  const ratio = Math.max(source, load) / Math.min(source, load);
  return dB(20 * Math.log10(Math.sqrt(ratio) + Math.sqrt(ratio - 1)));
}

/**
 * Exact resistors of a pad, matched at both ends.
 *
 * @returns two to four resistors, from the source to the load.
 * @throws OutOfDomainError naming the input: a loss under the least one these two resistances allow, a bridged tee
 *   between different resistances, a minimum-loss pad between equal ones.
 * @example padValues({ kind: 'pi', lossDb: 20, sourceOhms: 50, loadOhms: 50 }).map(({ ohms }) => ohms) //=> [61.111111, 247.5, 61.111111]
 * @example padValues({ kind: 'pi', lossDb: 3, sourceOhms: 75, loadOhms: 50 }) //=> throws OutOfDomainError
 * @see Lessons in Electric Circuits (open textbook), attenuators, for the matched forms; the forms for two resistances
 *   are the classical ones (from memory, checked by nodal analysis and ngspice)
 */
export function padValues(input: PadInput): PadResistor[] {
  const kinds = ['pi', 'tee', 'bridged tee', 'minimum loss'] as const;
  requireOneOf({ input: 'kind', label: 'Kind of pad' }, kinds, input.kind);
  const source = ohms(input.sourceOhms, 'sourceOhms');
  const load = ohms(input.loadOhms, 'loadOhms');
  const resistors = resistorsOf(input, source, load);
  if (resistors.every((resistor) => resistor.ohms > 0 && resistor.ohms <= GREATEST_OHMS)) return resistors;
  // Only rounding at the very edge of the permitted loss leads here.
  throw lossError(input.lossDb, `more than ${minimumLossDb(source, load)} dB`);
}

function resistorsOf(input: PadInput, source: number, load: number): PadResistor[] {
  if (input.kind === 'minimum loss') return minimumLoss(source, load);
  if (input.kind === 'bridged tee') requireBothEqual(source, load);
  const lossDb = requireLoss(input.lossDb, source, load);
  if (input.kind === 'bridged tee') return bridgedTee(lossDb, source);
  return input.kind === 'pi' ? pi(lossDb, source, load) : tee(lossDb, source, load);
}

function requireLoss(lossDb: number | undefined, source: number, load: number): number {
  const least = minimumLossDb(source, load);
  const domain = { input: 'lossDb', label: 'Loss of the pad', unit: 'dB', atMost: GREATEST_LOSS_DB };
  return requireWithin({ ...domain, above: least }, lossDb ?? NaN);
}

function lossError(value: unknown, permitted: string): OutOfDomainError {
  return new OutOfDomainError('lossDb', value, permitted, `Loss of the pad: it must be ${permitted}.`);
}

function pi(lossDb: number, source: number, load: number): PadResistor[] {
  const n = powerRatioFromDb(dB(lossDb));
  const across = (n + 1) / (n - 1);
  const series = ((n - 1) / 2) * Math.sqrt((source * load) / n);
  return [
    { name: 'R1', from: 'in', to: 'ground', ohms: 1 / (across / source - 1 / series) },
    { name: 'R2', from: 'in', to: 'out', ohms: series },
    { name: 'R3', from: 'out', to: 'ground', ohms: 1 / (across / load - 1 / series) },
  ];
}

function tee(lossDb: number, source: number, load: number): PadResistor[] {
  const n = powerRatioFromDb(dB(lossDb));
  const along = (n + 1) / (n - 1);
  const shunt = (2 * Math.sqrt(n * source * load)) / (n - 1);
  return [
    { name: 'R1', from: 'in', to: 'mid', ohms: source * along - shunt },
    { name: 'R2', from: 'mid', to: 'ground', ohms: shunt },
    { name: 'R3', from: 'mid', to: 'out', ohms: load * along - shunt },
  ];
}

function bridgedTee(lossDb: number, source: number): PadResistor[] {
  const k = voltageRatioFromDb(dB(lossDb));
  return [
    { name: 'R1', from: 'in', to: 'mid', ohms: source },
    { name: 'R2', from: 'in', to: 'out', ohms: source * (k - 1) },
    { name: 'R3', from: 'mid', to: 'ground', ohms: source / (k - 1) },
    { name: 'R4', from: 'mid', to: 'out', ohms: source },
  ];
}

/** Nearer than this to 1, the ratio of two resistances needs no pad that any part could make. */
const LEAST_STEP = 1e-6;

/** The series resistor stands on the side of the higher resistance. */
function minimumLoss(source: number, load: number): PadResistor[] {
  const [high, low] = source > load ? [source, load] : [load, source];
  if (high <= low * (1 + LEAST_STEP)) throw equalError(load);
  const series: PadResistor = { name: 'R1', from: 'in', to: 'out', ohms: Math.sqrt(high * (high - low)) };
  const shunt = low * Math.sqrt(high / (high - low));
  if (source > load) return [series, { name: 'R2', from: 'out', to: 'ground', ohms: shunt }];
  return [
    { name: 'R1', from: 'in', to: 'ground', ohms: shunt },
    { ...series, name: 'R2' },
  ];
}

function equalError(load: number): OutOfDomainError {
  const permitted = 'another resistance than the source has';
  const message = `A minimum-loss pad stands between different resistances: the load must be ${permitted}.`;
  return new OutOfDomainError('loadOhms', load, permitted, message);
}

function requireBothEqual(source: number, load: number): void {
  if (Math.abs(source - load) <= 1e-9 * source) return;
  const permitted = `${source} ohm, as the source`;
  const message = `A bridged tee stands between equal resistances: the load must be ${permitted}.`;
  throw new OutOfDomainError('loadOhms', load, permitted, message);
}
