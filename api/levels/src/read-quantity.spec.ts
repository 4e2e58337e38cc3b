import fc from 'fast-check';
import { errorOf } from '../testing/error-of';
import {
  AskingError,
  formatQuantity,
  formatUnderstood,
  LevelsError,
  type QuantityUnit,
  readQuantity,
  UnreadableQuantityError,
  WrongUnitError,
} from './index';

type Row = [typed: string, unit: QuantityUnit, value: number, understoodAs?: string];

describe('a typed quantity', () => {
  const rows: Row[] = [
    ['50', 'ohm', 50],
    ['4.7k', 'ohm', 4700, '4,700 ohm'],
    ['4.7K', 'ohm', 4700, '4,700 ohm'],
    ['4k7', 'ohm', 4700, '4,700 ohm'],
    ['4R7', 'ohm', 4.7, '4.7 ohm'],
    ['0R5 ohm', 'ohm', 0.5, '0.5 ohm'],
    ['2M2', 'ohm', 2.2e6, '2,200,000 ohm'],
    ['4n7', 'F', 4.7e-9, '4.7 nF'],
    ['100pF', 'F', 1e-10],
    ['50 Ω', 'ohm', 50],
    ['50\u2126', 'ohm', 50],
    ['300m', 'A', 0.3, '300 mA'],
    ['300m', 'ohm', 0.3, '0.3 ohm'],
    ['300M', 'ohm', 3e8, '300,000,000 ohm'],
    ['300m', 'mA', 300, '300 mA'],
    ['8.1', 'mA', 8.1],
    ['8100 µA', 'mA', 8.1, '8.1 mA'],
    ['20m', 'V/div', 0.02, '20 mV/div'],
    ['20 mV', 'V/div', 0.02],
    ['20 mV/div', 'V/div', 0.02],
    ['20 mV per div', 'V/div', 0.02],
    ['20', 'mV/div', 20],
    ['0.02', 'V/div', 0.02],
    ['0.2 us/div', 's/div', 2e-7, '200 ns/div'],
    ['0.2 μs/div', 's/div', 2e-7],
    ['20 dB', 'dB', 20],
    ['10 dB/div', 'dB/div', 10],
    ['10 dB', 'dB/div', 10],
    ['-20dBm', 'dBm', -20],
    ['−20 dBm', 'dBm', -20],
    ['–20', 'dBm', -20],
    ['+7', 'dBm', 7],
    ['-47.2 dBc', 'dBc', -47.2],
    ['10 µW', 'W', 1e-5],
    ['10uW', 'W', 1e-5, '10 µW'],
    ['14.1 MHz', 'Hz', 14.1e6],
    ['14.1M', 'Hz', 14.1e6, '14.1 MHz'],
    ['7050 khz', 'Hz', 7.05e6],
    ['1,5', 'div', 1.5, '1.5 div'],
    ['0,125', 'V', 0.125, '125 mV'],
    ['.5', 'V', 0.5],
    ['4 700', 'ohm', 4700, '4,700 ohm'],
    ['1,234,567', 'Hz', 1234567, '1.234567 MHz'],
    ['1,234.5', 'ohm', 1234.5, '1,234.5 ohm'],
    ['1.234,5', 'ohm', 1234.5, '1,234.5 ohm'],
    ['1e-3', 'V', 0.001, '1 mV'],
    ['1e-3 V', 'V', 0.001, '1 mV'],
    ['±0.1', 'div', 0.1, '0.1 div'],
    ['+/- 3 %', '%', 3, '3 %'],
    ['2 ppm', 'ppm', 2],
    ['  3.3  ', 'div', 3.3],
    ['-0', 'dBm', 0],
  ];

  it.each(rows.map(([typed, unit, value, understoodAs]) => ({ typed, unit, value, understoodAs })))(
    '$typed in $unit is $value',
    ({ typed, unit, value, understoodAs }) => {
      expect(readQuantity(typed, unit)).toEqual(
        understoodAs === undefined ? { value } : { value, understoodAs },
      );
    },
  );

  it('keeps m and M apart', () => {
    expect(readQuantity('3m', 'ohm').value).toBe(0.003);
    expect(readQuantity('3M', 'ohm').value).toBe(3_000_000);
  });

  it('is exact in decimal: 20 mV is 0.02 and not 0.020000000000000004', () => {
    for (const [typed, value] of [
      ['20 mV', 0.02],
      ['4.7m', 0.0047],
      ['33µ', 0.000033],
    ] as const) {
      expect(readQuantity(typed, 'V').value).toBe(value);
    }
  });

  it.each<[string, QuantityUnit, string[]]>([
    ['14.1 mHz', 'Hz', ['14.1 MHz']],
    ['14.1 mhz', 'Hz', ['14.1 MHz']],
    ['20M', 'V/div', ['20 mV/div']],
    ['5 MW', 'W', ['5 mW']],
    ['22.4 MA', 'A', ['22.4 mA']],
    ['5 GV', 'V', []],
    ['20 m', 'dBm', []],
    ['3k', 'div', []],
  ])('asks about a prefix no bench has: %s in %s', (typed, unit, candidates) => {
    const error = errorOf(() => readQuantity(typed, unit, 'load'));
    expect(error).toBeInstanceOf(AskingError);
    expect(error).toMatchObject({ input: 'load', value: typed, candidates });
  });

  it.each<[string, QuantityUnit, string[]]>([
    ['4,700', 'ohm', ['4.7', '4700']],
    ['1,500 mV', 'V', ['1.5 mV', '1500 mV']],
    ['-1,250', 'Hz', ['−1.25', '−1250']],
  ])(
    'asks whether a comma before three digits is a decimal comma or a thousand: %s',
    (typed, unit, candidates) => {
      const error = errorOf(() => readQuantity(typed, unit));
      expect(error).toBeInstanceOf(AskingError);
      expect(error).toMatchObject({ candidates });
    },
  );

  it('offers only candidates that are then read without a question', () => {
    for (const [typed, unit] of [
      ['4,700', 'ohm'],
      ['14.1 mHz', 'Hz'],
      ['20M', 'V/div'],
      ['-1,250 kHz', 'Hz'],
    ] as const) {
      const error = errorOf(() => readQuantity(typed, unit));
      if (!(error instanceof AskingError)) throw error;
      expect(
        error.candidates.map((candidate) => Number.isFinite(readQuantity(candidate, unit).value)),
      ).not.toContain(false);
    }
  });

  it.each<[string, QuantityUnit]>([
    ['20 dB', 'dBm'],
    ['20 dBm', 'dB'],
    ['20 dB', 'ohm'],
    ['50 ohm', 'V'],
    ['3 V', 'A'],
    ['20 mV', 's/div'],
    ['5 W', 'dBm'],
    ['3R3', 'V'],
  ])('says that the unit is of another kind: %s in %s', (typed, unit) => {
    expect(errorOf(() => readQuantity(typed, unit))).toBeInstanceOf(WrongUnitError);
  });

  it.each<[string, QuantityUnit]>([
    ['', 'V'],
    ['   ', 'V'],
    ['abc', 'V'],
    ['k', 'ohm'],
    ['-', 'dBm'],
    ['1.2.3', 'V'],
    ['1,2,3', 'V'],
    ['1..2', 'V'],
    ['3.3 x', 'V'],
    ['3.3 V V', 'V'],
    ['--3', 'V'],
    ['4k7k', 'ohm'],
    ['1.5k5', 'ohm'],
    ['22.4 ± 0.3', 'mA'],
    ['±5', 'dBm'],
    ['1e400', 'V'],
    ['1e-400', 'V'],
    ['NaN', 'V'],
    ['Infinity', 'V'],
    ['0x10', 'V'],
    ['٣', 'V'],
    ['9'.repeat(61), 'V'],
    [`1${' '.repeat(200)}x`, 'V'],
  ])('refuses what is no quantity: %s in %s', (typed, unit) => {
    const error = errorOf(() => readQuantity(typed, unit));
    expect(error).toBeInstanceOf(UnreadableQuantityError);
    expect(error.value).toBe(typed);
    expect(error.message.length).toBeLessThan(200);
  });

  it('says what to type instead', () => {
    const { message } = errorOf(() => readQuantity('abc', 'V'));
    expect(message).toBe('"abc" cannot be read here. Type a number in V, with the prefixes µ, m, k.');
  });

  it('never gives a number that is not finite, and never another kind of error, whatever is typed', () => {
    const alphabet = fc.constantFrom(...'0123456789.,-+±eEkKmMµunpGRVHzdBohmsAWF/% −Ω'.split(''));
    const units = fc.constantFrom<QuantityUnit>(
      'V',
      'mA',
      'ohm',
      'Hz',
      'dB',
      'dBm',
      'V/div',
      's/div',
      'div',
      'F',
      '%',
    );
    const text = fc.oneof(
      fc.string(),
      fc.array(alphabet, { maxLength: 12 }).map((letters) => letters.join('')),
    );
    fc.assert(
      fc.property(text, units, (typed, unit) => {
        const result = readOrRefused(typed, unit);
        if (result !== undefined) expect(Number.isFinite(result)).toBe(true);
      }),
      { numRuns: 5000 },
    );
  });
});

function readOrRefused(typed: string, unit: QuantityUnit): number | undefined {
  let value: number | undefined;
  try {
    value = readQuantity(typed, unit).value;
  } catch (error) {
    expect(error).toBeInstanceOf(LevelsError);
  }
  return value;
}

describe('a formatted quantity', () => {
  const size = fc.double({ min: 1e-13, max: 1e11, noNaN: true });
  const signed = fc.tuple(size, fc.boolean()).map(([value, isNegative]) => (isNegative ? -value : value));
  const units = fc.constantFrom<QuantityUnit>(
    'V',
    'mV',
    'A',
    'mA',
    'W',
    'ohm',
    'kohm',
    'Hz',
    'MHz',
    's',
    'F',
    'H',
    'V/div',
    'mV/div',
    's/div',
    'dB',
    'dBm',
    'dB/div',
    'div',
    'ppm',
    '%',
  );

  it('is read back as what it was, to the digits it shows', () => {
    fc.assert(
      fc.property(signed, units, fc.integer({ min: 1, max: 15 }), (value, unit, digits) => {
        const back = readQuantity(formatQuantity(value, unit, digits), unit).value;
        expect(Math.abs(back - value)).toBeLessThanOrEqual(Math.abs(value) * 5.0001 * 10 ** -digits);
      }),
      { numRuns: 5000 },
    );
  });

  it('is what the understanding of a typed text repeats, except that a grouped thousand asks', () => {
    fc.assert(
      fc.property(signed, units, (value, unit) => {
        const shown = formatUnderstood(value, unit);
        const back = /,/.test(shown)
          ? readQuantity(shown.replace(/,/g, ''), unit)
          : readQuantity(shown, unit);
        expect(Math.abs(back.value - value)).toBeLessThanOrEqual(Math.abs(value) * 1e-11);
      }),
      { numRuns: 2000 },
    );
  });
});
