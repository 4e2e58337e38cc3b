import { disagreementsOf } from '@ferrite-row/api/plans/plans.rules';
import { dBm, dbmFromWatts, ohms, voltsPeakToPeakFromDbm, watts, wattsFromDbm } from '@ferrite-row/levels';
import { DETECTOR } from '../detector';
import { FREQUENCIES, LEVELS } from './levels';
import { LARKMOOR_TWENTY } from './larkmoor-twenty';

describe('Larkmoor Twenty', () => {
  const checks = LARKMOOR_TWENTY.stages.flatMap((stage) => stage.checks);

  it('meets from stage to stage', () => {
    expect(disagreementsOf(LARKMOOR_TWENTY)).toEqual([]);
  });

  it('has its twelve stages, nine level points and checks of all five kinds', () => {
    expect(LARKMOOR_TWENTY.stages).toHaveLength(12);
    expect(LARKMOOR_TWENTY.stages.flatMap(({ levelPoints = [] }) => levelPoints)).toHaveLength(9);
    expect(checks.length).toBeGreaterThanOrEqual(60);
    expect(new Set(checks.map(({ kind }) => kind)).size).toBe(5);
  });

  it('puts five watts into the load', () => {
    // 10 lg 5000 = 36.99 dBm.
    expect(dbmFromWatts(watts(5))).toBeCloseTo(LEVELS.lowPass.plannedDbm, 1);
    const power = checks.find(({ key }) => key === 'pa-power')?.measure?.window;
    expect(power?.low).toBeGreaterThanOrEqual(wattsFromDbm(dBm(35)));
    expect(power?.high).toBeLessThanOrEqual(wattsFromDbm(dBm(39)));
  });

  const measureOf = (key: string) => checks.find((check) => check.key === key)?.measure;

  it('reads each thing the way a builder would: by tap, envelope, two tones, detector, probe and time base', () => {
    const methods = new Set(checks.flatMap(({ measure }) => (measure ? [measure.method] : [])));
    for (const way of ['dummy-load-tap', 'two-tone-envelope', 'intermodulation', 'log-detector'] as const)
      expect(methods).toContain(way);
    expect(methods).toContain('diode-probe');
    expect(methods).toContain('time-base');
  });

  it('leaves the analyzer a level on the tap far under what harms it', () => {
    const { tapLossDb = 0, padsInLineDb = 0, referenceLevelDbm = 0 } = measureOf('pa-power')?.defaults ?? {};
    const atInput = LEVELS.amplifier.limitDbm - tapLossDb - padsInLineDb;
    // The club's analyzers stand 20 dBm; a mixer is clean to some −20 to −10 dBm (common practice).
    expect(atInput).toBeLessThanOrEqual(-10);
    expect(LEVELS.lowPass.plannedDbm - tapLossDb - padsInLineDb).toBeLessThanOrEqual(referenceLevelDbm);
  });

  it('asks a log detector for a level its line holds for, and a diode probe for one well over its drop', () => {
    const { validFromDbm, validToDbm } = DETECTOR;
    expect(LEVELS.filter.plannedDbm - LEVELS.filter.toleranceDb).toBeGreaterThan(validFromDbm);
    expect(LEVELS.filter.plannedDbm + LEVELS.filter.toleranceDb).toBeLessThan(validToDbm);
    const peak = voltsPeakToPeakFromDbm(dBm(LEVELS.driver.plannedDbm), ohms(50)) / 2;
    expect(peak).toBeGreaterThan(10 * (measureOf('driver-output')?.defaults?.diodeDropVolts ?? Infinity));
  });

  it('tells two tones’ peak as the power of the carrier, and tells the crystal from its overtone', () => {
    expect(measureOf('pa-envelope')?.window).toEqual(measureOf('lowpass-output')?.window);
    const seen = measureOf('carrier-seen');
    expect(seen?.target).toBe(FREQUENCIES.carrier[0] + 100);
    expect(seen?.window.high).toBeLessThan(2 * FREQUENCIES.carrier[0]);
  });

  it('mixes to the 20 metre band, edge to edge, with the carrier outside the filter', () => {
    // Suppressed carrier on the air = local oscillator − carrier oscillator; the band is 14.000 to 14.350 MHz.
    const carrier = 8_868_500;
    expect(FREQUENCIES.oscillatorLowEnd[0] - carrier).toBe(14_000_000);
    expect(FREQUENCIES.oscillatorHighEnd[1] - carrier).toBe(14_350_000);
    expect(FREQUENCIES.carrier[0]).toBeGreaterThan(FREQUENCIES.filterHighEdge[1]);
    const middle =
      (FREQUENCIES.filterLowEdge[0] +
        FREQUENCIES.filterLowEdge[1] +
        FREQUENCIES.filterHighEdge[0] +
        FREQUENCIES.filterHighEdge[1]) /
      4;
    expect(middle).toBeCloseTo(8_867_000, -1);
  });

  it('holds harmonics to what the radio regulations ask at five watts', () => {
    // 43 + 10 lg P, at most 50 dB: 49.99 dB at 5 W.
    const harmonic = checks.find(({ key }) => key === 'pa-harmonic')?.measure?.window;
    expect(-(harmonic?.high ?? 0)).toBeGreaterThanOrEqual(43 + 10 * Math.log10(5));
  });
});
