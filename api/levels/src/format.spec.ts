import { errorOf } from '../testing/error-of';
import {
  decimalsFor,
  formatAtLeast,
  formatAtMost,
  formatFixed,
  formatQuantity,
  formatReading,
  formatSigned,
  formatUnderstood,
  OutOfDomainError,
  type QuantityUnit,
} from './index';

describe('numbers for members', () => {
  it('use the true minus and give zero no sign', () => {
    expect([formatFixed(-19.44, 1), formatFixed(-0.04, 1), formatFixed(0, 2)]).toEqual([
      '−19.4',
      '0.0',
      '0.00',
    ]);
    expect([formatSigned(0.004, 2), formatSigned(-0.004, 2), formatSigned(1.5, 1)]).toEqual([
      '0.00',
      '0.00',
      '+1.5',
    ]);
  });

  it('refuse what is not a number', () => {
    expect(errorOf(() => formatFixed(NaN, 1))).toBeInstanceOf(OutOfDomainError);
    expect(errorOf(() => formatQuantity(Infinity, 'V'))).toBeInstanceOf(OutOfDomainError);
    expect(errorOf(() => formatFixed(1, -1)).input).toBe('decimals');
  });
});

describe('a reading in words', () => {
  it('shows two significant digits of its uncertainty unless told otherwise', () => {
    expect(formatReading({ value: 0.37028, unit: 'dBm', expandedUncertainty: 0.473 })).toBe(
      '+0.37 ± 0.47 dBm',
    );
    expect(formatReading({ value: 5.0625, unit: 'W', expandedUncertainty: 0.487 }, 1)).toBe('5.1 ± 0.5 W');
    expect(formatReading({ value: 14_100_000, unit: 'Hz', expandedUncertainty: 16.3 })).toBe(
      '14100000 ± 16 Hz',
    );
  });

  it('never shows an uncertainty as nothing', () => {
    expect(formatReading({ value: 8.1, unit: 'mA', expandedUncertainty: 0.004 }, 1)).toBe('8.100 ± 0.004 mA');
  });

  it.each([
    [0.473, 2, 2],
    [0.0999, 2, 2],
    [0.0994, 2, 3],
    [0.96, 1, 0],
    [0.28, 1, 1],
    [12.3, 2, 0],
    [1234, 2, 0],
    [0, 2, 2],
    [1e-30, 2, 12],
  ] as const)('an uncertainty of %d with %d digits takes %d decimals', (uncertainty, digits, decimals) => {
    expect(decimalsFor(uncertainty, digits)).toBe(decimals);
  });
});

describe('a bound in words', () => {
  it('is rounded to the side on which the claim stays true', () => {
    expect([formatAtLeast(0.3929, 2), formatAtMost(2.607, 2)]).toEqual(['+0.40', '+2.60']);
    expect([formatAtLeast(-0.3929, 2), formatAtMost(-2.607, 2)]).toEqual(['−0.39', '−2.61']);
  });

  it('is not moved by the last bit of a binary fraction', () => {
    expect([formatAtLeast(0.1 + 0.2, 1), formatAtMost(0.3, 1), formatAtMost(2.3 + 0.6, 1)]).toEqual([
      '+0.3',
      '+0.3',
      '+2.9',
    ]);
  });
});

describe('a quantity in words', () => {
  it.each<[number, QuantityUnit, string]>([
    [0.001089, 'W', '1.09 mW'],
    [1e-4, 'W', '100 µW'],
    [10, 'W', '10 W'],
    [0.9996, 'V', '1 V'],
    [0.66, 'V', '660 mV'],
    [-0.02, 'V/div', '−20 mV/div'],
    [14.1e6, 'Hz', '14.1 MHz'],
    [50, 'ohm', '50 ohm'],
    [4700, 'ohm', '4.7 kohm'],
    [22.4, 'mA', '22.4 mA'],
    [-20, 'dBm', '−20 dBm'],
    [0, 'W', '0 W'],
    [1e-15, 'W', '0.001 pW'],
    [5e6, 'W', '5000 kW'],
  ])('%d %s reads %s', (value, unit, text) => {
    expect(formatQuantity(value, unit)).toBe(text);
  });

  it('can keep a voltage in volts down to a tenth', () => {
    expect(formatQuantity(0.66, 'V', 3, 0.1)).toBe('0.66 V');
    expect(formatQuantity(0.066, 'V', 3, 0.1)).toBe('66 mV');
  });

  it('groups thousands where it repeats what was understood', () => {
    expect(formatUnderstood(1234567.5, 'ohm')).toBe('1,234,567.5 ohm');
    expect(formatUnderstood(-4700, 'ohm')).toBe('−4,700 ohm');
    expect(formatUnderstood(123.4567, 'ohm')).toBe('123.4567 ohm');
  });
});
