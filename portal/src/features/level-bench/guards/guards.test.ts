import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { INPUTS, shownOf } from './inputs';
import { inText } from './judged';
import { work } from './work';

function judged(judge: string, texts: Record<string, string> = {}) {
  const read = readValues(INPUTS, { judge, ...texts });
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return work(read.values);
}

const figure = (found: ReturnType<typeof judged>, name: RegExp) =>
  found.figures.find((one) => name.test(one.name))?.figure;

describe('guards and limits', () => {
  it.each(INPUTS.judge.options)(
    '$label: start with figures, a source and a caution, and call nothing safe',
    ({ value }) => {
      const text = inText(judged(value));
      expect(text).not.toMatch(/NaN|Infinity|undefined|\bsafe/i);
      expect(text).toMatch(/Source: .*(20\d\d|practice)/);
      expect(judged(value).caution.words).not.toBe('');
    },
  );

  it('show a licence class only under a rule set that knows one', () => {
    expect(shownOf({ judge: 'band', ruleSet: 'US-97' })).toContain('licenceClass');
    expect(shownOf({ judge: 'band', ruleSet: 'IARU-R1' })).not.toContain('licenceClass');
  });
});

describe('an instrument’s input', () => {
  it('is kept from 5 W by a pad with a rating', () => {
    // By hand: +38 dBm and 1 dB off against +30 dBm less 10 dB of room needs 19 dB; 10^3.9 mW = 7.94 W go into the pad.
    const found = judged('instrument', { levelDbm: '38', plusMinusDb: '1', damageDbm: '30' });
    expect(found.tables[0]?.rows[0]?.cells).toEqual(['20 dB', '7.94 W', '25 W']);
    expect(found.figures[0]).toMatchObject({ figure: '+39.0', words: 'Would harm it', tone: 'caution' });
  });

  it('is kept from direct volts by a capacitor, which no pad replaces', () => {
    const found = judged('instrument', { levelDbm: '0', directVolts: '13.8', greatestDirectVolts: '0' });
    expect(figure(found, /Put in line/)).toBe('A capacitor');
  });
});

describe('spurious emissions', () => {
  it.each([
    // ITU Radio Regulations, Appendix 3 (from memory): 43 + 10 log P, or 50 dB, whichever asks for less.
    ['IARU-R1', '14.2', '5', '50.0'],
    ['IARU-R1', '14.2', '1', '43.0'],
    ['IARU-R1', '50.1', '100', '63.0'],
    // 47 CFR 97.307(d) and (e), text of 2026-09-23.
    ['US-97', '14.2', '5', '43.0'],
    ['US-97', '50.1', '100', '60.0'],
  ])(
    '%s, %s MHz, %s W: at least %s dB below the carrier',
    (ruleSet, carrierHertz, carrierWatts, expected) => {
      const none = { dbc2: '', dbc3: '', dbc4: '' };
      const found = judged('spurious', { ruleSet, carrierHertz, carrierWatts, cutoffHertz: '60', ...none });
      expect(figure(found, /below the carrier/)).toBe(expected);
    },
  );

  it('knows the older rule for a transmitter installed until 2003', () => {
    // 47 CFR 97.307(d): 40 dB and at most 50 mW, 30 dB under 5 W.
    const found = judged('spurious', { ruleSet: 'US-97', installed: 'before', carrierWatts: '4.9' });
    expect(figure(found, /below the carrier/)).toBe('30.0');
  });

  it('ask the filter for what is short, the uncertainty on the safe side, the worst first', () => {
    // By hand: 49.99 − 17 + 1.1 = 34.09 dB at the third harmonic, 23.09 dB at the second.
    const { rows = [] } = judged('spurious').tables[0] ?? {};
    expect(rows.map(({ cells, verdict }) => [cells[0], cells[4], verdict])).toEqual([
      ['Third harmonic', '34.1 dB', 'not yet'],
      ['Second harmonic', '23.1 dB', 'not yet'],
      ['Fourth harmonic', '13.1 dB', 'not yet'],
    ]);
    // Chebyshev, n = 5, ripple of 20 dB return loss, 28.4/15.5 of its edge: 26.8 dB by T5(1.832)² and the ripple, by hand.
    expect(rows[1]?.cells[5]).toBe('26.8 dB');
  });
});

describe('a band', () => {
  const phone = { ruleSet: 'US-97', emission: 'phone', side: 'upper', day: '2026-12-01' };
  const against = (texts: Record<string, string>) =>
    judged('band', { ...phone, ...texts }).tables[0]?.rows ?? [];

  it.each([
    // 47 CFR 97.301 and 97.305, text of 2026-09-23, Region 2.
    ['advanced', '3.790', '2.8', true, '97.301(c)'],
    ['general', '3.790', '2.8', false, '97.301(d)'],
    ['extra', '3.599', '3', false, '97.305(c)(3)(ii), 97.307(b)'],
    ['extra', '14.347', '3', true, '97.301(b)'],
  ])('%s, phone from %s MHz, %s kHz wide: fits is %s', (licenceClass, carrierHertz, bandwidthHertz, fits) => {
    expect(against({ licenceClass, carrierHertz, bandwidthHertz }).length === 0).toBe(fits);
  });

  it('must hold all of the emission and not only its carrier', () => {
    // 47 CFR 97.307(b), by hand: 14.348 MHz and 2.7 kHz above it end 700 Hz over the edge at 14.350 MHz.
    const rows = against({ licenceClass: 'extra', carrierHertz: '14.348' });
    expect(rows[0]?.cells[0]).toBe('700 Hz of it lie outside the band.');
  });

  it('has its limit of radiated power, feeder and antenna counted', () => {
    // 47 CFR 97.313(i): 9.15 W ERP from 5351.5 to 5366.5 kHz; 20 W behind 3 dB are 10.02 W.
    const sixty = { licenceClass: 'general', carrierHertz: '5.355', peakWatts: '20', feedLossDb: '3' };
    expect(against(sixty).map(({ cells }) => cells[0])).toContainEqual(
      expect.stringMatching(/^At most 9\.15 W ERP/),
    );
  });

  it('is asked about a day, and says when it cannot answer', () => {
    expect(() => judged('band', { day: 'soon' })).toThrow(expect.objectContaining({ input: 'day' }));
  });
});

describe('exposure', () => {
  const carrier = {
    mode: 'carrier',
    onMinutes: '60',
    offMinutes: '0',
    carrierHertz: '28.5',
    peakWatts: '100',
  };

  it('has the distance of OET Bulletin 65, never told shorter than it is', () => {
    // Equations 3, 6 and 7 with F = 2.56: 164.06 W EIRP at 28.5 MHz, 0.2216 and 1.108 mW/cm²: 3.88 m and 1.74 m.
    const found = judged('exposure', carrier);
    expect(figure(found, /^Uncontrolled/)).toBe('3.9');
    // 1.737 m lies beyond λ/2π = 1.674 m, so the distance itself stands.
    expect(figure(found, /^Controlled/)).toBe('1.8');
    const at3 = judged('exposure', { ...carrier, distanceMetres: '3' }).tables[0]?.rows.at(-1)?.cells;
    expect(at3).toEqual(['Density at 3 m', '0.371 mW/cm²', '0.371 mW/cm²']);
  });

  it('averages over six and thirty minutes', () => {
    // OET Bulletin 65, Supplement B, pages 13 and 14: 1,500 W PEP of speech, seven minutes on and off: 300 W and 160 W.
    const seven = {
      mode: 'conversational SSB, no processing',
      onMinutes: '7',
      offMinutes: '7',
      peakWatts: '1500',
    };
    const { rows = [] } = judged('exposure', seven).tables[0] ?? {};
    expect(rows.find(({ cells }) => cells[0] === 'Average power at the antenna')?.cells.slice(1)).toEqual([
      '160 W',
      '300 W',
    ]);
  });

  it('names the field of the page for a frequency no limit holds for', () => {
    expect(() => judged('exposure', { carrierHertz: '0.1' })).toThrow(
      expect.objectContaining({ input: 'carrierHertz' }),
    );
  });
});

describe('a heat sink', () => {
  // Thermal resistances in series: 25 °C + 40 W × (1 + 0.2 + 0.8) K/W, data-sheet practice.
  const path = {
    ...{ watts: '40', ambientCelsius: '25', junctionToCase: '1', caseToSink: '0.2', sinkToAir: '0.8' },
    greatestJunctionCelsius: '175',
  };

  it('adds up the way of the heat', () => {
    expect(judged('heat', path).heat?.places.map(({ celsius }) => celsius)).toEqual([105, 65, 57, 25]);
  });

  it('that would do is told on the safe side, and is none where too much is lost before it', () => {
    // (150 − 40)/60 − 0.95 = 0.8833 K/W; with 1.8 K/W to the case −0.117: no sink is good enough.
    const asked = {
      ...path,
      watts: '60',
      ambientCelsius: '40',
      greatestJunctionCelsius: '150',
      caseToSink: '0.15',
    };
    expect(figure(judged('heat', { ...asked, junctionToCase: '0.8' }), /would do/)).toBe('0.88');
    expect(figure(judged('heat', { ...asked, junctionToCase: '1.8' }), /would do/)).toBe('None');
  });
});
