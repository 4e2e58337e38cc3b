import { feeMinor } from './fees';

const TARIFF = { basisPoints: 150, fixedMinor: 20 };

describe('the fee on a card payment', () => {
  // Worked by hand: 1.5 % of 48.00 is 0.72, and 0.20; 1.5 % of 1.00 is 1.5 pence; of 0.33 it is 0.495 pence.
  it.each([
    [4800, 92],
    [100, 22],
    [33, 20],
    [1, 20],
    [99_999_999, 1_500_020],
  ])('of %i minor units is %i, the share rounded half up', (amount, fee) => {
    expect(feeMinor(amount, TARIFF)).toBe(fee);
  });

  it('follows another tariff', () => {
    expect(feeMinor(10_000, { basisPoints: 290, fixedMinor: 30 })).toBe(320);
  });
});
