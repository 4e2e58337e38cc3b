import fc from 'fast-check';
import table from '../../reference/cascade.json';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { within, withinRel } from '../../testing/within';
import {
  type ChainRow,
  chainOf,
  type ChainStage,
  dBm,
  explainShortfall,
  noiseDbm,
  noiseKelvin,
  OutOfDomainError,
  type PlannedStage,
  secondHarmonicIntercept,
  twoToneFromIntercept,
  twoToneOf,
  twoToneProducts,
  wattsFromDbm,
} from '../index';

// Values, tolerances and sources: api/levels/reference/cascade.json, each row with its own source.

interface Printed {
  n: string;
  G: number;
  NF?: number;
  OIP3?: number | null;
  OP1?: number;
}

const stageOf = ({ n, G, NF, OIP3, OP1 }: Printed): ChainStage => {
  return {
    name: n,
    gainDb: G,
    noiseFigureDb: NF,
    outputInterceptDbm: OIP3 ?? undefined,
    outputCompressionDbm: OP1,
  };
};
const rowsOf = (stages: readonly Printed[]) => chainOf({ inputDbm: -30, stages: stages.map(stageOf) });
const lastOf = (rows: readonly ChainRow[]) => rows[rows.length - 1];

const gain = between(-30, 30);
const stages = fc.array(
  fc.record({
    name: fc.constant('stage'),
    gainDb: gain,
    noiseFigureDb: between(0, 20),
    outputInterceptDbm: between(-10, 60),
    outputCompressionDbm: between(-20, 50),
  }),
  { minLength: 2, maxLength: 8 },
);

const planned = (name: string, plannedDbm: number, measuredDbm?: number, toleranceDb = 2): PlannedStage => {
  return { name, plannedDbm, toleranceDb, measuredDbm, expandedUncertaintyDb: 0.4 };
};

describe('chains against published cascades', () => {
  it.each(table.noise_figure)('$id: noise figure', ({ inputs, expected, tolerance }) => {
    const rows = rowsOf(inputs.stages);
    expected.after_each_stage.forEach(({ G_dB, NF_dB }, index) => {
      within(rows[index]?.totalGainDb, G_dB, tolerance.dB);
      within(rows[index]?.noiseFigureDb, NF_dB, tolerance.dB);
    });
    within(lastOf(rows)?.noiseFigureDb, expected.NF_dB, tolerance.dB);
    withinRel(noiseKelvin(lastOf(rows)?.noiseFigureDb ?? NaN), expected.Te_K, 1e-5);
  });

  it.each(table.intercept)('$id: intercept', ({ inputs, expected, tolerance }) => {
    const last = lastOf(rowsOf(inputs.stages));
    within(last?.inputInterceptDbm, expected.IIP3_dBm_coherent, tolerance.dB);
    within(last?.outputInterceptDbm, expected.OIP3_dBm_coherent, tolerance.dB);
    within(last?.inputInterceptByPowerDbm, expected.IIP3_dBm_incoherent, tolerance.dB);
  });

  it.each(table.compression)('$id: compression, an estimate', ({ inputs, expected, tolerance }) => {
    const last = lastOf(rowsOf(inputs.stages));
    within(last?.inputCompressionDbm, expected.IP1dB_dBm_approx, tolerance.dB);
    within(last?.outputCompressionDbm, expected.OP1dB_dBm_approx, tolerance.dB);
  });

  it.each(table.level_walk)('$id: levels along a chain', ({ inputs, expected, tolerance }) => {
    const stages = expected.stages.map(({ stage, gain_dB }) => ({ name: stage, gainDb: gain_dB }));
    const rows = chainOf({ inputDbm: inputs.start_dBm, stages });
    expected.stages.forEach(({ out_dBm, out_W }, index) => {
      within(rows[index]?.averageDbm, out_dBm, tolerance.dB);
      withinRel(wattsFromDbm(dBm(rows[index]?.averageDbm ?? NaN)), out_W, 1e-5);
    });
  });

  it.each(table.thermal_noise)('$id: thermal noise', ({ inputs, expected, tolerance }) => {
    within(noiseDbm(inputs.B_Hz, inputs.NF_dB, inputs.T_K), expected.noise_dBm, tolerance.dB);
  });

  it.each(table.two_tone)('$id: two equal tones', ({ inputs, expected, tolerance }) => {
    const found = twoToneOf(inputs.each_tone_dBm, inputs.IM3_below_each_tone_dB);
    within(found.outputInterceptDbm, expected.OIP3_dBm, tolerance.dB);
    within(found.intermodulationDbm, expected.IM3_dBm, tolerance.dB);
    within(found.peakDbm, expected.PEP_dBm, tolerance.dB);
    within(found.averageDbm, expected.average_dBm, tolerance.dB);
    within(found.belowPeakDb, expected.IM3_below_PEP_dB, tolerance.dB);
  });

  it('slope-1 to slope-4: the laws of distortion', () => {
    const [at20, at21] = [twoToneFromIntercept(20, 40), twoToneFromIntercept(21, 40)];
    within(at21.intermodulationDbm - at20.intermodulationDbm, 3, 0.01);
    within(at21.intermodulationDbc - at20.intermodulationDbc, 2, 0.01);
    within(at20.intermodulationDbm, -20, 1e-3);
    const { second, third, fifth } = twoToneProducts(14.2e6, 14.2019e6);
    const published = [0.0019, 28.4019, 14.1981, 14.2038, 14.1962, 14.2057];
    [...second, ...third, ...fifth].forEach((hertz, index) =>
      within(hertz / 1e6, published[index] ?? NaN, 1e-7),
    );
    within(secondHarmonicIntercept(30, 30), 60, 1e-3);
  });
});

describe('a chain', () => {
  it('is the same whether two stages are taken apart or as the one they make', () => {
    fc.assert(
      fc.property(stages, (list) => {
        const [first, second, ...others] = list;
        fc.pre(first !== undefined && second !== undefined);
        const [, two] = chainOf({ inputDbm: 0, stages: [first, second] });
        const joined: ChainStage = {
          name: 'both',
          gainDb: first.gainDb + second.gainDb,
          noiseFigureDb: Math.max(two?.noiseFigureDb ?? NaN, 0),
          outputInterceptDbm: two?.outputInterceptDbm,
          outputCompressionDbm: two?.outputCompressionDbm,
        };
        const apart = lastOf(chainOf({ inputDbm: -40, stages: list }));
        const together = lastOf(chainOf({ inputDbm: -40, stages: [joined, ...others] }));
        for (const figure of [
          'averageDbm',
          'noiseFigureDb',
          'outputInterceptDbm',
          'outputCompressionDbm',
        ] as const) {
          expect(together?.[figure]).toBeCloseTo(apart?.[figure] ?? NaN, 6);
        }
      }),
    );
  });

  it('is never better than its worst stage', () => {
    fc.assert(
      fc.property(stages, (list) => {
        const last = lastOf(chainOf({ inputDbm: -40, stages: list }));
        expect(last?.noiseFigureDb ?? NaN).toBeGreaterThanOrEqual((list[0]?.noiseFigureDb ?? NaN) - 1e-9);
        const end = list[list.length - 1]?.outputInterceptDbm ?? NaN;
        expect(last?.outputInterceptDbm ?? NaN).toBeLessThanOrEqual(end + 1e-9);
        expect(last?.inputInterceptDbm ?? NaN).toBeLessThanOrEqual(
          (last?.inputInterceptByPowerDbm ?? NaN) + 1e-9,
        );
      }),
    );
  });

  it('has no figure it was not told the parts of', () => {
    const rows = chainOf({
      inputDbm: -10,
      stages: [
        { name: 'filter', gainDb: -3 },
        { name: 'amplifier', gainDb: 20 },
        { name: 'pad', gainDb: -6 },
      ],
    });
    expect(rows.map(({ noiseFigureDb }) => noiseFigureDb)).toEqual([
      expect.closeTo(3, 9),
      undefined,
      undefined,
    ]);
    const [row] = rows;
    expect([
      row?.inputInterceptDbm,
      row?.outputCompressionDbm,
      row?.headroomDb,
      row?.intermodulationDbc,
    ]).toEqual([undefined, undefined, undefined, undefined]);
  });

  it('judges headroom by the peaks, and two tones by their peak too', () => {
    const [row] = chainOf({
      inputDbm: 17,
      peakOverAverageDb: 3.0103,
      stages: [{ name: 'power amplifier', gainDb: 20, limitDbm: 41, outputInterceptDbm: 53.5 }],
    });
    within(row?.peakDbm, 40.0103, 1e-9);
    within(row?.headroomDb, 0.9897, 1e-9);
    expect(row?.isLow).toBe(true);
    // As two tones of 33.99 dBm each would measure.
    within(row?.intermodulationDbc, twoToneFromIntercept(40.0103 - 6.0206, 53.5).intermodulationDbc, 1e-4);
  });
});

describe('what a chain is not asked for', () => {
  const stage = { name: 'amplifier', gainDb: 20 };

  it.each<[string, string, () => unknown]>([
    ['no stages', 'stages', () => chainOf({ inputDbm: 0, stages: [] })],
    ['an input that is no number', 'inputDbm', () => chainOf({ inputDbm: NaN, stages: [stage] })],
    [
      'a gain that is no number',
      'stages[1].gainDb',
      () => chainOf({ inputDbm: 0, stages: [stage, { ...stage, gainDb: Infinity }] }),
    ],
    [
      'a negative noise figure',
      'stages[0].noiseFigureDb',
      () => chainOf({ inputDbm: 0, stages: [{ ...stage, noiseFigureDb: -1 }] }),
    ],
    [
      'an intercept that is no number',
      'stages[0].outputInterceptDbm',
      () => chainOf({ inputDbm: 0, stages: [{ ...stage, outputInterceptDbm: NaN }] }),
    ],
    [
      'a peak under the average',
      'peakOverAverageDb',
      () => chainOf({ inputDbm: 0, peakOverAverageDb: -1, stages: [stage] }),
    ],
    [
      'levels that run away',
      'level',
      () => chainOf({ inputDbm: 0, stages: Array.from({ length: 20 }, () => stage) }),
    ],
    ['no bandwidth', 'bandwidthHertz', () => noiseDbm(0)],
    ['nothing colder than cold', 'kelvin', () => noiseDbm(1, 0, 0)],
    ['products over their tones', 'belowToneDb', () => twoToneOf(0, -3)],
    ['tones over their intercept', 'eachToneDbm', () => twoToneFromIntercept(41, 40)],
    ['two tones that are one', 'secondHertz', () => twoToneProducts(14e6, 14e6)],
    ['a shortfall nobody measured', 'measuredDbm', () => explainShortfall([planned('A', 0)])],
    ['a negative tolerance', 'stages[0].toleranceDb', () => explainShortfall([planned('A', 0, 0, -1)])],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
