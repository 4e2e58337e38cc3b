import { clubCurrency } from './club-currency';
import { MINUS } from './text';

const SYMBOLS: Record<string, string> = { GBP: '£', EUR: '€', USD: '$' };

const known = new Map<string, number>();

/** How many decimals a currency is written with: 2 for GBP, 0 for JPY, 3 for KWD. */
export function minorDigits(currency = clubCurrency()): number {
  const before = known.get(currency);
  if (before !== undefined) return before;
  const format = new Intl.NumberFormat('en', { style: 'currency', currency });
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2;
  known.set(currency, digits);
  return digits;
}

function grouped(amountMinor: number, currency: string): string {
  const digits = minorDigits(currency);
  const text = String(Math.abs(amountMinor)).padStart(digits + 1, '0');
  const whole = text.slice(0, text.length - digits).replace(/\B(?=(\d{3})+$)/g, ',');
  return digits === 0 ? whole : `${whole}.${text.slice(-digits)}`;
}

const sign = (amountMinor: number): string => (amountMinor < 0 ? MINUS : '');

/** An amount without its currency, for columns: '3,291.35', '−24.00'. */
export const formatAmount = (amountMinor: number, currency = clubCurrency()): string =>
  sign(amountMinor) + grouped(amountMinor, currency);

/** '£24.00'; negatives with a true minus, '−£24.00'. A currency without a sign here is named: '24.00 SEK'. */
export function formatMoney(amountMinor: number, currency = clubCurrency()): string {
  const symbol = SYMBOLS[currency];
  return symbol
    ? `${sign(amountMinor)}${symbol}${grouped(amountMinor, currency)}`
    : `${formatAmount(amountMinor, currency)} ${currency}`;
}

/** An amount to show beside a field: '24.00', '24' where the currency has no smaller unit. */
export const exampleAmount = (currency = clubCurrency()): string =>
  formatAmount(24 * 10 ** minorDigits(currency), currency);

/**
 * Minor units of a typed amount; the currency sign, spaces and thousands commas may be typed.
 * @returns undefined when it is not an amount of that currency.
 * @example readMoney('£1,234.5') //=> 123450
 */
export function readMoney(text: string, currency = clubCurrency()): number | undefined {
  const digits = minorDigits(currency);
  const plain = text.replace(/[£€$\s]/g, '').replace(/^[−-]/, '-');
  const parts = /^(-?)(\d+|\d{1,3}(?:,\d{3})+)(?:\.(\d+))?$/.exec(plain);
  const [, minus = '', whole = '', decimals = ''] = parts ?? [];
  if (!parts || decimals.length > digits) return undefined;
  const minor = Number(whole.replaceAll(',', '') + decimals.padEnd(digits, '0'));
  return minus ? 0 - minor : minor;
}
