import { LevelsError } from '@ferrite-row/levels';
import { describe, expect, it } from 'vitest';
import { INPUTS } from './inputs';
import { rowsOf } from './rows';
import { axisEnd, workOut } from './work-out';
import { valuesWith } from './work-out.test-values';

const mixed = (texts?: Record<string, string>) => workOut(valuesWith(texts));
const named = ({ others }: ReturnType<typeof workOut>, name: string) =>
  others.find((product) => product.name === name);

describe('a mixer as the page opens', () => {
  const mixing = mixed();

  // By hand: 23.067 − 8.867 = 14.200; subtracting the signal turns its sidebands over; −10 − 6.5 = −16.5.
  it('wants 14.2 MHz, with the sideband inverted, at the IF level less the conversion loss', () => {
    const { wanted, conversion, band } = mixing;
    expect([wanted.name, wanted.hertz, conversion.sideband, band.band]).toEqual([
      'LO − IF',
      14.2e6,
      'inverted',
      '20 m',
    ]);
    expect(wanted.levelDbm).toBeCloseTo(-16.5, 9);
  });

  // The drawn case of the design: 2.5, 61.9 and 66.0 dB are read off its filter, to its tenth.
  it('stands behind a filter that takes 2.5 dB, 62 at the oscillator and 66 at the sum', () => {
    const taken = ({ levelDbm = NaN, filteredDbm = NaN } = {}) => levelDbm - filteredDbm;
    expect(taken(mixing.wanted)).toBeCloseTo(2.5, 1);
    expect(taken(named(mixing, 'LO'))).toBeCloseTo(61.9, 1);
    expect(taken(named(mixing, 'LO + IF'))).toBeCloseTo(66, 1);
  });

  // By hand: E24 pads for 3 dB are 300, 18 and 300 ohm; the leak is the drive they deliver less 35 dB.
  it('is driven through a pad, and leaks what the pad leaves', () => {
    const { drive } = mixing;
    expect(drive.pad?.resistors.map(({ ohms }) => ohms)).toEqual([300, 18, 300]);
    expect(drive.deliveredDbm).toBeCloseTo(7.01, 2);
    expect(named(mixing, 'LO')?.levelDbm).toBeCloseTo(drive.deliveredDbm - 35, 9);
  });

  it('reaches to twice its oscillator, rounded up to 10 MHz', () => {
    expect(mixing.maxHertz).toBe(50e6);
    expect(axisEnd(5e6, 14e6)).toBe(30e6);
  });
});

describe('the rows of the table', () => {
  const mixing = mixed();
  const { shown, rest } = rowsOf(mixing);
  const rows = shown.map(({ product, note }) => `${product.name} ${note}`.trim());

  it('begin with the wanted product, then the least in hand, then the nearest to the band', () => {
    expect(rows).toEqual([
      'LO − IF wanted',
      'LO + IF sum',
      'LO leakage',
      '3·LO + IF',
      'IF leakage',
      '4·IF − LO nearest below the band',
      '2·IF nearest above the band',
      '2·LO − 2·IF in the 10 m band',
    ]);
  });

  // N(N + 1) products to order N, counted by hand for 7: 56.
  it('leave none out: what is not shown is the rest', () => {
    expect(shown.length + rest.length).toBe(56);
    expect(new Set([...shown, ...rest].map(({ product }) => product.name)).size).toBe(56);
  });

  it('are eight at most, whatever goes wrong', () => {
    const bad = rowsOf(mixed({ filter: 'none', maxOrder: '15' }));
    expect(bad.shown).toHaveLength(8);
    expect(bad.shown.length + bad.rest.length).toBe(240);
  });

  it('name a product that comes out in the band, which no filter takes', () => {
    // By hand: 9.5 + 4.7 = 14.2 is wanted, and 3·4.7 = 14.1 lies beside it.
    const { shown: some, rest: others } = rowsOf(mixed({ ifHertz: '4.7', loHertz: '9.5', wanted: 'sum' }));
    const third = [...some, ...others].find(({ product }) => product.name === '3·IF');
    expect(third).toMatchObject({ note: 'in the band', product: { place: 'in the band' } });
  });
});

describe('a mixer of other figures', () => {
  it('takes every filter of the list', () => {
    for (const { value } of INPUTS.filter.options) {
      const { curve } = mixed({ filter: value });
      expect(curve?.gainDb.every((db) => db <= 1e-9) ?? value === 'none').toBe(true);
    }
  });

  it('passes its own band with at most 6 dB through each band’s filter', () => {
    // LO above an IF of 1 MHz, so that the sum lies in the middle of the band.
    const middles = { '80m': 3.65, '40m': 7.1, '30m': 10.125, '20m': 14.175, '17m': 18.118 } as const;
    for (const [filter, megahertz] of Object.entries(middles)) {
      const { wanted } = mixed({ filter, ifHertz: '1', loHertz: String(megahertz - 1), wanted: 'sum' });
      expect(wanted.levelDbm - wanted.filteredDbm).toBeLessThan(6);
    }
  });

  it('stands a product at no frequency at all', () => {
    // 2·7 − 14 = 0.
    const { others } = mixed({ ifHertz: '7', loHertz: '14', maxOrder: '3' });
    expect(others.find(({ hertz }) => hertz === 0)?.filteredDbm).toBeLessThan(-300);
  });

  it.each([
    ['a difference of nothing', 'loHertz', { loHertz: '8.867' }],
    ['an order of 16', 'maxOrder', { maxOrder: '16' }],
    ['half an order', 'maxOrder', { maxOrder: '7.5' }],
    ['a negative loss', 'conversionLoss', { conversionLoss: '-3' }],
    ['too wide a band-pass', 'bandwidthHertz', { filter: 'own-band-pass', bandwidthHertz: '9000' }],
  ])('says of %s what is permitted, at its field', (_what, input, texts) => {
    expect(() => mixed(texts)).toThrow(LevelsError);
    try {
      mixed(texts);
    } catch (error) {
      expect(error).toMatchObject({ input });
      expect(Object.keys(INPUTS)).toContain(input);
    }
  });
});

describe('tuned over the band', () => {
  it('names where another product crosses the wanted one', () => {
    // By hand, difference of 5.5 MHz: 2·LO − 4·IF = LO − IF where LO = 3·5.5 = 16.5, at 11 MHz; turned about,
    // 4·IF − 2·LO = LO − IF where LO = 5·5.5 / 3 = 9.1667, at 3.6667 MHz.
    const { tuning, band } = mixed({ ifHertz: '5.5', loHertz: '9.2', filter: '80m' });
    expect(band.band).toBe('80 m');
    expect(tuning.crossings[0]).toMatchObject({ loMultiple: 2, ifMultiple: 4 });
    expect(tuning.crossings[0].wantedHertz).toBeCloseTo((2 * 5.5e6) / 3, 0);
    expect(tuning.troubled).toBeGreaterThan(0);
  });

  it('finds nothing in the way of the sample plan', () => {
    const { tuning } = mixed();
    expect([tuning.troubled, tuning.crossings]).toEqual([0, []]);
    // 14.000 + 8.867 and 14.350 + 8.867.
    expect(tuning.loHertz).toEqual([22.867e6, 23.217e6]);
  });

  it('tells no oscillator that cannot be', () => {
    expect(mixed({ ifHertz: '20', loHertz: '4', wanted: 'sum' }).tuning.loHertz).toBeDefined();
    expect(mixed({ ifHertz: '14.3', loHertz: '0.05', wanted: 'sum' }).tuning.loHertz).toBeUndefined();
  });
});
