import type { AmateurBand, JudgedProduct } from '@ferrite-row/levels';
import type { Mixing } from './work-out';

/** A product as it stands in the table. */
export interface ProductRow {
  product: JudgedProduct;
  /** What it is, or why it is listed: "leakage", "nearest below the band", "in the 10 m band". */
  note: string;
}

/** Most products that are named, in the picture and in the table beside it. */
const NAMED_AT_MOST = 8;

/** So many of the least in hand stand in the table in any case; a fourth only when it is no pass. */
const LEAST_IN_HAND = 3;

/**
 * The rows that matter: wanted, then the least in hand, what leaks straight through and the strongest in the band, then
 * the nearest below and above it and the strongest in another amateur band. The rest follow, the least in hand first.
 */
export function rowsOf(mixing: Mixing): { shown: ProductRow[]; rest: ProductRow[] } {
  const { wanted, others, nearestBelow, nearestAbove } = mixing;
  const least = others.filter(
    ({ verdict }, index) => index < LEAST_IN_HAND || (index === LEAST_IN_HAND && verdict !== 'pass'),
  );
  const inBand = strongest(others.filter(({ place }) => place === 'in the band'));
  const harmful = others.filter(
    (product) => least.includes(product) || product.order === 1 || product === inBand,
  );
  const ranked = [wanted, ...harmful, nearestBelow, nearestAbove, strongestElsewhere(mixing)];
  const chosen = [...new Set(ranked.filter((product) => product !== undefined))].slice(0, NAMED_AT_MOST);
  const row = (product: JudgedProduct) => ({ product, note: noteOf(product, mixing) });
  return {
    shown: chosen.map(row),
    rest: others.filter((product) => !chosen.includes(product)).map(row),
  };
}

const bandAt = (bands: readonly AmateurBand[], hertz: number): AmateurBand | undefined =>
  bands.find(({ lowHertz, highHertz }) => hertz >= lowHertz && hertz <= highHertz);

/** The strongest, as far as the picture goes, in a band it does not belong to; the plain leaks are listed anyway. */
function strongestElsewhere({ others, bands, band, maxHertz }: Mixing): JudgedProduct | undefined {
  const elsewhere = others.filter(({ hertz, order }) => {
    const at = bandAt(bands, hertz);
    return order > 1 && hertz <= maxHertz && at !== undefined && at !== band;
  });
  return strongest(elsewhere);
}

const strongest = (products: readonly JudgedProduct[]): JudgedProduct | undefined =>
  [...products].sort((a, b) => b.filteredDbm - a.filteredDbm)[0];

function noteOf(product: JudgedProduct, { nearestBelow, nearestAbove, bands }: Mixing): string {
  const { loMultiple, ifMultiple, isWanted, order, place } = product;
  if (isWanted) return 'wanted';
  if (order === 1) return 'leakage';
  if (loMultiple === 1 && ifMultiple === 1) return product.sign === '+' ? 'sum' : 'difference';
  if (place === 'in the band') return 'in the band';
  if (product === nearestBelow) return 'nearest below the band';
  if (product === nearestAbove) return 'nearest above the band';
  const band = bandAt(bands, product.hertz);
  if (band) return `in the ${band.band} band`;
  return loMultiple === 0 || ifMultiple === 0 ? 'harmonic' : '';
}
