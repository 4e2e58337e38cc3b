import { noiseDbm, type JudgedProduct } from '@ferrite-row/levels';
import { fixed, plusMinus } from '../../../lib/text';
import { FLOOR_DBM } from './scale';
import type { ProductRow } from './rows';
import type { Mixing } from './work-out';

export const megahertz = (hertz: number): string => fixed(hertz / 1e6, 3);

/** Without needless noughts: '3 dB', '2.6 dB'. */
export const decibels = (db: number): string => `${Number(db.toFixed(1))} dB`;

const MOST_BELOW_DB = 100;

/** '−82.5', and 'under −120' where nothing is to be measured any more. */
export const afterFilter = ({ filteredDbm }: JudgedProduct): string =>
  filteredDbm < FLOOR_DBM ? `under ${fixed(FLOOR_DBM, 0)}` : fixed(filteredDbm);

/** '± 4', '± 4.1', '± 11': two digits are all that an uncertainty has. */
export const spread = (db: number): string =>
  plusMinus(db, db < 9.95 && Math.abs(db - Math.round(db)) > 0.05 ? 1 : 0);

/** '63.5 ± 4', 'over 100'; nothing for the wanted product itself. */
export function belowWanted({ isWanted, belowWantedDb, plusMinusDb }: JudgedProduct): [string, string] {
  if (isWanted) return ['', ''];
  if (belowWantedDb > MOST_BELOW_DB) return [`over ${MOST_BELOW_DB}`, ''];
  return [fixed(belowWantedDb), spread(plusMinusDb)];
}

/** Rounded to the side that promises less. */
const atLeast = (value: number, decimals = 1): string =>
  fixed(Math.floor(value * 10 ** decimals) / 10 ** decimals, decimals);

/** Bandwidth of single sideband, in which noise is counted (common practice). */
const VOICE_HERTZ = 2400;

/** More in hand than this, and the figure tells less than the reason. */
const PLENTY_DB = 20;

/** What stands beside the verdict: what to do, or why it is good. */
export function wordsOf(product: JudgedProduct, mixing: Mixing): string {
  const { verdict, isWanted, place } = product;
  if (isWanted) return wantedWords(mixing);
  if (verdict === 'too close to call') return 'Measure it after the filter';
  if (verdict === 'not yet') {
    const short = `${fixed(mixing.values.goalDb - product.belowWantedDb)} dB short`;
    return place === 'in the band' ? `${short}, no filter takes it` : short;
  }
  return passWords(product, mixing);
}

function wantedWords({ wanted, conversion, band }: Mixing): string {
  const sideband = `Sideband ${conversion.sideband}`;
  if (wanted.verdict === 'pass') return sideband;
  const side = wanted.place === 'below the band' ? 'under' : 'over';
  return `${fixed(wanted.fromBandHertz / 1e6, 3)} MHz ${side} the ${band.band} band`;
}

function passWords(product: JudgedProduct, { nearestBelow, nearestAbove, values, wanted }: Mixing): string {
  const away = fixed(product.fromBandHertz / 1e6, 1);
  if (product === nearestBelow) return `${away} MHz under the band`;
  if (product === nearestAbove) return `${away} MHz over the band`;
  if (product.inHandDb < PLENTY_DB) return `${atLeast(product.inHandDb)} dB in hand`;
  if (product.filteredDbm < noiseDbm(VOICE_HERTZ)) return 'Under the noise';
  if (wanted.levelDbm - product.levelDbm < values.goalDb) return 'The filter takes it';
  return `${atLeast(product.inHandDb, 0)} dB in hand`;
}

/** 'LO plus IF', as it is said. */
const spokenName = (name: string): string =>
  name.replaceAll('·', ' ').replaceAll('+', 'plus').replaceAll('−', 'minus');

const spokenPlusMinus = (text: string): string => text.replace('±', 'plus or minus');

/** "LO plus IF, 31.934 megahertz, order 2. Leaves the mixer at −16.5, after the filter −82.5 dBm, 63.5 ± 4 below. Too close to call." */
export function spokenProduct({ product, note }: ProductRow, verdictWords: string): string {
  const [below, pm] = belowWanted(product);
  const named = `${spokenName(product.name)}${product.isWanted ? ', wanted' : ''}`;
  return [
    `${named}, ${megahertz(product.hertz)} megahertz, order ${product.order}${note.startsWith('in the') ? `, ${note}` : ''}.`,
    `Leaves the mixer at ${fixed(product.levelDbm)}, after the filter ${afterFilter(product)} dBm${
      below && `, ${[below, spokenPlusMinus(pm)].filter(Boolean).join(' ')} below`
    }.`,
    `${verdictWords}.`,
  ].join(' ');
}

/** "49 more to order 7, none above −91 dBm after the filter." */
export function restWords(rest: readonly ProductRow[], { values }: Mixing): string {
  if (rest.length === 0) return `All products to order ${values.maxOrder}.`;
  const highest = Math.max(...rest.map(({ product }) => product.filteredDbm));
  const none = highest < FLOOR_DBM ? FLOOR_DBM : Math.ceil(highest);
  return `${rest.length} more to order ${values.maxOrder}, none above ${fixed(none, 0)} dBm after the filter.`;
}

/** The picture in a sentence. */
export function chartSummary({ wanted, others, maxHertz, values }: Mixing): string {
  const short = others.filter(({ verdict }) => verdict === 'not yet').length;
  const close = others.filter(({ verdict }) => verdict === 'too close to call').length;
  return [
    `Products to order ${values.maxOrder} from 0 to ${fixed(maxHertz / 1e6, 0)} megahertz.`,
    `${spokenName(wanted.name)} at ${megahertz(wanted.hertz)} megahertz is wanted.`,
    `Of ${others.length} others ${short} are not yet ${decibels(values.goalDb)} below it, ${close} too close to call.`,
  ].join(' ');
}
