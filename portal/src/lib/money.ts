import { MINUS } from './text';

const SYMBOLS: Record<string, string> = { GBP: '£', EUR: '€', USD: '$' };

const grouped = (amountMinor: number): string => {
  const [pounds, pence] = (Math.abs(amountMinor) / 100).toFixed(2).split('.');
  return `${pounds.replace(/\B(?=(\d{3})+$)/g, ',')}.${pence}`;
};

const sign = (amountMinor: number): string => (amountMinor < 0 ? MINUS : '');

/** An amount without its currency, for columns: '3,291.35', '−24.00'. */
export const formatAmount = (amountMinor: number): string => sign(amountMinor) + grouped(amountMinor);

/** '£24.00'; negatives with a true minus, '−£24.00'. An unknown currency is named: '24.00 SEK'. */
export function formatMoney(amountMinor: number, currency = 'GBP'): string {
  const symbol = SYMBOLS[currency];
  return symbol
    ? `${sign(amountMinor)}${symbol}${grouped(amountMinor)}`
    : `${formatAmount(amountMinor)} ${currency}`;
}

/**
 * Minor units of a typed amount; the currency sign, spaces and thousands commas may be typed.
 * @returns undefined when it is not an amount of money.
 * @example readMoney('£1,234.5') //=> 123450
 */
export function readMoney(text: string): number | undefined {
  const plain = text.replace(/[£€$\s]/g, '').replace(/^[−-]/, '-');
  if (!/^-?(\d+|\d{1,3}(,\d{3})+)(\.\d{1,2})?$/.test(plain)) return undefined;
  const [whole, pence = ''] = plain.replaceAll(',', '').replace('-', '').split('.');
  const minor = Number(whole) * 100 + Number(pence.padEnd(2, '0'));
  return plain.startsWith('-') ? -minor : minor;
}
