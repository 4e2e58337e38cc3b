import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { workPad, type WorkedPad } from './figures';
import { INPUTS } from './inputs';
import { answerCells, inText, partsText, returnLossText } from './words';

/** As typed on the page. */
function worked(texts: Record<string, string> = {}): WorkedPad {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return workPad(read.values);
}

const ohmsOf = ({ rows }: WorkedPad) => rows.map(({ ohms }) => ohms);

describe('a pad worked out from what was typed', () => {
  // Public 50 ohm pad table, 3 dB row: pi 292 and 17.6, tee 8.55 and 142, bridge 20.6 and 121.
  it.each([
    ['pi', [292.4, 17.61, 292.4]],
    ['tee', [8.55, 141.9, 8.55]],
    ['bridged tee', [50, 20.63, 121.2, 50]],
  ])('of 3 dB as a %s has the resistors of the tables', (kind, expected) => {
    const exact = worked({ kind }).rows.map(({ exactOhms }) => Number(exactOhms.toPrecision(4)));
    expect(exact).toEqual(expected);
  });

  // Textbook: series √(75·25) = 43.30, shunt 50·√3 = 86.60, 5.72 dB.
  it('of least loss from 75 to 50 ohm needs no attenuation typed', () => {
    const pad = worked({ kind: 'minimum loss', sourceOhms: '75', series: 'E96' });
    expect(pad.rows.map(({ exactOhms }) => exactOhms.toFixed(2))).toEqual(['43.30', '86.60']);
    expect(pad.design.exact.lossDb).toBeCloseTo(5.7195, 3);
  });

  // Chain matrices of 300, 18, 300 ohm between 50 ohm, worked separately: 2.9946 dB, 44.578 dB.
  it('tells what the nearest values really give', () => {
    const pad = worked();
    expect(ohmsOf(pad)).toEqual([300, 18, 300]);
    expect(pad.design.fitted.lossDb).toBeCloseTo(2.9946, 3);
    expect(pad.design.fitted.input.returnLossDb).toBeCloseTo(44.578, 2);
    expect(pad.levels?.outDbm).toBeCloseTo(10 - 2.9946, 3);
  });

  it('makes up a value from two parts only as they are wanted', () => {
    const arrangements = (parts: string) =>
      new Set(worked({ parts, enoughRel: '0' }).rows.map(({ fitted }) => fitted.arrangement));
    expect(arrangements('one')).toEqual(new Set(['one part']));
    expect(arrangements('parallel')).toEqual(new Set(['parallel']));
    expect(arrangements('series')).toEqual(new Set(['series']));
  });

  it('loses no power: what the resistors, the load and the way back take is all of it', () => {
    for (const kind of ['pi', 'tee', 'bridged tee']) {
      const { design, shares } = worked({ kind, series: 'E12', lossDb: '7' });
      const heat = design.fitted.dissipationShares.reduce((sum, share) => sum + share, 0);
      expect(heat + shares.load + shares.back).toBeCloseTo(1, 9);
      // What goes back is what the return loss says.
      expect(shares.back).toBeCloseTo(10 ** (-(design.fitted.input.returnLossDb ?? Infinity) / 10), 9);
    }
  });

  it('takes the power as a level or in watts', () => {
    expect(worked({ inputDbm: '37' }).inputWatts).toBeCloseTo(5.0119, 3);
    expect(worked({ told: 'watts', inputWatts: '5' }).levels?.inDbm).toBeCloseTo(36.9897, 3);
    expect(worked({ told: 'watts', inputWatts: '0' }).levels).toBeUndefined();
  });

  it('refuses a level beyond what a pad is worked out for, at the field that was typed', () => {
    expect(() => worked({ inputDbm: '95' })).toThrow(expect.objectContaining({ input: 'inputDbm' }));
  });
});

describe('the rating to buy', () => {
  // 10 dB tee in 50 ohm, table of pads: 0.51949, 0.32856 and 0.05195 W for each watt; at most half a rating is used.
  it('is the next above twice the heat, resistor by resistor', () => {
    const pad = worked({ kind: 'tee', lossDb: '10', told: 'watts', inputWatts: '1', series: 'E96' });
    expect(pad.rows.map(({ rating }) => rating.ratingWatts)).toEqual([2, 1, 0.125]);
    expect(pad.hottest.name).toBe('R1');
  });

  it('follows the part of a rating that is typed', () => {
    const all = worked({ kind: 'tee', lossDb: '10', told: 'watts', inputWatts: '1', derating: '100' });
    expect(all.rows.map(({ rating }) => rating.ratingWatts)).toEqual([1, 0.5, 0.125]);
  });

  it('says so when no one resistor stands it', () => {
    const pad = worked({ lossDb: '20', told: 'watts', inputWatts: '2k' });
    expect(answerCells(pad).at(-1)).toMatchObject({ figure: 'none', tone: 'caution' });
    expect(answerCells(pad).at(-1)?.words).toMatch(/share it among several/);
  });
});

describe('a pad in words', () => {
  it('names two parts with their unit once, unless they differ', () => {
    expect(partsText({ fitted: { parts: [150, 75], arrangement: 'parallel', value: 50, errorRel: 0 } })).toBe(
      '150 and 75 ohm in parallel',
    );
    expect(
      partsText({ fitted: { parts: [2000, 51], arrangement: 'parallel', value: 49.7, errorRel: 0 } }),
    ).toBe('2 kohm and 51 ohm in parallel');
  });

  it('gives no return loss beyond what a bench can see', () => {
    expect(returnLossText(44.578)).toBe('44.6 dB');
    expect(returnLossText(87)).toBe('over 60 dB');
    expect(returnLossText(undefined)).toBe('no reflection');
  });

  // Limits over ± 5 %: all eight corners of the pi's voltage dividers, worked separately, 2.850 to 3.147 dB and 34.87 dB.
  it('is a text to paste', () => {
    expect(inText(worked()).split('\n')).toEqual([
      'Pi pad between 50 ohm and 50 ohm, E24, ± 5 %:',
      'R1, in to ground: 300 ohm (exact 292.4 ohm), 1.69 mW, rating 0.125 W',
      'R2, in to out: 18 ohm (exact 17.61 ohm), 2.46 mW, rating 0.125 W',
      'R3, out to ground: 300 ohm (exact 292.4 ohm), 836 µW, rating 0.125 W',
      'Really gives 2.99 dB, 2.85 to 3.15 dB at worst.',
      'Return loss at the source 44.6 dB, 34.9 dB at worst; at the load 44.6 dB, 34.9 dB at worst.',
      'In +10.00 dBm (10 mW), out +7.01 dBm.',
    ]);
  });
});
