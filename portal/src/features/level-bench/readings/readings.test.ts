import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { INPUTS } from './inputs';
import { WAYS, withWayInNames } from './ways';
import { budgetRows, figureOf, inText, sentence, windowText } from './words';
import { work } from './work';

function worked(texts: Record<string, string>) {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return work(read.values);
}

describe('a reading', () => {
  it.each(WAYS)('$label: starts with figures that come to something', ({ value }) => {
    const text = inText(worked({ way: value }));
    expect(text).toMatch(/\d/);
    expect(text).not.toMatch(/NaN|Infinity|undefined/);
  });

  it('is judged with its uncertainty as the guard band, and says what would settle it', () => {
    // By hand: 20 mV/div × 3.3 div × 10 = 0.66 V p-p; (0.66/2√2)²/50 = 1.089 mW = +0.37 dBm.
    // ILAC-G8:09/2019, 4.2.3: the guard band is U, so +0.37 ± 0.47 straddles a low end of 0.
    const found = worked({ way: 'oscilloscope' });
    expect(found.reading.value).toBeCloseTo(10 * Math.log10(1.089), 4);
    expect(found.verdict).toBe('too close to call');
    expect(found.advice).toContain('At 10 mV/div it tightens to ± 0.39');
  });

  it('has a budget of rectangular limits over √3, added as squares, times two', () => {
    // JCGM 100:2008, 4.3.7 and 5.1.2, by hand: 3 % of a voltage is 0.2606 dB, 0.1 of 5 div 0.1737 dB, a load of 1 % 0.0434 dB.
    const found = worked({
      way: 'oscilloscope',
      ...{ 'oscilloscope.divisionsPeakToPeak': '5', 'oscilloscope.readToDivisions': '0.1' },
      ...{ 'oscilloscope.probeToleranceRel': '0', 'oscilloscope.loadToleranceRel': '1' },
    });
    const standard = [0.260577, 0.173718, 0.043429].map((limit) => limit / Math.sqrt(3));
    expect(found.reading.expandedUncertainty).toBeCloseTo(0.36508, 4);
    expect(budgetRows(found.reading).map(({ share }) => Math.round(share))).toEqual(
      [...standard, 0].map((u) => Math.round((100 * u ** 2) / 0.182542 ** 2)),
    );
  });

  it('of an edge takes the oscilloscope’s own rise off', () => {
    // Common practice: 0.35/100 MHz = 3.5 ns; √(6² − 3.5²) = 4.873 ns.
    const found = worked({ way: 'rise-time' });
    expect([found.reading.unit, found.reading.value]).toEqual(['ns', expect.closeTo(4.8734, 3)]);
    expect(inText(found)).toContain('The oscilloscope’s own: 3.5 ns');
    expect(() => worked({ way: 'rise-time', 'rise-time.divisions': '1.5' })).toThrow(
      expect.objectContaining({ input: 'rise-time.divisions' }),
    );
  });

  it('of two tones tells peak envelope power, average and each tone', () => {
    // 47 CFR 97.3(b). 200 V p-p in 50 ohm: 200²/(8 × 50) = 100 W at the crest; two equal tones average half of it.
    const found = worked({
      way: 'two-tone-envelope',
      ...{ 'two-tone-envelope.voltsPerDivision': '5', 'two-tone-envelope.divisionsPeakToPeak': '4' },
    });
    expect(inText(found)).toContain('Peak envelope power: 100 W\nAverage of the two tones: 50 W, +46.99 dBm');
  });

  it('of intermodulation is 6.02 dB better told below the peak envelope power', () => {
    const below = (against: string) =>
      worked({ way: 'intermodulation', 'intermodulation.against': against }).reading.value;
    expect(below('each tone') - below('peak envelope power')).toBeCloseTo(20 * Math.log10(2), 9);
  });

  it('is read in the unit of its meter, with per cent and digits as one limit', () => {
    // By hand: 1 % of 22.4 mA and 0.2 mA of digits are 0.424 mA; with 0.1 mA of reading: 2·√(0.424² + 0.1²)/√3.
    const found = worked({ way: 'meter', 'meter.accuracyFixed-mA': '0.2' });
    expect(found.reading).toMatchObject({ value: 22.4, unit: 'mA' });
    expect(found.reading.expandedUncertainty).toBeCloseTo((2 * Math.hypot(0.424, 0.1)) / Math.sqrt(3), 9);
    expect(windowText(found)).toBe('19.0 to 25.0');
  });

  it('of a counter is told in kilohertz, its window typed in megahertz', () => {
    // By hand: one count in 1 s and 1 ppm of 14.1 MHz: 2·√(1² + 14.1²)/√3 = 16.3 Hz.
    const counter = {
      'counter.frequencyMegahertz': '14.1',
      'counter.low': '14.0999',
      'counter.high': '14.1001',
    };
    const found = worked({ way: 'counter', ...counter });
    expect(figureOf(found.reading)).toEqual({ value: '14100.000', unit: 'kHz', plusMinus: '± 0.016' });
    expect([found.window?.low, found.window?.high, found.verdict]).toEqual([14_099_900, 14_100_100, 'pass']);
  });

  it('goes by a detector’s own points, by straight lines between them', () => {
    // By hand: half way from −40 dBm at 1.13 V to −20 dBm at 1.62 V, before 20 dB of pads.
    const found = worked({ way: 'detector-table', 'detector-table.volts': '1.375' });
    expect(found.reading.value).toBeCloseTo(-10, 9);
  });

  it('says what a probe takes as a loss and not as an uncertainty of it', () => {
    // 10 pF at 14.1 MHz are 1.129 kilohm: 20 log |1 + 1 k/(−j 1.129 k)| = 2.52 dB (voltage divider, by hand).
    expect(sentence(worked({ way: 'probe-loading' }))).toMatch(
      /^The probe takes: 2\.52 dB lower with the probe on\./,
    );
  });

  it('names the page’s own field when a figure is outside its domain', () => {
    expect(() => worked({ way: 'oscilloscope', 'oscilloscope.divisionsPeakToPeak': '33' })).toThrow(
      expect.objectContaining({ input: 'oscilloscope.divisionsPeakToPeak' }),
    );
    expect(() => worked({ way: 'meter', 'meter.readToValue-mA': '0' })).toThrow(
      expect.objectContaining({ input: 'meter.readToValue-mA' }),
    );
    expect(() => worked({ way: 'oscilloscope', 'oscilloscope.low': '5' })).toThrow(
      expect.objectContaining({ input: 'oscilloscope.high' }),
    );
  });
});

it('an address from before means what it meant', () => {
  const search = new URLSearchParams(withWayInNames('?way=analyzer&divisionsDown=1.65'));
  expect([...search]).toEqual([
    ['way', 'analyzer'],
    ['analyzer.divisionsDown', '1.65'],
  ]);
});
