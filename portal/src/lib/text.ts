import { SMALL_NUMBERS } from './number-words';

/** The true minus, as wide as the plus. */
export const MINUS = '−';

const MOST_IN_WORDS = 12;

/** A count in words up to twelve, then in figures: 'two', '13'; nought is 'no'. */
export function countWord(count: number): string {
  if (count === 0) return 'no';
  return (count <= MOST_IN_WORDS && SMALL_NUMBERS[count]) || String(count);
}

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/**
 * A counted noun.
 * @example counted(2, 'booking') //=> 'two bookings'; counted(1, 'entry', 'entries') //=> 'one entry'
 */
export const counted = (count: number, one: string, many = `${one}s`): string =>
  `${countWord(count)} ${count === 1 ? one : many}`;

/** 'Hollis', 'Hollis and Greta', 'Hollis, Greta and Oona'. */
export function listText(items: readonly string[]): string {
  if (items.length < 2) return items.join('');
  return `${items.slice(0, -1).join(', ')} and ${items[items.length - 1]}`;
}

/** A number with so many decimals and a true minus: '−19.4'. Nothing that rounds to zero keeps a sign. */
export function fixed(value: number, decimals = 1): string {
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? MINUS + text : text;
}

/** The same with its plus shown, as levels and gains are written: '+0.37', '−6.0', '0.0'. */
export function signed(value: number, decimals = 1): string {
  const text = fixed(value, decimals);
  return value > 0 && Number(text) !== 0 ? `+${text}` : text;
}

/** '± 0.47'. */
export const plusMinus = (value: number, decimals = 1): string => `± ${Math.abs(value).toFixed(decimals)}`;

/** Initials for a person's mark: 'Tamsin Ardley' gives 'TA'. */
export function initials(name: string): string {
  const words = name.trim().split(/\s+/);
  const last = words.length > 1 ? words[words.length - 1] : '';
  return (words[0].charAt(0) + last.charAt(0)).toUpperCase();
}

/** The level that harms an input: '+20 dBm', '+12.6 dBm'; never rounded up. Empty where none is known. */
export function damageWords(dBm: number | null): string {
  if (dBm === null) return '';
  const tenths = Math.floor(Number((dBm * 10).toPrecision(12)));
  return `${tenths > 0 ? '+' : ''}${fixed(tenths / 10, tenths % 10 === 0 ? 0 : 1)} dBm`;
}
