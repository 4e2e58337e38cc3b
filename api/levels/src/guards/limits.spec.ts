import fc from 'fast-check';
import exposureTable from '../../reference/rf-exposure.json';
import spuriousTable from '../../reference/spurious.json';
import thermalTable from '../../reference/thermal-and-supply.json';
import { errorOf } from '../../testing/error-of';
import { within, withinRel } from '../../testing/within';
import {
  classBEfficiency,
  densityAt,
  deratedWatts,
  exposureDistances,
  exposureExemption,
  exposureLimit,
  harmonicFilterFor,
  heatChain,
  idealAttenuationDb,
  instrumentGuard,
  judgeSpurs,
  loadForPower,
  MODE_DUTY,
  onFraction,
  OutOfDomainError,
  radiatedPower,
  rippleFromReturnLoss,
  sinkNeeded,
  spuriousLimit,
  type SpuriousRuleId,
  supplyBalance,
  US_EXPOSURE,
} from '../index';

// Values, tolerances and sources: api/levels/reference/spurious.json, rf-exposure.json and thermal-and-supply.json, each
// row with its own source.

describe('spurious limits against the rules’ own points', () => {
  it.each(spuriousTable.check_points)('$id', ({ inputs, expected, tolerance }) => {
    const published: [SpuriousRuleId, { min_dB: number; max_spur_W?: number }][] = [
      ['US below 30 MHz', expected['97.307(d)_after_2003']],
      ['US below 30 MHz, before 2003', expected['97.307(d)_2003_or_before']],
      ['US 30 to 225 MHz', expected['97.307(e)_30_225MHz']],
      ['ITU below 30 MHz', expected.ITU_below_30MHz],
      ['ITU above 30 MHz', expected.ITU_above_30MHz],
    ];
    for (const [rule, { min_dB: minimum, max_spur_W: most }] of published) {
      const limit = spuriousLimit(rule, inputs.P_W);
      within(limit.attenuationDb, minimum, tolerance.dB);
      if (most !== undefined) withinRel(limit.greatestWatts, most, tolerance.rel);
    }
  });

  it('itu-const: 43 + 10 log P is −13 dBm until 5.01 W, where 50 dB begin', () => {
    within(spuriousLimit('ITU below 30 MHz', 2).greatestDbm, -13, 0.01);
    expect(spuriousLimit('ITU below 30 MHz', 5.01).attenuationDb).toBeLessThan(50);
    expect(spuriousLimit('ITU below 30 MHz', 5.02).attenuationDb).toBe(50);
  });

  it.each(spuriousTable.application)('$id: spurs of a transmitter', ({ inputs, expected, tolerance }) => {
    const spurs = inputs.spurs.map(({ dBc }) => ({ dbc: dBc }));
    const us = judgeSpurs(spuriousLimit('US below 30 MHz', inputs.P_W), spurs);
    const itu = judgeSpurs(spuriousLimit('ITU below 30 MHz', inputs.P_W), spurs);
    expected.rows.forEach((row, index) => {
      within(us[index]?.marginDb, row.us_margin_dB, tolerance.dB);
      within(itu[index]?.marginDb, row.itu_margin_dB, tolerance.dB);
      expect(us[index]?.verdict === 'pass').toBe(row.us_ok);
      expect(itu[index]?.verdict === 'pass').toBe(row.itu_ok);
    });
  });

  it('never pass when the uncertainty reaches over the limit, and ask the filter for it too', () => {
    const dbc = fc.double({ min: -90, max: 0, noNaN: true });
    const uncertainty = fc.double({ min: 0, max: 5, noNaN: true });
    fc.assert(
      fc.property(dbc, uncertainty, (level, expandedUncertaintyDb) => {
        const [spur] = judgeSpurs({ attenuationDb: 43 }, [{ dbc: level, expandedUncertaintyDb }]);
        expect(spur?.verdict === 'pass').toBe(level + expandedUncertaintyDb <= -43);
        expect((spur?.neededDb ?? NaN) === 0).toBe(level + expandedUncertaintyDb <= -43);
      }),
    );
  });
});

describe('the harmonic filter asked for', () => {
  const needs = [
    { harmonic: 2, neededDb: 22 },
    { harmonic: 3, neededDb: 33 },
    { harmonic: 4, neededDb: 12 },
  ];
  const wanted = { carrierHertz: 14e6, cutoffHertz: 15.5e6, rippleDb: rippleFromReturnLoss(20), needs };

  it('is the least that takes each harmonic', () => {
    const filter = harmonicFilterFor(wanted);
    expect(filter?.order).toBe(5);
    needs.forEach(({ neededDb }, index) =>
      expect(filter?.takenDb[index] ?? 0).toBeGreaterThanOrEqual(neededDb),
    );
    const three = idealAttenuationDb({ family: 'Chebyshev', order: 3, rippleDb: wanted.rippleDb }, 28 / 15.5);
    expect(three).toBeLessThan(22);
  });

  it('is none when nine elements do not do', () => {
    expect(harmonicFilterFor({ ...wanted, needs: [{ harmonic: 2, neededDb: 120 }] })).toBeUndefined();
  });
});

describe('an instrument guarded', () => {
  it('is harmed at its damage level, short of room under it, and neither far below', () => {
    const at = (levelDbm: number) => instrumentGuard({ levelDbm, damageDbm: 30 }).state;
    expect([at(30), at(29.9), at(20.1), at(20), at(-10)]).toEqual([
      'would harm',
      'little room',
      'little room',
      'under the limit',
      'under the limit',
    ]);
  });

  it('is told the power each pad takes: 100 W into an analyzer that stands 1 W', () => {
    const { pads, state } = instrumentGuard({ levelDbm: 50, damageDbm: 30 });
    expect(state).toBe('would harm');
    expect(pads).toEqual([{ lossDb: 30, inputWatts: expect.closeTo(100, 9) as number, ratingWatts: 250 }]);
  });

  it('keeps its room behind the pads named, whatever the level', () => {
    const level = fc.double({ min: -30, max: 70, noNaN: true });
    const inLine = fc.double({ min: 0, max: 40, noNaN: true });
    fc.assert(
      fc.property(
        level,
        inLine,
        fc.double({ min: 0, max: 3, noNaN: true }),
        (levelDbm, padsInLineDb, plusMinusDb) => {
          const input = { levelDbm, damageDbm: 20, padsInLineDb, plusMinusDb };
          const { pads } = instrumentGuard(input);
          const added = pads.reduce((sum, { lossDb }) => sum + lossDb, 0);
          const after = instrumentGuard({ ...input, padsInLineDb: padsInLineDb + added });
          expect(after.state).toBe('under the limit');
          expect(after.pads).toEqual([]);
        },
      ),
    );
  });

  it('needs a capacitor against a direct voltage it does not stand, whatever the level', () => {
    const bias = { levelDbm: -20, damageDbm: 30, directVolts: -50, greatestDirectVolts: 25 };
    expect(instrumentGuard(bias)).toMatchObject({ state: 'would harm', needsBlock: true, pads: [] });
    expect(instrumentGuard({ ...bias, directVolts: 12 }).needsBlock).toBe(false);
  });
});

describe('exposure against 47 CFR 1.1310 and OET Bulletin 65', () => {
  it.each(exposureTable.limit_values)('$id', ({ inputs, expected, tolerance }) => {
    const hertz = inputs.f_MHz * 1e6;
    withinRel(exposureLimit(US_EXPOSURE, 'controlled', hertz), expected.controlled_mW_cm2, tolerance.rel);
    withinRel(exposureLimit(US_EXPOSURE, 'uncontrolled', hertz), expected.uncontrolled_mW_cm2, tolerance.rel);
    within(exposureExemption(hertz, 1, 1).nearFieldMetres, expected.lambda_over_2pi_m, 1e-3);
  });

  it.each(exposureTable.limits)('$id: a row of the table', ({ inputs, expected }) => {
    const tier = inputs.tier === 'occupational/controlled' ? 'controlled' : 'uncontrolled';
    const [low = NaN, high = NaN] = inputs.f_MHz;
    const f = Math.sqrt(low * high);
    // The table prints '900/f^2 *', 'f/300' or a plain number.
    const text = expected.S_mW_cm2.replace(' *', '');
    const [top = '', bottom = '1'] = text.split('/');
    const value = (part: string) => (part === 'f^2' ? f ** 2 : part === 'f' ? f : Number(part));
    withinRel(exposureLimit(US_EXPOSURE, tier, f * 1e6), value(top) / value(bottom), 1e-9);
    expect(US_EXPOSURE.averagingMinutes[tier]).toBe(expected.averaging_min);
  });

  it('duty-tab: averages of the modes', () => {
    expect(MODE_DUTY).toEqual(exposureTable.averaging[0]?.expected);
  });

  it.each<[string, number, number, number, number]>([
    ['duty-1', 2, 2, 6, 200],
    ['duty-3', 7, 7, 6, 300],
    ['duty-4', 7, 7, 30, 160],
  ])('%s: %d min on and %d off, over %d min', (id, on, off, over, watts) => {
    const published = exposureTable.averaging.find((row) => row.id === id)?.expected.average_W;
    within(1500 * 0.2 * onFraction(on, off, over), published ?? NaN, 0.01);
    within(published, watts, 1e-9);
  });

  it('is the worst window there can be, wherever it begins', () => {
    const minutes = fc.integer({ min: 1, max: 12 });
    fc.assert(
      fc.property(
        minutes,
        fc.integer({ min: 0, max: 12 }),
        fc.integer({ min: 1, max: 30 }),
        (on, off, over) => {
          const isOn = (minute: number) => minute % (on + off) < on;
          const windows = Array.from({ length: on + off }, (_value, start) => {
            return Array.from({ length: over }, (_minute, at) => Number(isOn(start + at))).reduce(
              (a, b) => a + b,
              0,
            );
          });
          expect(onFraction(on, off, over)).toBeCloseTo(Math.max(...windows) / over, 9);
        },
      ),
    );
  });

  it.each(exposureTable.density)('$id: density and distances', ({ inputs, expected, tolerance }) => {
    const found = exposureDistances({
      frequencyHertz: inputs.f_MHz * 1e6,
      peakWatts: inputs.PEP_W,
      modeDuty: inputs.mode_duty,
      onFraction: { controlled: inputs.on_fraction, uncontrolled: inputs.on_fraction },
      feedLossDb: inputs.feed_loss_dB,
      gainDbi: inputs.gain_dBi,
      reflectionFactor: inputs.reflection_factor as 1 | 2.56 | 4,
      limits: US_EXPOSURE,
    });
    const { controlled, uncontrolled } = found;
    withinRel(controlled.averageWatts, expected.average_at_antenna_W, tolerance.rel);
    withinRel(controlled.eirpWatts, expected.EIRP_W, tolerance.rel);
    withinRel(densityAt(controlled, inputs.distance_m), expected.S_mW_cm2, tolerance.rel);
    withinRel(densityAt(uncontrolled, inputs.distance_m), expected.S_mW_cm2, tolerance.rel);
    withinRel(controlled.metres, expected.distance_controlled_m, tolerance.rel);
    withinRel(uncontrolled.metres, expected.distance_uncontrolled_m, tolerance.rel);
    expect(inputs.distance_m >= controlled.metres).toBe(expected.ok_controlled);
    expect(inputs.distance_m >= uncontrolled.metres).toBe(expected.ok_uncontrolled);
    expect(inputs.distance_m < controlled.nearFieldMetres).toBe(expected.far_field_note.startsWith('inside'));
  });

  it.each(exposureTable.exemption.filter(({ inputs }) => inputs.R_m !== undefined))('$id', (row) => {
    const { f_MHz: f, R_m: metres = NaN, ERP_W_time_averaged: erp = NaN } = row.inputs;
    const found = exposureExemption(Number(f) * 1e6, metres, erp);
    const tolerance = typeof row.tolerance === 'number' ? NaN : row.tolerance.rel;
    withinRel(found.thresholdErpWatts, Number(row.expected.threshold_ERP_W), tolerance);
    expect([found.isApplicable, found.isExempt]).toEqual([row.expected.applicable, row.expected.exempt]);
  });

  it('erp-eirp: a dipole gathers 1.64 times', () => {
    withinRel(radiatedPower({ peakWatts: 1 }).eirpWatts, 1.64, 1e-3);
  });
});

describe('heat against published chains', () => {
  it.each(thermalTable.junction)('$id', ({ inputs, expected, tolerance }) => {
    const path = {
      watts: inputs.P_W,
      ambientCelsius: inputs.T_ambient_C,
      junctionToCase: inputs.theta_jc,
      caseToSink: inputs.theta_cs,
      greatestJunctionCelsius: inputs.T_j_max_C,
    };
    const found = heatChain(path, inputs.theta_sa);
    within(found.sinkCelsius, expected.T_heatsink_C, tolerance.abs);
    within(found.caseCelsius, expected.T_case_C, tolerance.abs);
    within(found.junctionCelsius, expected.T_junction_C, tolerance.abs);
    within(found.marginKelvin, expected.margin_C, tolerance.abs);
    within(found.greatestWatts, expected.P_max_W, tolerance.abs);
    const { sinkToAir } = sinkNeeded(path);
    if (sinkToAir !== undefined) within(heatChain(path, sinkToAir).marginKelvin, 0, 1e-9);
  });

  it('derate-1, need-1, need-2: derating, and the sink that is needed or cannot be', () => {
    within(deratedWatts(150, 100, 175), 75, 1e-3);
    expect(deratedWatts(150, 200, 175)).toBe(0);
    expect(deratedWatts(150, 0, 175)).toBe(150);
    const path = { watts: 60, ambientCelsius: 40, caseToSink: 0.15, greatestJunctionCelsius: 150 };
    within(sinkNeeded({ ...path, junctionToCase: 0.8 }).sinkToAir, 0.88333, 1e-4);
    const none = sinkNeeded({ ...path, junctionToCase: 1.8 });
    expect([none.isPossible, none.sinkToAir]).toEqual([false, undefined]);
    within(none.leftKelvin / 60, -0.11667, 1e-4);
  });

  it.each(thermalTable.supply.filter(({ id }) => id.startsWith('sup')))(
    '$id',
    ({ inputs, expected, tolerance }) => {
      const found = supplyBalance({
        volts: inputs.Vdc,
        amperes: inputs.Idc_A ?? NaN,
        outputWatts: inputs.P_out_W,
        amplifierClass: 'AB',
      });
      withinRel(found.inputWatts, expected.P_in_W ?? NaN, tolerance.rel);
      withinRel(found.efficiency, expected.efficiency ?? NaN, tolerance.rel);
      withinRel(found.heatWatts, expected.dissipation_W ?? NaN, tolerance.rel);
      expect(found.isPlausible).toBe(expected.plausible_class_AB);
    },
  );

  it.each(thermalTable.supply.filter(({ id }) => !id.startsWith('sup')))('$id: load for a power', (row) => {
    const { inputs, expected, tolerance } = row;
    const isPushPull = expected.RL_collector_to_collector_ohm !== undefined;
    const found = loadForPower(inputs.Vdc, inputs.V_saturation ?? NaN, inputs.P_out_W, isPushPull);
    withinRel(
      found,
      expected.RL_collector_to_collector_ohm ?? expected.RL_single_ended_ohm ?? NaN,
      tolerance.rel,
    );
  });

  it('class-A, class-B, class-B-half-V: bounds of efficiency', () => {
    const stage = { volts: 10, amperes: 1, outputWatts: 6 } as const;
    within(supplyBalance({ ...stage, amplifierClass: 'A' }).greatestEfficiency, 0.5, 1e-6);
    expect(supplyBalance({ ...stage, amplifierClass: 'A' }).isPlausible).toBe(false);
    within(supplyBalance({ ...stage, amplifierClass: 'B' }).greatestEfficiency, 0.785398, 1e-6);
    within(classBEfficiency(0.5), 0.392699, 1e-6);
  });
});

describe('what guards and limits are not asked', () => {
  const path = {
    watts: 40,
    ambientCelsius: 25,
    junctionToCase: 1,
    caseToSink: 0.2,
    greatestJunctionCelsius: 175,
  };
  const station = {
    frequencyHertz: 14.2e6,
    peakWatts: 100,
    modeDuty: 0.4,
    onFraction: { controlled: 1, uncontrolled: 1 },
    feedLossDb: 0,
    gainDbi: 2.15,
    reflectionFactor: 2.56,
    limits: US_EXPOSURE,
  } as const;

  it.each<[string, string, () => unknown]>([
    ['a rule nobody wrote', 'rule', () => spuriousLimit('none' as 'ITU below 30 MHz', 5)],
    ['a carrier without power', 'carrierWatts', () => spuriousLimit('ITU below 30 MHz', 0)],
    ['no spurs', 'spurs', () => judgeSpurs({ attenuationDb: 43 }, [])],
    ['a level that is no number', 'dbc', () => judgeSpurs({ attenuationDb: 43 }, [{ dbc: NaN }])],
    [
      'a cutoff at the harmonic',
      'cutoffHertz',
      () =>
        harmonicFilterFor({
          carrierHertz: 7e6,
          cutoffHertz: 14e6,
          rippleDb: 0.1,
          needs: [{ harmonic: 2, neededDb: 20 }],
        }),
    ],
    ['a damage level that is no number', 'damageDbm', () => instrumentGuard({ levelDbm: 0, damageDbm: NaN })],
    [
      'a direct voltage without its limit',
      'greatestDirectVolts',
      () => instrumentGuard({ levelDbm: 0, damageDbm: 30, directVolts: 12 }),
    ],
    ['no transmission', 'onMinutes', () => onFraction(0, 5, 6)],
    ['more duty than all', 'modeDuty', () => exposureDistances({ ...station, modeDuty: 1.1 })],
    [
      'a frequency under the table',
      'frequencyHertz',
      () => exposureDistances({ ...station, frequencyHertz: 1e5 }),
    ],
    ['a distance of 0', 'distanceMetres', () => exposureExemption(14.2e6, 0, 100)],
    [
      'a junction colder than the air',
      'greatestJunctionCelsius',
      () => heatChain({ ...path, greatestJunctionCelsius: 20 }, 1),
    ],
    [
      'a device without thermal resistance',
      'junctionToCase',
      () => heatChain({ ...path, junctionToCase: 0 }, 1),
    ],
    ['a sink for no heat', 'watts', () => sinkNeeded({ ...path, watts: 0 })],
    [
      'more out than in',
      'outputWatts',
      () => supplyBalance({ volts: 10, amperes: 1, outputWatts: 11, amplifierClass: 'B' }),
    ],
    ['nothing left to swing', 'saturationVolts', () => loadForPower(10, 10, 5)],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
