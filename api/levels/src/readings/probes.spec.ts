import { errorOf } from '../../testing/error-of';
import { simulate } from '../../testing/ngspice';
import { within } from '../../testing/within';
import { diodeProbeReading, type DiodeProbeInput, probeLoading, verdictOf } from '../index';

const probe: DiodeProbeInput = {
  directVolts: 9.7,
  readToVolts: 0.05,
  meterAccuracyRel: 0.01,
  diodeDropVolts: 0.3,
  diodeDropPlusMinusVolts: 0.1,
  loadOhms: 50,
  loadToleranceRel: 0.01,
};

describe('a diode probe', () => {
  it('adds its drop to what the meter shows: 10 V peak in 50 ohm is 1 W', () => {
    const { value, watts, voltsPeakToPeak } = diodeProbeReading(probe);
    within(value, 30, 1e-9);
    within(watts, 1, 1e-9);
    within(voltsPeakToPeak, 20, 1e-9);
  });

  it('made to read rms is told so', () => {
    const found = diodeProbeReading({ ...probe, directVolts: 9.7 / Math.SQRT2, peakPerVolt: Math.SQRT2 });
    within(found.value, 30, 1e-9);
  });

  it('has its limits as parts of the peak, and trusts itself less the lower it reads', () => {
    const { components } = diodeProbeReading(probe);
    const perPart = 20 / Math.LN10;
    within(components[0]?.limit, (0.05 / 10) * perPart, 1e-9);
    within(components[1]?.limit, (0.097 / 10) * perPart, 1e-9);
    within(components[2]?.limit, (0.1 / 10) * perPart, 1e-9);
    const low = diodeProbeReading({ ...probe, directVolts: 0.5, readToVolts: 0.005 });
    expect(low.expandedUncertainty).toBeGreaterThan(3 * diodeProbeReading(probe).expandedUncertainty);
  });

  it('is refused where the drop’s own spread is over a quarter of the peak', () => {
    const error = errorOf(() => diodeProbeReading({ ...probe, directVolts: 0.05, readToVolts: 0.001 }));
    expect(error.input).toBe('diodeDropPlusMinusVolts');
  });
});

describe('a diode probe simulated in ngspice', () => {
  it('shows the peak less a drop that lies where it was assumed, so the level is inside its uncertainty', () => {
    const { shown = NaN } = simulate(
      [
        'V1 emf 0 sin(0 20 7meg)',
        'RS emf load 50',
        'RL load 0 50',
        'C1 load hot 1n',
        'D1 0 hot probe',
        'R1 hot out 10k',
        'C2 out 0 1n',
        'RM out 0 10meg',
        '.model probe D(is=1e-7 n=1.1 rs=10 cjo=0.5p)',
      ],
      ['tran 2n 120u 110u 2n', 'meas tran shown AVG v(out)'],
    );
    const found = diodeProbeReading({ ...probe, directVolts: Math.abs(shown), diodeDropVolts: 0.2 });
    // 10 V peak at the load: the emf's half.
    expect(verdictOf(30, found.expandedUncertainty, { low: 29, high: 31 })).toBe('pass');
    within(found.value, 30, found.expandedUncertainty);
  });
});

describe('a probe’s load on a circuit, simulated in ngspice', () => {
  it.each([
    [25, 10e6, 10e-12],
    [25, 1e6, 100e-12],
    [500, 10e6, 10e-12],
    [5000, 10e6, 3e-12],
  ])('%d ohm, probe of %d ohm and %d F', (circuitOhms, probeOhms, probeFarads) => {
    const { alone = NaN, probed = NaN } = simulate(
      [
        'V1 emf 0 ac 1',
        `R1 emf a ${circuitOhms}`,
        `R2 emf b ${circuitOhms}`,
        `RP b 0 ${probeOhms}`,
        `CP b 0 ${probeFarads}`,
        'RA a 0 1e12',
      ],
      ['ac lin 1 14.1meg 14.1meg', 'let alone = vm(a)', 'let probed = vm(b)', 'print alone probed'],
    );
    const { lossDb, source } = probeLoading({ circuitOhms, probeOhms, probeFarads, frequencyHertz: 14.1e6 });
    within(lossDb, 20 * Math.log10(alone / probed), 1e-3);
    expect(source).toEqual({ name: 'probe loading', limit: lossDb, distribution: 'rectangular' });
  });
});
