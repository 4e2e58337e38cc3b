import { requireSome, requireWithin } from '../domain';
import { hertz } from '../units';
import type { WantedProduct } from './conversion';
import { productTable } from './products';
import type { ProductTable } from './products';

/** A local oscillator tuned over many settings. */
export interface ScanInput {
  /** One setting each, Hz, above 0; up to 1,000,000. */
  loHertz: Float64Array;
  ifHertz: number;
  wanted: WantedProduct;
  maxOrder: number;
  /** Band the filter after the mixer passes. */
  bandLowHertz: number;
  bandHighHertz: number;
}

/** What each setting meets; arrays as long as the settings. */
export interface Scan {
  table: ProductTable;
  /** Where the wanted product lies, Hz. */
  wantedHertz: Float64Array;
  /** How many other products fall into the band. */
  inBand: Uint16Array;
  /** Index into `table` of the lowest-order other product in the band; −1 where there is none. */
  lowestOrder: Int16Array;
}

/**
 * Which products fall into a filter's band over the tuning of the local oscillator.
 *
 * Made for ten thousand settings while a member types: one pass over typed arrays, nothing allocated inside.
 *
 * @throws OutOfDomainError naming the input.
 * @example Array.from(scanProducts({ loHertz: Float64Array.of(9.1e6, 9.2e6), ifHertz: 5.5e6, wanted: 'difference', maxOrder: 7, bandLowHertz: 3.5e6, bandHighHertz: 4e6 }).inBand) //=> [1, 1]
 * @see `mixingProducts`, of which it is the fast form
 */
export function scanProducts(input: ScanInput): Scan {
  const { loHertz, bandLowHertz, bandHighHertz } = input;
  const intermediate = hertz(input.ifHertz, 'ifHertz');
  requireSettings(loHertz);
  const low = hertz(bandLowHertz, 'bandLowHertz');
  requireWithin(
    { input: 'bandHighHertz', label: 'Top of the band', unit: 'Hz', above: low, atMost: 1e15 },
    bandHighHertz,
  );
  const table = productTable(input.maxOrder);
  const wantedIf = input.wanted === 'sum' ? 1 : -1;
  const scan = {
    table,
    wantedHertz: loHertz.map((lo) => Math.abs(lo + wantedIf * intermediate)),
    inBand: new Uint16Array(loHertz.length),
    lowestOrder: new Int16Array(loHertz.length).fill(-1),
  };
  fill(scan, loHertz, intermediate, wantedIf, low, bandHighHertz);
  return scan;
}

function requireSettings(loHertz: Float64Array): void {
  requireSome({ input: 'loHertz', label: 'Settings of the local oscillator' }, loHertz, 1e6);
  for (const lo of loHertz) hertz(lo, 'loHertz');
}

/** Settings in the outer loop would read the table again for each; this way round one pair stays in registers. */
function fill(
  { table, inBand, lowestOrder }: Scan,
  loHertz: Float64Array,
  intermediate: number,
  wantedIf: number,
  low: number,
  high: number,
): void {
  for (let pair = table.lo.length - 1; pair >= 0; pair--) {
    const m = table.lo[pair] ?? 0;
    const n = table.if[pair] ?? 0;
    if (m === 1 && n === wantedIf) continue;
    const offset = n * intermediate;
    for (let setting = 0; setting < loHertz.length; setting++) {
      const frequency = Math.abs(m * (loHertz[setting] ?? 0) + offset);
      if (frequency >= low && frequency <= high) {
        inBand[setting] = (inBand[setting] ?? 0) + 1;
        lowestOrder[setting] = pair;
      }
    }
  }
}
