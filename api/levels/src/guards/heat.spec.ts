import thermalTable from '../../reference/thermal-and-supply.json';
import { within, withinRel } from '../../testing/within';
import {
  classBEfficiency,
  classBHeat,
  deratedWatts,
  heatChain,
  loadForPower,
  sinkNeeded,
  supplyBalance,
  supplyDropVolts,
} from '../index';

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

  const row = (id: string) => thermalTable.efficiency.find((known) => known.id === id)?.expected;

  it('class-A-R, class-AB: a resistor halves class A again, and AB lies between A and B', () => {
    const bound = (amplifierClass: 'A' | 'A, resistor fed' | 'AB' | 'B') =>
      supplyBalance({ volts: 10, amperes: 1, outputWatts: 2, amplifierClass }).greatestEfficiency;
    within(bound('A, resistor fed'), row('class-A-R')?.max_efficiency ?? NaN, 1e-6);
    const [low = NaN, high = NaN] = row('class-AB')?.between ?? [];
    expect([bound('A'), bound('B')]).toEqual([low, expect.closeTo(high, 6) as number]);
  });

  it('class-B-two-tone, class-B-diss: efficiency of two tones, and the hottest level of all', () => {
    const { worstWatts, worstSwing, twoToneEfficiency, twoToneWatts } = classBHeat(100);
    within(twoToneEfficiency, row('class-B-two-tone')?.average_efficiency ?? NaN, 1e-6);
    within(worstWatts / 100, row('class-B-diss')?.ratio ?? NaN, 1e-6);
    within(worstSwing, row('class-B-diss')?.at_V_over_Vmax ?? NaN, 1e-6);
    within(50 / (50 + twoToneWatts), twoToneEfficiency, 1e-12);
  });

  it('a class-B stage is nowhere hotter than at its worst, by its own efficiency at every level', () => {
    const { worstWatts, worstSwing } = classBHeat(100);
    const heat = (swing: number) => (100 * swing ** 2) / classBEfficiency(swing) - 100 * swing ** 2;
    for (let swing = 0.01; swing <= 1; swing += 0.01)
      expect(heat(swing)).toBeLessThanOrEqual(worstWatts + 1e-9);
    within(heat(worstSwing), worstWatts, 1e-9);
  });

  it.each(thermalTable.wires)('$id: what a pair of wires loses', ({ inputs, expected, tolerance }) => {
    const wire = { lengthMetres: inputs.length_m_one_way, areaSquareMetres: inputs.area_mm2 * 1e-6 };
    withinRel(supplyDropVolts({ ...wire, amperes: inputs.I_A }), expected.drop_V, tolerance.rel);
    withinRel(supplyDropVolts({ ...wire, amperes: 1 }), expected.R_loop_ohm, tolerance.rel);
  });

  // IEC 60228 states at most 4.95 ohm for a kilometre of 4 mm² of stranded copper, 7.98 of 2.5 mm² (class 5, from
  // memory); solid pure copper of the nominal section lies some 13 % under.
  it.each([
    [4, 4.95],
    [2.5, 7.98],
  ])('a pair of %d mm² loses a little less than its cable may', (area, ohmsPerKilometre) => {
    const volts = supplyDropVolts({ amperes: 20, lengthMetres: 2, areaSquareMetres: area * 1e-6 });
    const allowed = 20 * 2 * 2 * (ohmsPerKilometre / 1000);
    expect(volts).toBeLessThan(allowed);
    expect(volts).toBeGreaterThan(0.8 * allowed);
  });
});
