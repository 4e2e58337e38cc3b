import { outcomeOf, readCardNumber, TEST_CARDS } from './cards';

describe('card numbers', () => {
  it('are read with spaces and hyphens as people type them', () => {
    expect(readCardNumber(' 4242-4242 4242 4242 ')).toBe('4242424242424242');
  });

  it.each(['', 'abcd', '4242 4242 4242 4241', '4242', '42424242424242424242', '४२४२४२४२४२४२४२४२'])(
    'are refused when they cannot be a card: %p',
    (typed) => {
      expect(readCardNumber(typed)).toBeUndefined();
    },
  );

  it('listed on the page can all be typed in', () => {
    expect(TEST_CARDS.map(({ number }) => readCardNumber(number))).toEqual(
      TEST_CARDS.map(({ number }) => number),
    );
  });

  it('that are not test numbers are declined', () => {
    // 5000 0000 0000 0009 has a right check digit and is not in the list (by hand: 5 doubled is 10, which counts 1, and 9).
    expect(readCardNumber('5000000000000009')).toBeDefined();
    expect(outcomeOf('5000000000000009').kind).toBe('declined');
  });
});
