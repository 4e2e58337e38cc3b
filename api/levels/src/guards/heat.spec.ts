import thermalTable from '../../reference/thermal-and-supply.json';
import { within, withinRel } from '../../testing/within';
import { classBEfficiency, deratedWatts, heatChain, loadForPower, sinkNeeded, supplyBalance } from '../index';

// Values, tolerances and sources: api/levels/reference/spurious.json, rf-exposure.json and thermal-and-supply.json, each
// row with its own source.

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
