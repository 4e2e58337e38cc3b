import { describe, expect, it } from 'vitest';
import { readValues } from '../inputs/read-values';
import { INPUTS } from './inputs';
import { added, moved, stagesOf, stagesText, withTyped, without } from './stages';
import { problemIn, work } from './work';
import { inText, twoToneRows } from './words';

function worked(texts: Record<string, string>) {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return work(read.values);
}

describe('stages in an address', () => {
  const stages = stagesOf('Mixer_-6.5_2*Pre-driver_20,5');

  it('come back as they were typed', () => {
    expect(stagesText(stagesOf(INPUTS.stages.start))).toBe(INPUTS.stages.start);
    expect(stagesText(stages)).toBe('Mixer_-6.5_2*Pre-driver_20,5');
    expect(stagesOf(stagesText(withTyped(stages, 1, 'noiseFigureDb', '5 dB')))[1]).toMatchObject({
      gainDb: '20,5',
      noiseFigureDb: '5 dB',
    });
  });

  it('are not parted by what somebody types', () => {
    const typed = withTyped(stages, 0, 'name', 'A*B_C');
    expect(stagesOf(stagesText(typed)).map(({ name }) => name)).toEqual(['A B C', 'Pre-driver']);
  });

  it('are added at the end, taken out and moved', () => {
    const names = (list: readonly { name: string }[]) => list.map(({ name }) => name);
    expect(names(added(stages))).toEqual(['Mixer', 'Pre-driver', 'Stage 3']);
    expect(names(without(stages, 0))).toEqual(['Pre-driver']);
    expect(names(moved(stages, 0, 1))).toEqual(['Pre-driver', 'Mixer']);
    expect(names(moved(stages, 1, -1))).toEqual(['Pre-driver', 'Mixer']);
  });
});

describe('a chain', () => {
  it('starts as the club’s plan: 5 W out, least headroom at the power amplifier', () => {
    // Larkmoor Twenty: −18 dBm at TP4, +37 dBm at TP11, limit +39 dBm where +37.5 dBm is planned.
    const chain = worked({});
    expect(chain.whole.peakDbm).toBeCloseTo(37, 9);
    expect(chain.leastHeadroom).toMatchObject({ name: 'Power amplifier', headroomDb: 1.5 });
    expect(inText(chain)).not.toMatch(/NaN|undefined|Infinity/);
  });

  it('has the noise figure of Friis’ formula', () => {
    // H. T. Friis (1944): F = F1 + (F2 − 1)/G1; 6 dB of loss before 4 dB is 10 dB.
    expect(worked({ stages: 'Pad_-6*Amplifier_20__4' }).whole.noiseFigureDb).toBeCloseTo(10, 9);
    expect(worked({ stages: 'Pad_-6*Amplifier_20' }).whole.noiseFigureDb).toBeUndefined();
  });

  it('tells two tones of its peak power, each 6.02 dB under it, their products by the intercept', () => {
    // IM3 = −2·(OIP3 − P): tones of +31 dBm against +50 dBm are 38 dB up on their products; PEP is 4 × each tone.
    const chain = worked({ inputDbm: String(31 + 20 * Math.log10(2)), stages: 'Amplifier_0___50' });
    expect(chain.twoTone?.intermodulationDbc).toBeCloseTo(-38, 6);
    expect(chain.twoTone?.belowPeakDb).toBeCloseTo(44.02, 2);
    // 2·f1 − f2 and 2·f2 − f1, by hand.
    expect(twoToneRows(chain)).toContainEqual({
      name: 'Third-order products at',
      figure: '14.1995 and 14.2031 MHz',
    });
  });

  it('has no products where the tones are at the intercept', () => {
    expect(worked({ inputDbm: '60', stages: 'Amplifier_0___50' }).twoTone).toBeUndefined();
  });

  it('keeps its peaks and lowers its average with the signal', () => {
    // OET Bulletin 65, Supplement B, Table 2: speech without processing averages a fifth of its peak, 6.99 dB.
    const { whole } = worked({ signal: 'speech' });
    expect(whole.peakDbm - whole.averageDbm).toBeCloseTo(6.99, 2);
    expect(whole.peakDbm).toBeCloseTo(37, 9);
  });

  it('says where a level went', () => {
    // By hand: −27.3 + 18.2 = −9.1 dB where −6 dB was planned, 3.1 dB more; −27.3 against −24 dBm, 3.3 dB missing.
    const stages = 'Modulator_0_2_____-18.2_0.4*Crystal filter_-6_2_____-27.3_0.4';
    expect(worked({ stages }).shortfall).toBe(
      '3.3 dB are missing at the Crystal filter. The Crystal filter takes 3.1 dB more than planned; the stage before it is inside.',
    );
    expect(worked({ stages }).stages.map(({ verdict }) => verdict)).toEqual(['pass', 'not yet']);
  });

  it('names the field of the stage that keeps it from being worked out', () => {
    expect(problemIn('A_3*B_')).toEqual({ 'stages[1].gainDb': 'Gain of B: a number is needed, 0 for none.' });
    expect(Object.keys(problemIn('A_3__-2'))).toEqual(['stages[0].noiseFigureDb']);
    expect(Object.keys(problemIn('A_lots'))).toEqual(['stages[0].gainDb']);
    expect(problemIn(INPUTS.stages.start)).toEqual({});
    expect(() => worked({ stages: 'A_3__-2' })).toThrow(expect.objectContaining({ input: 'stages' }));
  });
});
