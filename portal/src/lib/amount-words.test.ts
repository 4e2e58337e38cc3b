import { describe, expect, it } from 'vitest';
import { amountWords, numberWords } from './amount-words';

describe('numbers in words', () => {
  it.each([
    [0, 'zero'],
    [7, 'seven'],
    [19, 'nineteen'],
    [20, 'twenty'],
    [84, 'eighty-four'],
    [100, 'one hundred'],
    [315, 'three hundred and fifteen'],
    [1001, 'one thousand and one'],
    [1234, 'one thousand, two hundred and thirty-four'],
    [999_999, 'nine hundred and ninety-nine thousand, nine hundred and ninety-nine'],
  ])('writes %i as “%s”', (value, words) => {
    expect(numberWords(value)).toBe(words);
  });

  it.each([-1, 1.5, 1_000_000, Number.NaN])('has no words for %s', (value) => {
    expect(() => numberWords(value)).toThrow(RangeError);
  });
});

describe('an amount on a receipt', () => {
  it.each([
    [8400, 'GBP', 'Eighty-four pounds'],
    [100, 'GBP', 'One pound'],
    [2450, 'GBP', 'Twenty-four pounds 50'],
    [5, 'EUR', 'Zero euros 05'],
    [100_000_000, 'GBP', '1000000.00 GBP'],
    [2400, 'SEK', '24.00 SEK'],
    [2400, 'JPY', '2400 JPY'],
    [2400, 'KWD', '2.400 KWD'],
  ])('writes %i of %s as “%s”', (minor, currency, words) => {
    expect(amountWords(minor, currency)).toBe(words);
  });
});
