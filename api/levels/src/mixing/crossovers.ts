import { requireWithin } from '../domain';
import { hertz } from '../units';
import type { WantedProduct } from './conversion';
import { productTable } from './products';

/** A range the wanted product is tuned over. */
export interface CrossoverInput {
  ifHertz: number;
  wanted: WantedProduct;
  /** For a difference: whether the local oscillator is above the intermediate frequency; above where left out. */
  loIsAbove?: boolean;
  bandLowHertz: number;
  bandHighHertz: number;
  maxOrder: number;
}

/** A setting at which another product lands exactly on the wanted one, where no filter can part them. */
export interface Crossover {
  wantedHertz: number;
  loHertz: number;
  loMultiple: number;
  ifMultiple: number;
  order: number;
}

/**
 * Where, over a band, an unwanted product crosses the wanted one.
 *
 * @returns by rising frequency, the lowest order where several meet; empty when the band is free of them.
 * @throws OutOfDomainError naming the input.
 * @example crossovers({ ifHertz: 5.5e6, wanted: 'difference', bandLowHertz: 3.5e6, bandHighHertz: 4e6, maxOrder: 7 }).map(({ loMultiple, ifMultiple }) => [loMultiple, ifMultiple]) //=> [[2, 4]]
 * @see arithmetic: ±(m·LO ± n·IF) = ±(LO ± IF), solved for LO
 */
export function crossovers(input: CrossoverInput): Crossover[] {
  const intermediate = hertz(input.ifHertz, 'ifHertz');
  const low = hertz(input.bandLowHertz, 'bandLowHertz');
  requireWithin(
    { input: 'bandHighHertz', label: 'Top of the band', unit: 'Hz', above: low, atMost: 1e15 },
    input.bandHighHertz,
  );
  const table = productTable(input.maxOrder);
  const found = Array.from(table.lo).flatMap((m, index) =>
    meetings(m, table.if[index] ?? 0, intermediate, input),
  );
  const inBand = found.filter(({ wantedHertz }) => wantedHertz >= low && wantedHertz <= input.bandHighHertz);
  return lowestOrders(inBand.sort((a, b) => a.wantedHertz - b.wantedHertz || a.order - b.order));
}

/** The wanted product is a·LO + b·IF; the other one meets it as it stands or turned about. */
function meetings(m: number, n: number, intermediate: number, input: CrossoverInput): Crossover[] {
  const isTurned = input.wanted === 'difference' && input.loIsAbove === false;
  const [a, b] = input.wanted === 'sum' ? [1, 1] : isTurned ? [-1, 1] : [1, -1];
  return [1, -1].flatMap((turn) => {
    const slope = turn * m - a;
    if (slope === 0) return [];
    const lo = (intermediate * (b - turn * n)) / slope;
    const wantedHertz = a * lo + b * intermediate;
    if (!(lo > 0 && wantedHertz > 0)) return [];
    return [{ wantedHertz, loHertz: lo, loMultiple: m, ifMultiple: Math.abs(n), order: m + Math.abs(n) }];
  });
}

/** Where one pair meets, its multiples often do too; the lowest is the strongest. */
function lowestOrders(sorted: readonly Crossover[]): Crossover[] {
  return sorted.filter((crossover, index) => {
    const before = sorted[index - 1];
    return before === undefined || crossover.wantedHertz - before.wantedHertz > 1e-9 * crossover.wantedHertz;
  });
}
