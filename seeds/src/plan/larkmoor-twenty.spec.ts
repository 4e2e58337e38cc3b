import { disagreementsOf } from '@ferrite-row/api/plans/plans.rules';
import { dBm, dbmFromWatts, wattsFromDbm, watts } from '@ferrite-row/levels';
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
    expect(power?.low).toBeGreaterThanOrEqual(wattsFromDbm(dBm(36)));
    expect(power?.high).toBeLessThanOrEqual(wattsFromDbm(dBm(38)));
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
