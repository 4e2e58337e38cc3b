import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { INPUTS } from './inputs';
import type { NetworkSheet } from './l-network';
import { sheetText } from '../results/sheet';
import { work, type MatchingSheet } from './work';

/** As typed on the page. */
function worked(texts: Record<string, string>): MatchingSheet {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return work(read.values);
}

const figureOf = (sheet: MatchingSheet, name: string) =>
  sheet.figures.find((figure) => figure.name === name)?.figure;

describe('a match', () => {
  // Public amateur table: VSWR 1.5 is 13.98 dB, 4 % back; ρ = 0.2, mismatch loss −10 log 0.96 = 0.177 dB.
  it.each([
    ['vswr', '1.5'],
    ['reflection', '0.2'],
    ['returnLossDb', '13.9794'],
    ['mismatchLossDb', '0.17729'],
  ])('is the same whichever figure it is told by: %s', (known, text) => {
    const sheet = worked({ known, [known]: text });
    expect(figureOf(sheet, 'VSWR')).toBe('1.50');
    expect(figureOf(sheet, 'Return loss')).toBe('13.98 dB');
    expect(figureOf(sheet, 'Mismatch loss')).toBe('0.177 dB');
    expect(figureOf(sheet, 'Power that comes back')).toBe('4 %');
  });

  // |Z − 50| / |Z + 50| for 50 + j50: 0.4472, VSWR 2.618 (textbook).
  it('is worked out from an impedance', () => {
    const sheet = worked({ known: 'impedance', loadOhms: '50', loadReactanceOhms: '50' });
    expect(figureOf(sheet, 'VSWR')).toBe('2.62');
    expect(figureOf(sheet, 'Reflection coefficient')).toBe('0.4472');
  });

  // By hand: ρ 0.1 and 0.2, 20 log(1 − 0.02) = −0.1755, 20 log(1 + 0.02) = +0.1720.
  it('bounds the level against another match whose phase is unknown', () => {
    const sheet = worked({ known: 'reflection', reflection: '0.2', facingDb: '20' });
    expect(figureOf(sheet, 'Against 20.0 dB facing it')).toBe('−0.18 to +0.17 dB');
  });

  it('has no figures that do not exist when everything or nothing comes back', () => {
    const total = worked({ known: 'reflection', reflection: '1' });
    expect(figureOf(total, 'VSWR')).toBe('no bound');
    expect(figureOf(total, 'Mismatch loss')).toBe('all of it');
    expect(figureOf(worked({ known: 'vswr', vswr: '1' }), 'Return loss')).toBe('no reflection');
  });

  it('is refused at the field that was typed', () => {
    const refused = (texts: Record<string, string>, input: string) =>
      expect(() => worked(texts)).toThrow(expect.objectContaining({ input }));
    refused({ known: 'mismatchLossDb', mismatchLossDb: '-1' }, 'mismatchLossDb');
    refused({ known: 'impedance', loadOhms: '-5' }, 'loadOhms');
    refused({ facingDb: '-3' }, 'facingDb');
  });
});

describe('an L-network', () => {
  const network = (texts: Record<string, string> = {}) =>
    worked({ calculation: 'l-network', ...texts }) as NetworkSheet;

  // By hand: Q = √(50/12.5 − 1) = 1.732; at 7 MHz the low-pass has √3/(50ω) = 787.6 pF and 12.5√3/ω = 492.3 nH.
  it('has both solutions, with the values of the textbook', () => {
    const { networks } = network({ frequencyHertz: '7' });
    expect(networks.map(({ name }) => name)).toEqual(['Low-pass, Q 1.73', 'High-pass, Q 1.73']);
    const exact = networks[0].elements.map(({ name, exactValue }) => [name, exactValue.toExponential(3)]);
    expect(exact).toEqual([
      ['C1', '7.876e-10'],
      ['L2', '4.923e-7'],
    ]);
  });

  // Textbook, for parts much better than the network: the coil takes Q/Qcoil = 1.732/100 of the power, 0.0746 dB.
  it('tells the loss of its parts where their Q is given, and none where it is not', () => {
    const fine = { frequencyHertz: '7', alNanohenry: '0.5', series: 'E96' };
    const [low] = network({ ...fine, inductorQ: '100' }).networks;
    expect(low.lossDb).toBeCloseTo(0.0746, 2);
    expect(sheetText(network({ ...fine, inductorQ: '100' }))).toMatch(/loss 0\.0[78] dB/);
    expect(network(fine).networks[0].lossDb).toBeUndefined();
    expect(sheetText(network(fine))).not.toContain(' loss 0');
    expect(() => network({ inductorQ: '0' })).toThrow(expect.objectContaining({ input: 'inductorQ' }));
  });

  it('matches the better, the nearer its parts come to the exact ones', () => {
    const coarse = network({ series: 'E12', alNanohenry: '40' }).networks[0].returnLossDb;
    const fine = network({ series: 'E96', alNanohenry: '0.1' }).networks[0].returnLossDb;
    expect(coarse).toBeLessThan(20);
    expect(fine).toBeGreaterThan(35);
  });

  it('keeps its good match on both sides of the frequency, or says that it is not good', () => {
    const [good] = network({ series: 'E96', alNanohenry: '0.1' }).networks;
    expect(good.good?.low).toBeLessThan(14.2e6);
    expect(good.good?.high).toBeGreaterThan(14.2e6);
    expect(network({ alNanohenry: '40' }).networks[0].good).toBeUndefined();
  });

  it('takes the reactance of the load into it, and then has four, each with its own name', () => {
    const { networks, loadText } = network({
      resistanceOhms: '30',
      reactanceOhms: '-40',
      series: 'E96',
      alNanohenry: '0.1',
    });
    expect(loadText).toBe('30 − j 40 ohm');
    expect(new Set(networks.map(({ name }) => name)).size).toBe(4);
    // With nearly exact parts all of them match what they were worked out for.
    for (const { returnLossDb } of networks) expect(returnLossDb).toBeGreaterThan(30);
  });

  it('is refused for a load that needs none', () => {
    expect(() => network({ resistanceOhms: '50' })).toThrow(
      expect.objectContaining({ input: 'resistanceOhms' }),
    );
  });
});

describe('a winding', () => {
  // Published relation L = AL·N²: 4.9 nH, 2.6 µH is 23.04 turns, 23 give 2.592 µH, 0.3 % under.
  it.each([
    ['nH', { alNanohenry: '4.9' }],
    ['uH', { microhenries: '49' }],
    ['mH', { millihenries: '4.9' }],
  ])('has whole turns, whichever way the table tells AL: %s', (al, figure) => {
    const sheet = worked({ calculation: 'core', henries: '2600', al, ...figure });
    expect(figureOf(sheet, 'Wind')).toBe('23 turns');
    expect(figureOf(sheet, 'Exact')).toBe('23.04 turns');
    expect(figureOf(sheet, 'They give')).toBe('2.592 µH');
    expect(figureOf(sheet, 'Off by')).toBe('−0.3 %');
  });

  // 1928 formula, one inch across and long: 20 turns 6.897 µH.
  it('of one layer in air has the inductance of the formula, and the turns for one', () => {
    const inch = { calculation: 'air', diameterMetres: '25.4', lengthMetres: '25.4' };
    const given = worked({ ...inch, findOfCoil: 'henries', turns: '20' });
    expect(figureOf(given, 'They give')).toBe('6.897 µH');
    expect(figureOf(given, 'From turn to turn')).toBe('1.27 mm');
    expect(figureOf(worked({ ...inch, coilHenries: '6900' }), 'Wind')).toBe('20 turns');
  });

  it('too short for the formula is refused at its length', () => {
    expect(() => worked({ calculation: 'air', lengthMetres: '3' })).toThrow(
      expect.objectContaining({ input: 'lengthMetres' }),
    );
    expect(() => worked({ calculation: 'air', coilHenries: '0' })).toThrow(
      expect.objectContaining({ input: 'coilHenries' }),
    );
  });
});

describe('a resonant circuit', () => {
  // f = 1/(2π√LC): 1 µH and 100 pF, 15.915 MHz, 100 ohm each; Q 200 loaded to 20 loses 0.92 dB (textbook).
  it('finds the third of frequency, coil and capacitor, and the loss', () => {
    const both = { calculation: 'resonance', resonantHenries: '1000', farads: '100', unloadedQ: '200' };
    const sheet = worked({ ...both, find: 'frequency', bandwidthHertz: '795.775' });
    expect(figureOf(sheet, 'Resonance')).toBe('15.92 MHz');
    expect(figureOf(sheet, 'Reactance of each')).toBe('100 ohm');
    expect(figureOf(sheet, 'Loaded Q')).toBe('20.0');
    expect(figureOf(sheet, 'Loss of one resonator')).toBe('0.92 dB');
    const at = { ...both, centreHertz: '15.91549' };
    expect(figureOf(worked({ ...at, find: 'farads' }), 'Capacitor')).toBe('100 pF');
    expect(figureOf(worked({ ...at, find: 'henries' }), 'Coil')).toBe('1 µH');
  });

  // Q = ωL/R: 7.1 MHz, 2.2 µH, 0.6 ohm is 163.6 (handbook).
  it('takes the Q of a coil from its resistance', () => {
    const sheet = worked({
      calculation: 'resonance',
      centreHertz: '7.1',
      resonantHenries: '2200',
      qFrom: 'ohms',
      seriesOhms: '0.6',
    });
    expect(figureOf(sheet, 'Q of the coil')).toBe('164');
  });

  it('is refused at the field of the page', () => {
    expect(() => worked({ calculation: 'resonance', resonantHenries: '0' })).toThrow(
      expect.objectContaining({ input: 'resonantHenries' }),
    );
  });
});

describe('a conductor and a core', () => {
  // 66 µm at 1 MHz, 21 µm at 10 MHz in copper: the figures every handbook has.
  it('has the skin depth of the handbooks', () => {
    const sheet = worked({ calculation: 'skin', frequencyHertz: '1' });
    expect(sheet.figures[0].figure).toBe('66.1 µm');
    expect(worked({ calculation: 'skin', frequencyHertz: '10' }).figures[0].figure).toBe('20.9 µm');
  });

  // Textbook: ρ/(π·d·δ), 1.7241e-8/(π × 1 mm × 25.0 µm) = 0.2197 ohm for a metre at 7 MHz.
  it('has the resistance of a wire, and none where the current fills it', () => {
    const name = 'Resistance of a metre of it';
    const thick = worked({ calculation: 'skin', frequencyHertz: '7', wireMetres: '1' });
    expect(figureOf(thick, name)).toBe('220 mohm');
    const thin = worked({ calculation: 'skin', frequencyHertz: '7', wireMetres: '0.2' });
    expect(figureOf(thin, name)).toContain('direct current');
  });

  // B = √2·E/(2π·f·N·A): 31.62 V, 3.5 MHz, 12 turns, 11.4 mm² is 14.87 mT.
  it('has the flux of the law of induction, against what is permitted', () => {
    const sheet = worked({
      calculation: 'flux',
      voltsRms: '31.6228',
      frequencyHertz: '3.5',
      permittedMillitesla: '7.43',
    });
    expect(sheet.figures[0].figure).toBe('14.9 mT');
    expect(sheet.cells[0].words).toBe('over what is permitted, 7.43 mT');
    expect(figureOf(sheet, 'For 7.43 mT at most')).toBe('15.8 V rms');
  });

  it('is refused at the field of the page', () => {
    const refused = (texts: Record<string, string>, input: string) =>
      expect(() => worked(texts)).toThrow(expect.objectContaining({ input }));
    refused({ calculation: 'flux', areaSquareMillimetres: '0' }, 'areaSquareMillimetres');
    refused({ calculation: 'flux', fluxTurns: '0' }, 'fluxTurns');
    refused({ calculation: 'skin', wireMetres: '0' }, 'wireMetres');
  });
});

it('every calculation starts with a result, and a text of it without gaps', () => {
  for (const { value } of INPUTS.calculation.options) {
    const text = sheetText(worked({ calculation: value }));
    expect(text.split('\n').length).toBeGreaterThan(2);
    expect(text).not.toMatch(/NaN|Infinity|undefined/);
  }
});
