import fc from 'fast-check';
import { between } from '../testing/between';
import {
  formatAtLeast,
  oscilloscopeReading,
  type OscilloscopeInput,
  tighterScale,
  tooCloseText,
  verdictOf,
} from './index';

const set = (overrides: Partial<OscilloscopeInput> = {}): OscilloscopeInput => ({
  voltsPerDivision: 0.02,
  divisionsPeakToPeak: 3.3,
  readToDivisions: 0.1,
  probeRatio: 10,
  loadOhms: 50,
  ...overrides,
});
const window = { low: 0, high: 3 };

describe('a tighter setting', () => {
  it('for 3.3 divisions at 20 mV/div is 10 mV/div, ± 0.39, passing from +0.40 dBm', () => {
    const advice = tighterScale(set(), window);
    expect(advice).toMatchObject({ voltsPerDivision: 0.01, wouldPass: false });
    expect(advice?.divisionsPeakToPeak).toBeCloseTo(6.6, 9);
    expect(advice?.expandedUncertainty.toFixed(2)).toBe('0.39');
    expect(formatAtLeast(advice?.passesFrom ?? NaN, 2)).toBe('+0.40');
  });

  it('says so when the level just read would pass there', () => {
    const advice = tighterScale(set({ divisionsPeakToPeak: 3.32 }), window);
    expect(advice).toMatchObject({ wouldPass: true });
  });

  it('goes to the smallest setting of the 1, 2, 5 row that fits, not only to the next', () => {
    expect(
      tighterScale(set({ voltsPerDivision: 0.1, divisionsPeakToPeak: 0.7 }), window)?.voltsPerDivision,
    ).toBe(0.01);
  });

  it('is not offered when the trace would leave the screen', () => {
    expect(tighterScale(set({ divisionsPeakToPeak: 4.1 }), window)).toBeUndefined();
  });

  it('may fill the screen to its last division', () => {
    expect(tighterScale(set({ divisionsPeakToPeak: 4 }), window)?.divisionsPeakToPeak).toBe(8);
  });

  it('names the greatest level that passes under a high end', () => {
    const high = 0.7;
    const upTo = tighterScale(set(), { high })?.passesUpTo ?? NaN;
    expect(verdictOf(upTo - 1e-9, uncertaintyOf(set(), 0.01, upTo - 1e-9), { high })).toBe('pass');
    expect(verdictOf(upTo + 1e-6, uncertaintyOf(set(), 0.01, upTo + 1e-6), { high })).toBe(
      'too close to call',
    );
  });

  it('is not offered below what the instrument has', () => {
    const small = set({ voltsPerDivision: 0.002, divisionsPeakToPeak: 2 });
    expect(tighterScale(small, window)).toBeUndefined();
    expect(tighterScale(small, window, 0.001)?.voltsPerDivision).toBe(0.001);
  });

  it('has no passing level in a window narrower than its uncertainty', () => {
    const advice = tighterScale(set(), { low: 0.2, high: 0.5 });
    expect(advice).toMatchObject({ wouldPass: false });
    expect(advice?.passesFrom).toBeUndefined();
    expect(advice?.passesUpTo).toBeUndefined();
  });

  it('passes at the level it names and not just under it', () => {
    const limits = fc.record({
      divisions: between(0.5, 8),
      offset: between(-0.4, 0.4),
    });
    fc.assert(
      fc.property(limits, ({ divisions, offset }) => {
        const input = set({ divisionsPeakToPeak: divisions });
        const low = oscilloscopeReading(input).value + offset;
        const advice = tighterScale(input, { low });
        if (advice?.passesFrom === undefined) return;
        const verdictAt = (level: number) =>
          verdictOf(level, uncertaintyOf(input, advice.voltsPerDivision, level), { low });
        expect(verdictAt(advice.passesFrom + 1e-9)).toBe('pass');
        expect(verdictAt(advice.passesFrom - 1e-6)).not.toBe('pass');
      }),
    );
  });
});

/** From the level back to the height it has on that screen, by the definition of dBm. */
function uncertaintyOf(input: OscilloscopeInput, voltsPerDivision: number, level: number): number {
  const volts = Math.sqrt(8 * input.loadOhms * 1e-3 * 10 ** (level / 10));
  const divisionsPeakToPeak = volts / (voltsPerDivision * input.probeRatio);
  return oscilloscopeReading({ ...input, voltsPerDivision, divisionsPeakToPeak }).expandedUncertainty;
}

describe('too close to call, in words', () => {
  const words = (input: OscilloscopeInput, limits: { low?: number; high?: number }) =>
    tooCloseText(oscilloscopeReading(input), limits, tighterScale(input, limits));

  it('says which end, by how much, the setting to take and the level that would then pass', () => {
    expect(words(set(), window)).toBe(
      'The low end of your reading is −0.10 dBm, 0.10 dB under the window. ' +
        'At 10 mV/div it tightens to ± 0.39, and +0.40 or more would pass.',
    );
  });

  it('says when the same level would pass at the tighter setting', () => {
    expect(words(set({ divisionsPeakToPeak: 3.32 }), window)).toContain('and this level would pass.');
  });

  it('names the level to stay under at a high end', () => {
    expect(words(set(), { high: 0.7 })).toBe(
      'The high end of your reading is +0.84 dBm, 0.14 dB over the window. ' +
        'At 10 mV/div it tightens to ± 0.39, and +0.30 or less would pass.',
    );
  });

  it('falls back on the level that passes as it is read, when no setting helps', () => {
    const input = set({ divisionsPeakToPeak: 4.1 });
    expect(words(input, { low: 2 })).toMatch(/^The low end .* With ± 0\.44, \+2\.44 or more would pass\.$/);
  });

  it('rounds the passing level to the safe side of a high end', () => {
    const text = tooCloseText(
      { value: 14.59, unit: 'dB', uncertaintyUnit: 'dB', expandedUncertainty: 0.613 },
      { low: 13, high: 15 },
    );
    expect(text).toContain('+14.38 or less would pass.');
  });

  it('says so when the window is too narrow for the method', () => {
    const text = tooCloseText(
      { value: 8, unit: 'mA', uncertaintyUnit: 'mA', expandedUncertainty: 2 },
      { low: 7.5, high: 8.5 },
    );
    expect(text).toContain('The low end of your reading is 6.0 mA, 1.5 mA under the window.');
    expect(text).toContain('narrower than this reading can settle');
  });

  it('says "less than" rather than a distance of nothing', () => {
    const reading = { value: 0.4699, unit: 'dBm', uncertaintyUnit: 'dB', expandedUncertainty: 0.47 } as const;
    expect(tooCloseText(reading, window)).toContain('less than 0.01 dB under the window');
  });

  it('is silent about a pass', () => {
    expect(words(set({ voltsPerDivision: 0.01, divisionsPeakToPeak: 6.7 }), window)).toBe('');
  });
});
