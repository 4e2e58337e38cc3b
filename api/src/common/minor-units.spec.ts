import { asMinor, minorDigits, sumMinor, writeMinor } from './minor-units';

describe('money in minor units', () => {
  it.each([
    // Source: ISO 4217.
    ['GBP', 2],
    ['EUR', 2],
    ['USD', 2],
    ['AUD', 2],
    ['JPY', 0],
    ['KWD', 3],
  ])('writes %s with %i decimals', (currency, digits) => {
    expect(minorDigits(currency)).toBe(digits);
  });

  it.each([
    [329_135, 'GBP', '3,291.35'],
    [-650, 'GBP', '−6.50'],
    [5, 'GBP', '0.05'],
    [0, 'GBP', '0.00'],
    [123_456_789, 'JPY', '123,456,789'],
    [-1_234, 'KWD', '−1.234'],
  ])('writes %i minor units of %s as %s', (amount, currency, words) => {
    expect(writeMinor(amount, currency)).toBe(words);
  });

  it.each([1.5, Number.NaN, Number.POSITIVE_INFINITY, '', '12.5', 'x', '9007199254740993', undefined])(
    'takes %p for no amount',
    (value) => {
      expect(() => asMinor(value)).toThrow(RangeError);
    },
  );

  it('refuses a sum it cannot hold exactly', () => {
    expect(sumMinor([Number.MAX_SAFE_INTEGER - 1, 1])).toBe(Number.MAX_SAFE_INTEGER);
    expect(() => sumMinor([Number.MAX_SAFE_INTEGER, 1])).toThrow(RangeError);
  });
});
