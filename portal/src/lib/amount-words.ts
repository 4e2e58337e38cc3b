import { formatAmount, minorDigits } from './money';
import { SMALL_NUMBERS } from './number-words';
import { capital } from './text';

const TENS = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty', 'seventy', 'eighty', 'ninety'];
const UNITS: Record<string, [one: string, many: string]> = {
  GBP: ['pound', 'pounds'],
  EUR: ['euro', 'euros'],
  USD: ['dollar', 'dollars'],
};

/**
 * A whole number in words, as a receipt or cheque has it.
 * @param value - 0 to 999,999.
 * @throws RangeError outside of it.
 * @example numberWords(1234) //=> 'one thousand, two hundred and thirty-four'
 */
export function numberWords(value: number): string {
  if (!Number.isInteger(value) || value < 0 || value > 999_999)
    throw new RangeError(`${value} has no words here.`);
  if (value < 20) return SMALL_NUMBERS[value] ?? '';
  if (value < 100) return joined(TENS[Math.floor(value / 10)] ?? '', value % 10, '-');
  if (value < 1000) return joined(`${numberWords(Math.floor(value / 100))} hundred`, value % 100, ' and ');
  const rest = value % 1000;
  return joined(`${numberWords(Math.floor(value / 1000))} thousand`, rest, rest < 100 ? ' and ' : ', ');
}

const joined = (words: string, rest: number, by: string): string =>
  rest === 0 ? words : words + by + numberWords(rest);

/**
 * An amount in words for a receipt; what has no words is written in figures.
 * @example amountWords(8400, 'GBP') //=> 'Eighty-four pounds'; amountWords(2450, 'GBP') //=> 'Twenty-four pounds 50'
 */
export function amountWords(amountMinor: number, currency: string): string {
  const unit = UNITS[currency];
  const digits = minorDigits(currency);
  const whole = Math.floor(amountMinor / 10 ** digits);
  const rest = amountMinor % 10 ** digits;
  if (!unit || amountMinor < 0 || whole > 999_999)
    return `${formatAmount(amountMinor, currency).replaceAll(',', '')} ${currency}`;
  const words = capital(`${numberWords(whole)} ${whole === 1 ? unit[0] : unit[1]}`);
  return rest === 0 ? words : `${words} ${String(rest).padStart(digits, '0')}`;
}
