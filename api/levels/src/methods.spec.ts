import { errorOf } from '../testing/error-of';
import {
  analyzerReading,
  type AnalyzerInput,
  counterReading,
  type CounterInput,
  dBm,
  dummyLoadReading,
  formatReading,
  gainReading,
  harmonicReading,
  type HarmonicInput,
  headroomTo,
  type LevelReading,
  meterReading,
  type MeterInput,
  oscilloscopeReading,
  OutOfDomainError,
  WrongUnitError,
} from './index';

const names = ({ components }: LevelReading) => components.map(({ name }) => name);
const limits = ({ components }: LevelReading) => components.map(({ limit }) => limit);

function expectRefused<T extends object>(
  read: (input: T) => unknown,
  good: T,
  cases: [keyof T & string, unknown][],
) {
  for (const [input, value] of cases) {
    const error = errorOf(() => read({ ...good, [input]: value }));
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect({ input: error.input, value: error.value }).toEqual({ input, value });
  }
}

describe('a level from a spectrum analyzer', () => {
  const good: AnalyzerInput = {
    referenceLevelDbm: 0,
    divisionsDown: 3.2,
    dbPerDivision: 10,
    readToDivisions: 0.05,
    padsInLineDb: 20,
    amplitudeAccuracyDb: 1,
  };

  it('adds the pads to what the screen shows', () => {
    expect(analyzerReading(good)).toMatchObject({ value: -12, unit: 'dBm', calculation: 'analyzer/1' });
  });

  it('lists reading resolution, amplitude accuracy and pads in dB', () => {
    const reading = analyzerReading({ ...good, padToleranceDb: 0.3 });
    expect(names(reading)).toEqual(['reading resolution', 'amplitude accuracy', 'pads']);
    expect(limits(reading)).toEqual([0.5, 1, 0.3]);
    // 2/√3 · √(0.25 + 1 + 0.09)
    expect(reading.expandedUncertainty).toBeCloseTo(1.33666, 5);
  });

  it('assumes 0.2 dB for a pad in line and nothing without one', () => {
    expect(limits(analyzerReading(good))[2]).toBe(0.2);
    expect(limits(analyzerReading({ ...good, padsInLineDb: 0 }))[2]).toBe(0);
  });

  it('refuses what no screen shows', () => {
    expectRefused(analyzerReading, good, [
      ['referenceLevelDbm', Infinity],
      ['divisionsDown', -1],
      ['divisionsDown', 10.5],
      ['dbPerDivision', 0],
      ['readToDivisions', 0],
      ['padsInLineDb', -20],
      ['padToleranceDb', -0.1],
      ['amplitudeAccuracyDb', NaN],
    ]);
  });
});

describe('a harmonic below the carrier', () => {
  const good: HarmonicInput = {
    fundamentalDivisionsDown: 0.5,
    harmonicDivisionsDown: 3.7,
    dbPerDivision: 10,
    readToDivisions: 0.05,
    scaleFidelityDb: 0.5,
    flatnessDb: 0.8,
  };

  it('is negative in dBc when the harmonic is the weaker', () => {
    expect(harmonicReading(good)).toMatchObject({ value: -32, unit: 'dBc', uncertaintyUnit: 'dB' });
    expect(harmonicReading({ ...good, harmonicDivisionsDown: 0.1 }).value).toBeCloseTo(4, 12);
  });

  it('counts the resolution of both peaks', () => {
    const reading = harmonicReading(good);
    expect(limits(reading)).toEqual([0.5, 0.5, 0.5, 0.8]);
    // 2/√3 · √(3 · 0.25 + 0.64)
    expect(reading.expandedUncertainty).toBeCloseTo(1.36137, 5);
  });

  it('refuses what no screen shows', () => {
    expectRefused(harmonicReading, good, [
      ['fundamentalDivisionsDown', -0.1],
      ['harmonicDivisionsDown', 11],
      ['dbPerDivision', 100],
      ['scaleFidelityDb', -1],
      ['flatnessDb', Infinity],
    ]);
  });
});

describe('a value from a meter', () => {
  const good: MeterInput = { value: 22.4, unit: 'mA', readToValue: 0.1, accuracyRel: 0.01 };

  it('keeps its unit and shows 22.4 ± 0.3 mA', () => {
    expect(formatReading(meterReading(good), 1)).toBe('22.4 ± 0.3 mA');
    expect(meterReading(good).uncertaintyUnit).toBe('mA');
  });

  it('adds per cent and digits to one limit, also for a negative value', () => {
    const reading = meterReading({ ...good, value: -12, unit: 'V', accuracyFixed: 0.02 });
    expect(limits(reading)[1]).toBeCloseTo(0.14, 12);
  });

  it('can read zero', () => {
    expect(meterReading({ ...good, value: 0 }).value).toBe(0);
  });

  it('refuses what no meter shows', () => {
    expectRefused(meterReading, good, [
      ['value', NaN],
      ['readToValue', 0],
      ['accuracyRel', -0.01],
      ['accuracyRel', 1],
      ['accuracyFixed', -1],
    ]);
  });
});

describe('a frequency from a counter', () => {
  const good: CounterInput = { frequencyHertz: 14.1e6, gateSeconds: 0.1, timeBasePpm: 1 };

  it('is sure to one count of the gate and to its time base', () => {
    const reading = counterReading(good);
    expect(names(reading)).toEqual(['one count', 'time base']);
    expect(limits(reading)[0]).toBeCloseTo(10, 12);
    expect(limits(reading)[1]).toBeCloseTo(14.1, 9);
  });

  it('counts in steps of the prescaler', () => {
    expect(limits(counterReading({ ...good, prescaler: 10 }))[0]).toBeCloseTo(100, 9);
  });

  it('refuses a gate too short for one cycle and other impossible settings', () => {
    expectRefused(counterReading, good, [
      ['gateSeconds', 1e-8],
      ['gateSeconds', -1],
      ['frequencyHertz', 0],
      ['timeBasePpm', -1],
      ['prescaler', 0],
    ]);
  });
});

describe('power into a dummy load', () => {
  const input = {
    voltsPerDivision: 1,
    divisionsPeakToPeak: 4.5,
    readToDivisions: 0.1,
    probeRatio: 10,
    loadOhms: 50,
  } as const;

  it('is the level of the same trace, in watts', () => {
    const reading = dummyLoadReading(input);
    // 45 V peak to peak in 50 ohm: 45² / 8 / 50
    expect(reading).toMatchObject({ unit: 'W', uncertaintyUnit: 'W', voltsPeakToPeak: 45 });
    expect(reading.value).toBeCloseTo(5.0625, 9);
  });

  it('has the uncertainty of that level, to first order', () => {
    const reading = dummyLoadReading(input);
    const decibels = oscilloscopeReading(input).expandedUncertainty;
    const upper = reading.value * (10 ** (decibels / 10) - 1);
    const lower = reading.value * (1 - 10 ** (-decibels / 10));
    expect(reading.expandedUncertainty).toBeLessThan(upper);
    expect(reading.expandedUncertainty).toBeGreaterThan(lower);
  });
});

describe('gain between two readings', () => {
  const level = (value: number, expandedUncertainty: number) =>
    ({ value, expandedUncertainty, unit: 'dBm' }) as const;

  it('carries both uncertainties: from −19.4 ± 0.5 to +0.37 ± 0.47 dBm it is +19.8 ± 0.7 dB', () => {
    const reading = gainReading({ output: level(0.37, 0.47), input: level(-19.4, 0.5) });
    expect(formatReading(reading, 1)).toBe('+19.8 ± 0.7 dB');
    expect(reading.expandedUncertainty).toBeCloseTo(Math.hypot(0.47, 0.5), 12);
  });

  it('refuses a reading that is no level', () => {
    const current = meterReading({ value: 22.4, unit: 'mA', readToValue: 0.1, accuracyRel: 0.01 });
    const error = errorOf(() => gainReading({ output: current, input: level(-19.4, 0.5) }));
    expect(error).toBeInstanceOf(WrongUnitError);
    expect(error.input).toBe('output');
  });

  it('refuses a stored level that is not finite', () => {
    const error = errorOf(() => gainReading({ output: level(0, 0.4), input: level(NaN, 0.5) }));
    expect(error.input).toBe('input');
  });
});

describe('headroom', () => {
  it('is low under one decibel and not at one', () => {
    expect(headroomTo(dBm(10), dBm(9))).toEqual({ headroomDb: 1, isLow: false });
    expect(headroomTo(dBm(10), dBm(9.01)).isLow).toBe(true);
  });

  it('is negative over the limit', () => {
    expect(headroomTo(dBm(10), dBm(12))).toEqual({ headroomDb: -2, isLow: true });
  });
});
