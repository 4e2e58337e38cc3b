import type { ValueTransformer } from 'typeorm';

/**
 * Money as it travels here: a whole number of the currency's minor units that JavaScript holds exactly.
 * @throws RangeError for anything else, so that no sum is ever rounded in silence.
 */
export function asMinor(value: unknown): number {
  const minor = typeof value === 'string' && value.trim() !== '' ? Number(value) : value;
  if (typeof minor === 'number' && Number.isSafeInteger(minor)) return minor;
  throw new RangeError(`${String(value)} is not an amount in minor units.`);
}

/** For `bigint` columns of money, which the driver hands over as text. */
export const minorUnits: ValueTransformer = {
  to: (value: unknown) => (value === null || value === undefined ? value : asMinor(value)),
  from: (value: unknown) => (value === null || value === undefined ? value : asMinor(value)),
};

/** @throws RangeError when the sum can no longer be held exactly. */
export function sumMinor(amounts: Iterable<number>): number {
  let sum = 0;
  for (const amount of amounts) sum = asMinor(sum + asMinor(amount));
  return sum;
}

/**
 * How many decimals the currency is written with: 2 for GBP, 0 for JPY, 3 for KWD.
 * @throws RangeError when the code is not of the form of ISO 4217.
 */
export function minorDigits(currency: string): number {
  const format = new Intl.NumberFormat('en', { style: 'currency', currency });
  return format.resolvedOptions().maximumFractionDigits ?? 2;
}

/** An amount for a sentence: `1,234.50`; the currency is named where the sentence needs it. */
export function writeMinor(amountMinor: number, currency: string): string {
  const digits = minorDigits(currency);
  const text = String(Math.abs(amountMinor)).padStart(digits + 1, '0');
  const whole = text.slice(0, text.length - digits).replaceAll(/\B(?=(\d{3})+$)/g, ',');
  const sign = amountMinor < 0 ? '−' : '';
  return digits === 0 ? sign + whole : `${sign}${whole}.${text.slice(-digits)}`;
}
