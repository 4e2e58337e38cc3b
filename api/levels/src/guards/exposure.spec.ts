import fc from 'fast-check';
import exposureTable from '../../reference/rf-exposure.json';
import { within, withinRel } from '../../testing/within';
import {
  densityAt,
  densityOfField,
  exposureDistances,
  exposureExemption,
  exposureLimit,
  exposureSum,
  ICNIRP_EXPOSURE,
  isExemptByPower,
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

  it.each(['duty-2', 'duty-5', 'duty-6', 'duty-7'])('%s: average power of a published case', (id) => {
    const row = exposureTable.averaging.find((known) => known.id === id);
    const { PEP_W = NaN, mode_duty = NaN, on_fraction = NaN } = row?.inputs ?? {};
    const station = {
      frequencyHertz: 14.2e6,
      peakWatts: PEP_W,
      modeDuty: mode_duty,
      feedLossDb: 0,
      gainDbi: 2.15,
    };
    const part = { controlled: on_fraction, uncontrolled: on_fraction };
    const found = exposureDistances({
      ...station,
      onFraction: part,
      reflectionFactor: 1,
      limits: US_EXPOSURE,
    });
    withinRel(found.controlled.averageWatts, Number(row?.expected.average_W), 0.01);
  });

  const other = (id: string) => exposureTable.other.find((row) => row.id === id);

  it('ex-1mW: a milliwatt on average is exempt at any distance, and no more', () => {
    const watts = (other('ex-1mW')?.inputs.available_max_time_averaged_mW ?? NaN) / 1000;
    expect(isExemptByPower(watts)).toBe(other('ex-1mW')?.expected.exempt);
    expect(isExemptByPower(watts * 1.001)).toBe(false);
  });

  it('multi: parts of the limit add up, and over 1 the sources are not exempt', () => {
    const { fractions = [] } = other('multi')?.inputs ?? {};
    const found = exposureSum(fractions);
    within(found.sum, other('multi')?.expected.sum ?? NaN, 1e-9);
    expect([found.isWithinLimits, found.left]).toEqual([other('multi')?.expected.exempt, 0]);
    expect(exposureSum([0.4, 0.35, 0.25])).toMatchObject({ isWithinLimits: true });
    // In binary fractions these add up to a little less than 1, which leaves nothing all the same.
    expect(exposureSum([0.7, 0.2, 0.1]).left).toBe(0);
    within(exposureSum([0.4, 0.35]).left, 0.25, 1e-12);
  });

  it('plane-wave: 61.4 V/m is the 1 mW/cm² the table rounds to', () => {
    const row = other('plane-wave');
    withinRel(densityOfField(row?.inputs.E_V_per_m ?? NaN), row?.expected.S_mW_cm2 ?? NaN, 1e-3);
    const { expected } = exposureTable.limits.find(({ id }) => id === 'mpe-u-30') ?? {};
    withinRel(densityOfField(Number(expected?.E_V_per_m)), Number(expected?.S_mW_cm2), 5e-3);
  });

  it.each(exposureTable.exemption.filter(({ id }) => id.startsWith('ex-tab')))(
    '$id: $expected.threshold_ERP_W',
    (row) => {
      const [low = NaN, high = NaN] = [row.inputs.f_MHz].flat();
      const megahertz = Math.sqrt(low * high);
      const metres = 2 * exposureExemption(megahertz * 1e6, 1, 0).nearFieldMetres;
      // '3450 R^2/f^2', '0.0128 R^2 f' or '3.83 R^2'.
      const [factor = '', ...powers] = String(row.expected.threshold_ERP_W).split(' ');
      const text = powers.join(' ');
      const ofF = text.endsWith('/f^2') ? megahertz ** -2 : text.endsWith(' f') ? megahertz : 1;
      const { thresholdErpWatts, isApplicable } = exposureExemption(megahertz * 1e6, metres, 0);
      withinRel(thresholdErpWatts, Number(factor) * ofF * metres ** 2, 1e-9);
      expect(isApplicable).toBe(true);
      expect(exposureExemption(megahertz * 1e6, 0.49 * metres, 0).isApplicable).toBe(false);
    },
  );

  it('erp-eirp: a dipole gathers 1.64 times', () => {
    withinRel(radiatedPower({ peakWatts: 1 }).eirpWatts, 1.64, 1e-3);
  });
});

// ICNIRP, Health Physics 118 (2020) 483: Table 5 from memory. Its Table 6, for parts of the body, was read in a public
// reprint and lies a factor of 5 in power, √5 in field, above Table 5: 671/f^0.7 V/m and 1504/f^0.7 V/m below 30 MHz,
// 10 and 50 W/m² up to 400 MHz.
describe('exposure against the guidelines of ICNIRP of 2020', () => {
  const limitAt = (tier: 'controlled' | 'uncontrolled', megahertz: number) =>
    exposureLimit(ICNIRP_EXPOSURE, tier, megahertz * 1e6);

  it.each([
    ['uncontrolled', 671, 0.005],
    // Rounded there to 4 %.
    ['controlled', 1504, 0.04],
  ] as const)('%s, below 30 MHz: a fifth of what a part of the body may have', (tier, local, rel) => {
    for (const megahertz of [1.9, 3.6, 7.1, 14.2, 28.5])
      withinRel(limitAt(tier, megahertz), densityOfField(local / megahertz ** 0.7) / 5, rel);
  });

  it('from 30 to 400 MHz: 2 and 10 W/m², a fifth of 10 and 50', () => {
    within(limitAt('uncontrolled', 50.1), 0.2, 1e-12);
    within(limitAt('controlled', 50.1), 1, 1e-12);
    within(limitAt('uncontrolled', 900), 0.45, 1e-12);
    within(limitAt('controlled', 900), 2.25, 1e-12);
  });

  it('keeps the magnetic field within 2.2/f A/m and 4.9/f A/m too, for a plane wave', () => {
    for (let megahertz = 0.2; megahertz < 30; megahertz += 0.1) {
      const density = (amperesPerMetre: number) => (377 * amperesPerMetre ** 2) / 10;
      expect(limitAt('uncontrolled', megahertz)).toBeLessThanOrEqual(density(2.2 / megahertz) * 1.001);
      expect(limitAt('controlled', megahertz)).toBeLessThanOrEqual(density(4.9 / megahertz) * 1.001);
    }
  });

  it('joins its rows and averages over 30 minutes for both', () => {
    for (const tier of ['controlled', 'uncontrolled'] as const)
      for (const edge of [400, 2000]) withinRel(limitAt(tier, edge - 1e-6), limitAt(tier, edge), 1e-6);
    expect(ICNIRP_EXPOSURE.averagingMinutes).toEqual({ controlled: 30, uncontrolled: 30 });
  });
});
