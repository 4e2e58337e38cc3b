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
  const cellsOf = (found: ReturnType<typeof judged>, name: string) =>
    found.tables[0]?.rows.find(({ cells }) => cells[0]?.startsWith(name))?.cells.slice(1);

  const carrier = {
    ruleSet: 'US-97',
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
    const at3 = judged('exposure', { ...carrier, distanceMetres: '3' });
    expect(cellsOf(at3, 'Density at 3 m')).toEqual(['0.371 mW/cm²', '0.371 mW/cm²']);
  });

  it('averages over six and thirty minutes', () => {
    // OET Bulletin 65, Supplement B, pages 13 and 14: 1,500 W PEP of speech, seven minutes on and off: 300 W and 160 W.
    const seven = {
      ruleSet: 'US-97',
      mode: 'conversational SSB, no processing',
      onMinutes: '7',
      offMinutes: '7',
      peakWatts: '1500',
    };
    expect(cellsOf(judged('exposure', seven), 'Average power at the antenna')).toEqual(['160 W', '300 W']);
  });

  it('names the field of the page for a frequency no limit holds for', () => {
    expect(() => judged('exposure', { carrierHertz: '0.05' })).toThrow(
      expect.objectContaining({ input: 'carrierHertz' }),
    );
  });
});

describe('exposure by the other rules and of other sources', () => {
  const cellsOf = (found: ReturnType<typeof judged>, name: string) =>
    found.tables[0]?.rows.find(({ cells }) => cells[0]?.startsWith(name))?.cells.slice(1);
  const carrier = {
    ...{ ruleSet: 'US-97', mode: 'carrier', onMinutes: '60', offMinutes: '0' },
    ...{ carrierHertz: '28.5', peakWatts: '100' },
  };

  it('takes the club’s own rule set: ICNIRP’s levels in Region 1, and says so', () => {
    // ICNIRP 2020, Table 5, from memory: 300/f^0.7 V/m over 377 ohm at 14.2 MHz.
    const found = judged('exposure', { carrierHertz: '14.2', ruleSet: 'IARU-R1' });
    const limit = 300 ** 2 / 14.2 ** 1.4 / 3770;
    expect(cellsOf(found, 'Limit')?.[0]).toBe(`${Number(limit.toPrecision(3))} mW/cm²`);
    expect(cellsOf(found, 'Averaged over')).toEqual(['30 min', '30 min']);
    expect(inText(found)).toMatch(/Source: ICNIRP guidelines of 2020.*from memory/);
    expect(cellsOf(judged('exposure', { ...carrier }), 'Averaged over')).toEqual(['30 min', '6 min']);
  });

  it('adds the parts of the limit that other sources take, and keeps people further away', () => {
    // 47 CFR 1.1307(b)(3)(ii)(B): the sum may reach 1. Half is left, so √2 of 3.884 m: 5.49 m.
    const found = judged('exposure', { ...carrier, otherParts: '0.3 0,2', distanceMetres: '5.5' });
    expect(figure(found, /^Uncontrolled/)).toBe('5.5');
    // (3.8835/5.5)² = 0.499.
    expect(cellsOf(found, 'Part of the limit at 5.5 m')?.[0]).toBe('0.5, 1 with the others');
    const full = judged('exposure', { ...carrier, otherParts: '0.4 0.35 0.3' });
    expect(figure(full, /^Uncontrolled/)).toBe('None');
    expect(inText(full)).toContain('the other sources leave nothing');
    expect(() => judged('exposure', { otherParts: 'a lot' })).toThrow(
      expect.objectContaining({ input: 'otherParts' }),
    );
  });

  it('tells what 47 CFR 1.1307 lets go without an evaluation, and only under that rule set', () => {
    // ex-06 and ex-07 of the published cases: 106.187 W of average ERP at 28.5 MHz and 5 m.
    const name = 'Evaluation';
    const at5 = (peakWatts: string) =>
      cellsOf(judged('exposure', { ...carrier, peakWatts, distanceMetres: '5' }), name)?.[0];
    expect(at5('100')).toBe('exempt, table to 106 W ERP');
    expect(at5('200')).toBe('needed, table to 106 W ERP');
    const near = judged('exposure', { ...carrier, distanceMetres: '1' });
    expect(cellsOf(near, name)?.[0]).toContain('nearer than the table holds');
    const among = judged('exposure', { ...carrier, otherParts: '0.4', distanceMetres: '5' });
    expect(cellsOf(among, name)?.[0]).toBe('by the sum: other sources count');
    const weak = judged('exposure', { ...carrier, peakWatts: '0.001' });
    expect(cellsOf(weak, name)?.[0]).toBe('exempt: 1 mW or less');
    expect(
      cellsOf(judged('exposure', { ...carrier, ruleSet: 'IARU-R1', distanceMetres: '5' }), name),
    ).toBeUndefined();
  });
});

describe('a heat sink', () => {
  it('of a class-B stage stands its worst level, and tells two tones', () => {
    // Textbook: 4/π² of 100 W is 40.5 W, at 64 % of the swing; two tones run at π²/16 = 61.7 %, 31.1 W of heat.
    const found = judged('heat', { heatOf: 'class-B', classPeakWatts: '100', sinkToAir: '1' });
    expect(found.heat?.watts).toBeCloseTo(40.528, 3);
    const text = inText(found);
    expect(text).toContain('Hottest: 40.5 W, at 64 % of its swing');
    expect(text).toContain('Two equal tones at full peak: 31.1 W');
    expect(text).toContain('Efficiency then: 61.7 %');
    expect(inText(judged('heat'))).not.toContain('class-B');
    expect(() => judged('heat', { heatOf: 'class-B', classPeakWatts: '0' })).toThrow(
      expect.objectContaining({ input: 'classPeakWatts' }),
    );
  });

  it('tells what its supply’s wires lose, where a current is given', () => {
    // By hand: 2 × 2 m × 1.7241e-8 ohm m / 4 mm² × 20 A = 0.345 V.
    const wires = { supplyAmperes: '20', wireMetres: '2', wireSquareMillimetres: '4' };
    expect(inText(judged('heat', wires))).toMatch(
      /Lost there and back: 345 mV\n.*\n.*Fuse: at the supply’s end/,
    );
    expect(inText(judged('heat'))).not.toContain('Lost there and back');
    expect(() => judged('heat', { ...wires, wireSquareMillimetres: '0' })).toThrow(
      expect.objectContaining({ input: 'wireSquareMillimetres' }),
    );
  });

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
