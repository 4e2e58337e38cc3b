import { requireWithin } from './domain';
import { BASE_UNITS, PREFIX_EXPONENT, splitUnit } from './quantity-units';
import type { BaseUnit, Prefix, QuantityUnit } from './quantity-units';

/**
 * A quantity with the prefix that suits it: `1.09 mW`, `100 µW`, `50 ohm`.
 *
 * @param unit - of the value; a unit with a prefix of its own is kept.
 * @param significantDigits - 1 to 15, trailing zeros dropped.
 * @param smallestNumber - the prefix is chosen so that the number is at least this: 0.1 writes 0.66 V, 1 writes 660 mV.
 * @example formatQuantity(0.00109, 'W') //=> '1.09 mW'
 * @example formatQuantity(0.66, 'V', 3, 0.1) //=> '0.66 V'
 * @example formatQuantity(-20, 'dBm') //=> '−20 dBm'
 */
export function formatQuantity(
  value: number,
  unit: QuantityUnit,
  significantDigits = 3,
  smallestNumber = 1,
): string {
  requireWithin({ input: 'value', label: 'Value' }, value);
  requireWithin(
    { input: 'significantDigits', label: 'Significant digits', atLeast: 1, atMost: 15 },
    significantDigits,
  );
  const rounded = Math.abs(value).toPrecision(significantDigits);
  const { prefix, base } = splitUnit(unit);
  const chosen = prefix ?? prefixFor(Number(rounded), base, smallestNumber);
  const exponent = prefix === undefined && chosen !== undefined ? -PREFIX_EXPONENT[chosen] : 0;
  const number = String(shifted(rounded, exponent));
  return `${value < 0 && Number(number) !== 0 ? '−' : ''}${number} ${chosen ?? ''}${base}`.trimEnd();
}

/** Shifts the decimal point in the text, so that 0.00109 becomes 1.09 and not 1.0899999999999999. */
function shifted(digits: string, exponent: number): number {
  const [mantissa = '0', power = '0'] = digits.split('e');
  return Number(`${mantissa}e${Number(power) + exponent}`);
}

function prefixFor(size: number, base: BaseUnit, smallestNumber: number): Prefix | undefined {
  if (size === 0) return undefined;
  const steps = [...BASE_UNITS[base].prefixes.map((prefix) => PREFIX_EXPONENT[prefix]), 0].sort(
    (a, b) => a - b,
  );
  const fitting = steps.filter((step) => shifted(String(size), -step) >= smallestNumber);
  const exponent = fitting.at(-1) ?? steps[0];
  return BASE_UNITS[base].prefixes.find((prefix) => PREFIX_EXPONENT[prefix] === exponent);
}

/**
 * What was understood from a typed text: thousands grouped, prefix only where the number would be long.
 *
 * @example formatUnderstood(4700, 'ohm') //=> '4,700 ohm'
 * @example formatUnderstood(0.02, 'V/div') //=> '20 mV/div'
 */
export function formatUnderstood(value: number, unit: QuantityUnit): string {
  const size = Math.abs(value);
  const { prefix, base } = splitUnit(unit);
  const isLong =
    BASE_UNITS[base].prefixes.length > 0 &&
    base !== 'ohm' &&
    prefix === undefined &&
    (size < 1 || size >= 1e6);
  const isBeyondText = size >= 1e15 || (size > 0 && size < 1e-6);
  if (isLong || isBeyondText) return formatQuantity(value, unit, 12);
  const [whole = '', fraction] = String(Number(size.toPrecision(12))).split('.');
  const grouped = whole.replace(/\B(?=(?:\d{3})+$)/g, ',');
  const sign = value < 0 ? '−' : '';
  return `${sign}${grouped}${fraction === undefined ? '' : `.${fraction}`} ${unit}`.trimEnd();
}
