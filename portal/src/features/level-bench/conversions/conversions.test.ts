import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { sheetText } from '../results/sheet';
import { INPUTS } from './inputs';
import { ratioText } from './ratio';
import { markRows, ruleScale } from './rule-scale';
import type { ConversionSheet } from './sheet';
import { work } from './work';

/** As typed on the page. */
function worked(texts: Record<string, string>): ConversionSheet {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return work(read.values);
}

const figureOf = (sheet: ConversionSheet, name: string) =>
  sheet.figures.find((figure) => figure.name === name)?.figure;

const refused = (texts: Record<string, string>, input: string) =>
  expect(() => worked(texts)).toThrow(expect.objectContaining({ input }));

describe('a ratio', () => {
  // Definitions of IEC 60027-3 and Recommendation ITU-R V.574: 1 Np = 8.68589 dB.
  it.each([
    ['powerRatio', '2', '+3.010 dB'],
    ['voltageRatio', '2', '+6.021 dB'],
    ['nepers', '1', '+8.686 dB'],
    ['ratioDb', '-20', '−20.000 dB'],
  ])('is told in decibels from %s %s', (ratioFrom, text, expected) => {
    const sheet = worked({ calculation: 'ratio', ratioFrom, [ratioFrom]: text });
    expect(figureOf(sheet, 'Decibels')).toBe(expected);
  });

  // By hand: 5 W from 200 mW is 25 times, 10 log 25 = 13.979 dB, 5 times the voltage.
  it('of two powers is the gain between them', () => {
    const sheet = worked({ calculation: 'ratio', ratioFrom: 'powers' });
    expect(figureOf(sheet, 'Decibels')).toBe('+13.979 dB');
    expect(figureOf(sheet, 'Power ratio')).toBe('25 to 1');
    expect(figureOf(sheet, 'The other way, voltages')).toBe('0.2 to 1');
  });

  it('is refused at the field that was typed', () => {
    refused({ calculation: 'ratio', ratioFrom: 'powerRatio', powerRatio: '0' }, 'powerRatio');
    refused({ calculation: 'ratio', ratioFrom: 'voltageRatio', voltageRatio: '-1' }, 'voltageRatio');
    refused({ calculation: 'ratio', ratioDb: '500' }, 'ratioDb');
    refused({ calculation: 'ratio', ratioFrom: 'nepers', nepers: '101' }, 'nepers');
    refused({ calculation: 'ratio', ratioFrom: 'powers', wattsIn: '0' }, 'wattsIn');
  });

  it('too long to write out is written with its power of ten', () => {
    expect(ratioText(19.9526)).toBe('19.95');
    expect(ratioText(1e12)).toBe('1 × 10^12');
    expect(ratioText(2.5e-7)).toBe('2.5 × 10^−7');
  });
});

describe('levels together', () => {
  // Two equal powers are 3.01 dB more, two equal voltages in phase 6.02; 0 and −10 dBm are +0.414 (10 log 1.1).
  it.each([
    ['0', '0', '+3.01 dBm', '+6.02 dBm'],
    ['0', '-10', '+0.41 dBm', '+2.39 dBm'],
  ])('%s and %s dBm add as powers, or at most as voltages', (first, second, powers, voltages) => {
    const sheet = worked({ calculation: 'sum', first, second });
    expect(figureOf(sheet, 'Together, powers added')).toBe(powers);
    expect(figureOf(sheet, 'In phase, voltages added')).toBe(voltages);
  });

  it('are as many as were typed, up to six', () => {
    const sheet = worked({ calculation: 'sum', first: '0', second: '0', fourth: '0', sixth: '0' });
    expect(sheet.title).toBe('four levels together in 50 ohm');
    expect(figureOf(sheet, 'Fourth')).toBe('0.00 dBm, 25 % of the power');
    expect(figureOf(sheet, 'Third')).toBeUndefined();
  });

  it('are refused at the level that cannot be', () => {
    refused({ calculation: 'sum', third: '500' }, 'third');
  });
});

describe('a source and its load', () => {
  // Voltage divider: 1 V behind 50 ohm into 50 ohm is 0.5 V, 5 mW, +6.99 dBm.
  it('matched, takes half the voltage and all that is available', () => {
    const sheet = worked({ calculation: 'loaded', emfVoltsRms: '1', loadOhms: '50' });
    expect(figureOf(sheet, 'Level')).toBe('+6.99 dBm');
    expect(figureOf(sheet, 'Volts rms')).toBe('500 mV');
    expect(figureOf(sheet, 'Against a matched load')).toBe('0.00 dB');
    expect(figureOf(sheet, 'Open circuit, voltage level')).toBe('+120.00 dBµV');
  });

  // By hand: into 75 ohm 0.6 V, 4.8 mW, 10 log(4·50·75/125²) = −0.177 dB.
  it('mismatched, loses what the mismatch takes', () => {
    const sheet = worked({ calculation: 'loaded', emfVoltsRms: '1' });
    expect(figureOf(sheet, 'Volts rms')).toBe('600 mV');
    expect(figureOf(sheet, 'Power')).toBe('4.8 mW');
    expect(figureOf(sheet, 'Against a matched load')).toBe('−0.18 dB');
    expect(figureOf(sheet, 'Available from the source')).toBe('+6.99 dBm');
  });
});

describe('the drawn rule', () => {
  // 0 dBm is 1 mW, 224 mV in 50 ohm; each 10 dB ten times the power.
  it('has each level with its power and its volts', () => {
    const { ticks, from, to } = ruleScale(worked({ dbm: '0' }), 720);
    expect([from, to]).toEqual([-30, 30]);
    const at = (db: number) => ticks.find((tick) => tick.db === db)?.words;
    expect(at(0)).toEqual(['0', '1 mW', '224 mV']);
    expect(at(-10)).toEqual(['−10', '100 µW', '70.7 mV']);
  });

  it('has no more figures than there is room for', () => {
    expect(ruleScale(worked({ dbm: '0' }), 200).ticks.map(({ db }) => db)).toEqual([-20, 0, 20]);
    expect(ruleScale(worked({ dbm: '3' }), 200).ticks.map(({ db }) => db)).toEqual([-30, 0, 30]);
  });

  it('of a ratio has powers and voltages', () => {
    const { ticks, rows } = ruleScale(worked({ calculation: 'ratio', ratioDb: '20' }), 720);
    expect(rows).toEqual(['dB', 'Powers', 'Voltages']);
    expect(ticks.find(({ db }) => db === 20)?.words).toEqual(['+20', '100', '10']);
  });

  it('goes to the ends of what there is without failing', () => {
    expect(ruleScale(worked({ dbm: '-299' }), 720).ticks.length).toBeGreaterThan(2);
    expect(ruleScale(worked({ dbm: '299' }), 720).ticks.length).toBeGreaterThan(2);
  });

  it('puts the words of marks that meet above one another', () => {
    expect(markRows([100, 150, 400], 104)).toEqual([1, 0, 0]);
    expect(markRows([150, 100, 210], 104)).toEqual([1, 0, 0]);
    expect(markRows([7, 7, 7], 104)).toEqual([0, 1, 2]);
  });
});

it('every conversion starts with a result, and a text of it without gaps', () => {
  for (const { value } of INPUTS.calculation.options) {
    const text = sheetText(worked({ calculation: value }));
    expect(text.split('\n').length).toBeGreaterThan(4);
    expect(text).not.toMatch(/NaN|Infinity|undefined/);
  }
});
