import fc from 'fast-check';
import exposureTable from '../../reference/rf-exposure.json';
import { within, withinRel } from '../../testing/within';
import {
  densityAt,
  exposureDistances,
  exposureExemption,
  exposureLimit,
  MODE_DUTY,
  onFraction,
  radiatedPower,
  US_EXPOSURE,
} from '../index';

// Values, tolerances and sources: api/levels/reference/spurious.json, rf-exposure.json and thermal-and-supply.json, each
// row with its own source.

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
