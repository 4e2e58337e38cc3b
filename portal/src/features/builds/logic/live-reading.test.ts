import { describe, expect, it } from 'vitest';
import { aCheck } from '../testing/build.fixture';
import { liveGain, liveReading } from './live-reading';
import { prefillOf } from './prefill';
import { readingSentence, readingWords, windowText } from './words';

const scope = aCheck({ defaults: { probeRatio: 10, loadOhms: 50, readToDivisions: 0.1 } });
const start = prefillOf(scope, []).entry;
const typed = { ...start, voltsPerDivision: '20m', divisionsPeakToPeak: '3.3' };

describe('the reading while typing', () => {
  it('comes to level, uncertainty and verdict, and says what would settle it', () => {
    // 20 mV/div × 3.3 div × 10 = 0.66 V peak to peak in 50 ohm: 1.089 mW, +0.37 dBm.
    const live = liveReading(scope, typed);
    if (live.state !== 'read') throw new Error('it can be read');
    expect(live.reading.value).toBeCloseTo(0.37, 2);
    expect(live.verdict).toBe('too close to call');
    expect(live.tighter?.voltsPerDivision).toBe(0.01);
    expect(live.advice).toMatch(/At 10 mV\/div it tightens to ± 0.39/);
  });

  it('is incomplete, field by field, until every field can be read', () => {
    expect(liveReading(scope, start)).toMatchObject({ state: 'incomplete' });
    const tooHigh = liveReading(scope, { ...typed, divisionsPeakToPeak: '33' });
    expect(tooHigh).toMatchObject({
      problems: { divisionsPeakToPeak: expect.stringContaining('3.3') as string },
    });
  });

  it('takes the accuracy the chosen instrument states', () => {
    const analyzer = aCheck({ method: 'analyzer', windowLow: -30, windowHigh: 0, defaults: {} });
    const entry = {
      referenceLevelDbm: '0',
      divisionsDown: '2',
      dbPerDivision: '10',
      readToDivisions: '0.02',
      padsInLineDb: '0',
    };
    const [good, plain] = [
      liveReading(analyzer, entry, { amplitudeAccuracyDb: 0.3 }),
      liveReading(analyzer, entry),
    ];
    if (good.state !== 'read' || plain.state !== 'read') throw new Error('both can be read');
    expect(good.reading.expandedUncertainty).toBeLessThan(plain.reading.expandedUncertainty);
  });

  it('works a gain out with the level being typed, once both levels are there', () => {
    const gain = { ...aCheck({ method: 'gain', unit: 'dB' }), fromCheckIds: ['out', 'in'] };
    const level = (value: number) => ({
      value,
      unit: 'dBm' as const,
      uncertaintyUnit: 'dB' as const,
      expandedUncertainty: 0.5,
    });
    expect(liveGain(gain, (id) => level(id === 'out' ? 0.4 : -19.4))?.value).toBeCloseTo(19.8, 9);
    expect(liveGain(gain, (id) => (id === 'out' ? level(0.4) : undefined))).toBeUndefined();
  });
});

describe('words', () => {
  it('tell a frequency read by eye in megahertz, one from a counter to the hertz', () => {
    const seen = { value: 8.87e6, unit: 'Hz', uncertaintyUnit: 'Hz', expandedUncertainty: 340_000 };
    expect(readingSentence(seen)).toBe('8.87 MHz ± 0.34 MHz');
    const counted = { ...seen, value: 8_868_512, expandedUncertainty: 9 };
    expect(readingSentence(counted)).toBe('8.868512 MHz ± 9 Hz');
  });

  const reading = { value: -19.42, unit: 'dBm', uncertaintyUnit: 'dB', expandedUncertainty: 0.473 };

  it('show as many figures as the uncertainty deserves, signed only where the trade signs', () => {
    expect(readingWords(reading, 1)).toEqual({ value: '−19.4', unit: 'dBm', plusMinus: '± 0.5' });
    expect(readingSentence(reading)).toBe('−19.42 ± 0.47 dBm');
    const current = { value: 22.4, unit: 'mA', uncertaintyUnit: 'mA', expandedUncertainty: 0.28 };
    expect(readingSentence(current, 1)).toBe('22.4 ± 0.3 mA');
    const level = { ...reading, expandedUncertainty: 1.3 };
    expect(readingSentence(level, 1)).toBe('−19.4 ± 1.3 dBm');
  });

  it('tell a frequency in megahertz and its uncertainty in hertz', () => {
    const frequency = { value: 8_868_500, unit: 'Hz', uncertaintyUnit: 'Hz', expandedUncertainty: 10.3 };
    expect(readingSentence(frequency)).toBe('8.868500 MHz ± 10 Hz');
    expect(windowText({ windowLow: 8_868_400, windowHigh: 8_868_600, unit: 'Hz' })).toBe(
      '8.8684 to 8.8686 MHz',
    );
  });

  it('tell a window with one end or two', () => {
    expect(windowText({ windowLow: 0, windowHigh: 3, unit: 'dBm' })).toBe('0.0 to +3.0 dBm');
    expect(windowText({ windowLow: null, windowHigh: -25, unit: 'dBc' })).toBe('at most −25.0 dBc');
    expect(windowText({ windowLow: 14, windowHigh: null, unit: 'dB' })).toBe('+14.0 dB or more');
  });
});
