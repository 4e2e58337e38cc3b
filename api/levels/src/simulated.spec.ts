import { simulate } from '../testing/ngspice';
import { analyzerReading, dbFromVoltageRatio, dummyLoadReading, oscilloscopeReading } from './index';

// Circuits simulated in Debian's ngspice (package ngspice). Its numbers know nothing of the formulas on trial: the power
// is integrated over time, the peaks are looked for in the waveform.

const levelOf = (watts: number) => 10 * Math.log10(watts / 1e-3);

/** A 50 ohm source into a 50 ohm load, seen through a compensated ×10 probe (9 M, 12 p) on 1 M, 108 p. */
function scopeAcrossLoad(emfPeak: number, hertz: number) {
  const period = 1 / hertz;
  return simulate(
    [
      `V1 emf 0 sin(0 ${emfPeak} ${hertz})`,
      'RS emf load 50',
      'RL load 0 50',
      'RP load screen 9meg',
      'CP load screen 12p',
      'RI screen 0 1meg',
      'CI screen 0 108p',
      'BP power 0 V=v(load)*v(load)/50',
    ],
    [
      `tran ${period / 500} ${30 * period} ${20 * period} ${period / 500}`,
      'meas tran seen PP v(screen)',
      'meas tran watts AVG v(power)',
    ],
  );
}

describe('an oscilloscope across a load, simulated at 1.8 and 14.1 MHz', () => {
  it.each([
    [1.8e6, 0.66, 0.01],
    [14.1e6, 0.66, 0.01],
    [14.1e6, 0.05, 0.001],
  ])(
    'at %d Hz shows the level that integration over time finds, within 0.01 dB',
    (hertz, emfPeak, voltsPerDivision) => {
      const { seen = NaN, watts = NaN } = scopeAcrossLoad(emfPeak, hertz);
      const reading = oscilloscopeReading({
        voltsPerDivision,
        divisionsPeakToPeak: seen / voltsPerDivision,
        readToDivisions: 0.1,
        probeRatio: 10,
        loadOhms: 50,
      });
      expect(Math.abs(reading.value - levelOf(watts))).toBeLessThan(0.01);
    },
  );

  it('shows the power in a dummy load within 0.2 %', () => {
    const { seen = NaN, watts = NaN } = scopeAcrossLoad(44.7, 7.05e6);
    const input = { voltsPerDivision: 1, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 } as const;
    const reading = dummyLoadReading({ ...input, divisionsPeakToPeak: seen });
    expect(watts).toBeGreaterThan(4.9);
    expect(Math.abs(reading.value / watts - 1)).toBeLessThan(0.002);
  });
});

describe('an analyzer behind a 20 dB pi pad, simulated', () => {
  it('reads the level at the stage, before the pad, within 0.01 dB', () => {
    const { at_stage = NaN, at_analyzer = NaN } = simulate(
      [
        'V1 emf 0 dc 0 ac 1.5',
        'RS emf stage 50',
        'R1 stage 0 61.11',
        'R2 stage out 247.5',
        'R3 out 0 61.11',
        'RIN out 0 50',
      ],
      [
        'ac lin 1 14.1meg 14.1meg',
        'let at_stage = vm(stage)',
        'let at_analyzer = vm(out)',
        'print at_stage at_analyzer',
      ],
    );
    const shown = levelOf(at_analyzer ** 2 / 50);
    const reading = analyzerReading({
      referenceLevelDbm: 0,
      divisionsDown: -shown / 10,
      dbPerDivision: 10,
      readToDivisions: 0.05,
      padsInLineDb: 20,
      amplitudeAccuracyDb: 1,
    });
    expect(shown).toBeLessThan(0);
    expect(Math.abs(reading.value - levelOf(at_stage ** 2 / 50))).toBeLessThan(0.01);
  });
});

describe('what a probe takes from a 50 ohm circuit at 14.1 MHz, simulated', () => {
  function probeLoss(resistance: string, capacitance: string): number {
    const { alone = NaN, probed = NaN } = simulate(
      [
        'V1 emf 0 dc 0 ac 1',
        'RS1 emf a 50',
        'RL1 a 0 50',
        'RS2 emf b 50',
        'RL2 b 0 50',
        `RP b 0 ${resistance}`,
        `CP b 0 ${capacitance}`,
      ],
      ['ac lin 1 14.1meg 14.1meg', 'let alone = vm(a)', 'let probed = vm(b)', 'print alone probed'],
    );
    return dbFromVoltageRatio(alone / probed);
  }

  it('is under 0.01 dB for a ×10 probe of 10 pF, so the budget may leave it out', () => {
    const loss = probeLoss('10meg', '10p');
    expect(loss).toBeGreaterThan(0);
    expect(loss).toBeLessThan(0.01);
  });

  it('is some 0.2 dB for a ×1 probe of 100 pF, so levels are taken at ×10', () => {
    expect(probeLoss('1meg', '100p')).toBeCloseTo(0.2, 1);
  });
});
