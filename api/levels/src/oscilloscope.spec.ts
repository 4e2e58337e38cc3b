import fc from 'fast-check';
import { errorOf } from '../testing/error-of';
import { formatReading, oscilloscopeReading, type OscilloscopeInput, OutOfDomainError } from './index';

const set = (overrides: Partial<OscilloscopeInput> = {}): OscilloscopeInput => ({
  voltsPerDivision: 0.02,
  divisionsPeakToPeak: 3.3,
  readToDivisions: 0.1,
  probeRatio: 10,
  loadOhms: 50,
  ...overrides,
});

describe('a level from an oscilloscope', () => {
  it('reads 3.3 divisions at 20 mV/div, ×10, 50 ohm as +0.37 ± 0.47 dBm, 0.66 V and 1.09 mW', () => {
    const reading = oscilloscopeReading(set());
    expect(formatReading(reading)).toBe('+0.37 ± 0.47 dBm');
    expect(reading.voltsPeakToPeak).toBeCloseTo(0.66, 12);
    expect(reading.watts).toBeCloseTo(0.001089, 9);
    expect(reading.calculation).toBe('oscilloscope/1');
  });

  it('reads 6.7 divisions at 10 mV/div as +0.50 ± 0.39 dBm', () => {
    const reading = oscilloscopeReading(set({ voltsPerDivision: 0.01, divisionsPeakToPeak: 6.7 }));
    expect(formatReading(reading)).toBe('+0.50 ± 0.39 dBm');
  });

  it('lists the four limits in dB, each rectangular, and their root-sum-square times 2/√3', () => {
    const { components, expandedUncertainty } = oscilloscopeReading(set());
    expect(components.map(({ name }) => name)).toEqual([
      'reading resolution',
      'vertical gain',
      'probe',
      'load',
    ]);
    expect(components.every(({ distribution }) => distribution === 'rectangular')).toBe(true);
    const squares = components.map(({ limit }) => limit ** 2).reduce((sum, square) => sum + square);
    expect(expandedUncertainty).toBeCloseTo((Math.sqrt(squares) * 2) / Math.sqrt(3), 12);
  });

  it('uses the limits of the instrument, the probe and the load where they are stated', () => {
    const stated = { verticalGainToleranceRel: 0, probeToleranceRel: 0, loadToleranceRel: 0.02 };
    const limits = oscilloscopeReading(set(stated)).components.map(({ limit }) => limit);
    expect(limits.slice(1, 3)).toEqual([0, 0]);
    expect(limits[3]).toBeCloseTo(0.08686, 5);
  });

  it('assumes 3 %, 2 % at ×10 or 0.1 % at ×1, and 0.5 % where nothing is stated', () => {
    const assumed = (probeRatio: 1 | 10) =>
      oscilloscopeReading(set({ probeRatio })).components.map(({ limit }) => limit);
    const perCent = (limit: number | undefined) => ((limit ?? NaN) * Math.LN10) / 0.2;
    expect(assumed(10).slice(1, 3).map(perCent)).toEqual([expect.closeTo(3, 9), expect.closeTo(2, 9)]);
    expect(perCent(assumed(1)[2])).toBeCloseTo(0.1, 9);
    // The load moves the power, half as many decibels.
    expect(perCent(assumed(10)[3])).toBeCloseTo(0.25, 9);
  });

  it('takes ten times the voltage, 20 dB, at ×10', () => {
    const direct = oscilloscopeReading(set({ probeRatio: 1 })).value;
    expect(oscilloscopeReading(set()).value - direct).toBeCloseTo(20, 9);
  });

  it.each<[string, Partial<OscilloscopeInput>, string]>([
    ['volts per division of zero', { voltsPerDivision: 0 }, 'voltsPerDivision'],
    ['negative volts per division', { voltsPerDivision: -0.02 }, 'voltsPerDivision'],
    ['a trace higher than the screen', { divisionsPeakToPeak: 33 }, 'divisionsPeakToPeak'],
    [
      'a trace lower than four times what it was read to',
      { divisionsPeakToPeak: 0.3 },
      'divisionsPeakToPeak',
    ],
    ['a reading without resolution', { readToDivisions: 0 }, 'readToDivisions'],
    ['a probe of ×7', { probeRatio: 7 as 10 }, 'probeRatio'],
    ['a probe of NaN', { probeRatio: NaN as 10 }, 'probeRatio'],
    ['a load of zero', { loadOhms: 0 }, 'loadOhms'],
    ['an infinite load', { loadOhms: Infinity }, 'loadOhms'],
    ['a negative tolerance', { probeToleranceRel: -0.01 }, 'probeToleranceRel'],
    ['a vertical gain known to 30 % only', { verticalGainToleranceRel: 0.3 }, 'verticalGainToleranceRel'],
    ['a load tolerance of NaN', { loadToleranceRel: NaN }, 'loadToleranceRel'],
  ])('refuses %s and names the input, its value and what is permitted', (_title, overrides, input) => {
    const error = errorOf(() => oscilloscopeReading(set(overrides)));
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
    expect(error.value).toBe(Object.values(overrides)[0]);
    expect(error.permitted).not.toBe('');
  });

  it('asks whether 33 divisions were meant as 3.3', () => {
    const error = errorOf(() => oscilloscopeReading(set({ divisionsPeakToPeak: 33 })));
    expect(error).toMatchObject({ suggestion: 3.3, permitted: 'at least 0.4 and at most 8 div' });
    expect(error.message).toContain('Did you mean 3.3?');
  });

  it('has no suggestion for 90 divisions, because 9 would not fit either', () => {
    expect(errorOf(() => oscilloscopeReading(set({ divisionsPeakToPeak: 90 })))).toMatchObject({
      suggestion: undefined,
    });
  });

  // JCGM 101:2008 propagates distributions by drawing from them; the exact formula takes the place of the decibel
  // budget, so the budget's linearisation and its coverage are both on trial. The draws are seeded.
  it.each([
    ['a trace of the usual height', 3.3],
    ['a trace at the least height permitted', 0.4],
    ['a full screen', 8],
  ])('covers at least 95 %% of 20,000 set-ups drawn within the limits: %s', (_title, divisionsPeakToPeak) => {
    const input = set({ divisionsPeakToPeak });
    const { value, expandedUncertainty } = oscilloscopeReading(input);
    const draw = seeded(14_100);
    const within = (limit: number) => limit * (2 * draw() - 1);
    let covered = 0;
    for (let count = 0; count < 20_000; count++) {
      const divisions = divisionsPeakToPeak + within(0.1);
      const volts = (input.voltsPerDivision * divisions * 10 * (1 + within(0.02))) / (1 + within(0.03));
      const level = 10 * Math.log10(volts ** 2 / 8 / (50 * (1 + within(0.005))) / 1e-3);
      if (Math.abs(level - value) <= expandedUncertainty) covered++;
    }
    expect(covered / 20_000).toBeGreaterThanOrEqual(0.95);
  });

  it('gives finite numbers or a typed error, whatever is put in', () => {
    const any = fc.oneof(
      fc.double(),
      fc.double({ min: 0, max: 10, noNaN: true }),
      fc.constantFrom(0, -0, 1e308),
    );
    fc.assert(
      fc.property(
        any,
        any,
        any,
        fc.constantFrom<1 | 10>(1, 10),
        any,
        (volts, height, readTo, probeRatio, load) => {
          const input = { voltsPerDivision: volts, divisionsPeakToPeak: height, readToDivisions: readTo };
          const reading = finiteOrTyped(() => oscilloscopeReading({ ...input, probeRatio, loadOhms: load }));
          if (reading === undefined) return;
          expect(Number.isFinite(reading.value) && Number.isFinite(reading.expandedUncertainty)).toBe(true);
          expect(Number.isFinite(reading.watts) && Number.isFinite(reading.voltsPeakToPeak)).toBe(true);
        },
      ),
      { numRuns: 2000 },
    );
  });
});

function finiteOrTyped<T>(call: () => T): T | undefined {
  let result: T | undefined;
  try {
    result = call();
  } catch (error) {
    expect(error).toBeInstanceOf(OutOfDomainError);
  }
  return result;
}

/** A plain congruential generator (Numerical Recipes constants), the same draws on every run. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}
