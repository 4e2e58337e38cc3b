import fc from 'fast-check';
import cascade from '../../reference/cascade.json';
import mixers from '../../reference/mixers.json';
import { errorOf } from '../../testing/error-of';
import { simulate } from '../../testing/ngspice';
import { within } from '../../testing/within';
import {
  analyzerReading,
  diodeProbeReading,
  type DiodeProbeInput,
  dummyLoadTapReading,
  harmonicReading,
  intermodulationReading,
  logDetectorReading,
  type LogDetectorInput,
  oscilloscopeReading,
  OutOfDomainError,
  probeLoading,
  twoToneEnvelopeReading,
  twoToneOf,
  verdictOf,
} from '../index';

const RECTANGULAR = Math.sqrt(3);
const line = { voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5 };
const detector: LogDetectorInput = {
  volts: 1.5,
  readToVolts: 0.005,
  meterAccuracyRel: 0.01,
  calibration: line,
  conformityDb: 1,
  padsInLineDb: 20,
  padToleranceDb: 0.3,
};

describe('a logarithmic detector', () => {
  it('gives the level its slope and intercept say, before the pads', () => {
    expect(logDetectorReading(detector).value).toBeCloseTo(-85 + 1.5 / 0.025 + 20, 12);
  });

  it('has its four limits in its budget, each in decibels', () => {
    const { components, expandedUncertainty } = logDetectorReading(detector);
    const limits = [0.005 / 0.025, (0.01 * 1.5) / 0.025, 1, 0.3];
    components.forEach(({ limit }, index) => within(limit, limits[index] ?? NaN, 1e-12));
    within(expandedUncertainty, (2 * Math.hypot(...limits)) / RECTANGULAR, 1e-12);
  });

  it('may fall with level: the slope is negative, the budget is not', () => {
    const falling = { ...line, voltsPerDb: -0.025, interceptDbm: 15, validFromDbm: -60, validToDbm: 0 };
    const found = logDetectorReading({ ...detector, volts: 1.25, calibration: falling });
    within(found.value, -35 + 20, 1e-9);
    expect(found.components.every(({ limit }) => limit >= 0)).toBe(true);
  });

  it.each([
    ['just in', 0.375, true],
    ['at the top', 2.25, true],
    ['in the noise', 0.374, false],
    ['saturated', 2.251, false],
  ])('%s: %d V is read only where the line holds', (_title, volts, isValid) => {
    const read = () => logDetectorReading({ ...detector, volts });
    if (isValid) expect(read().value).toBeLessThan(30);
    else
      expect(errorOf(read)).toMatchObject({ input: 'volts', permitted: 'at least 0.375 and at most 2.25 V' });
  });

  it('reads its own table by straight lines, in any order, and what the line says where the table is that line', () => {
    const points = [-60, 0, -30].map((dbm) => ({ dbm, volts: (dbm + 85) * 0.025 }));
    fc.assert(
      fc.property(fc.double({ min: -60, max: 0, noNaN: true }), (dbm) => {
        const volts = (dbm + 85) * 0.025;
        const byTable = logDetectorReading({ ...detector, volts, calibration: { points } });
        const byLine = logDetectorReading({ ...detector, volts });
        expect(byTable.value).toBeCloseTo(byLine.value, 9);
        expect(byTable.expandedUncertainty).toBeCloseTo(byLine.expandedUncertainty, 9);
      }),
    );
  });

  it('takes the slope of the stretch it reads in', () => {
    const points = [
      { dbm: -40, volts: 0.5 },
      { dbm: -20, volts: 1 },
      { dbm: 0, volts: 2 },
    ];
    const at = (volts: number) =>
      logDetectorReading({ ...detector, volts, padsInLineDb: 0, calibration: { points } });
    within(at(0.75).value, -30, 1e-9);
    within(at(1.5).value, -10, 1e-9);
    within(at(0.75).components[0]?.limit, 0.005 / 0.025, 1e-12);
    within(at(1.5).components[0]?.limit, 0.005 / 0.05, 1e-12);
    expect(errorOf(() => at(2.01)).input).toBe('volts');
  });

  it.each([
    ['one point', [{ dbm: 0, volts: 1 }]],
    [
      'a level twice',
      [
        { dbm: 0, volts: 1 },
        { dbm: 0, volts: 2 },
      ],
    ],
    [
      'a turn in it',
      [
        { dbm: -10, volts: 1 },
        { dbm: 0, volts: 2 },
        { dbm: 10, volts: 1.5 },
      ],
    ],
  ])('refuses a table with %s', (_title, points) => {
    expect(errorOf(() => logDetectorReading({ ...detector, calibration: { points } })).input).toBe('points');
  });
});

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

describe('two tones', () => {
  const scope = {
    voltsPerDivision: 5,
    divisionsPeakToPeak: 4,
    readToDivisions: 0.1,
    probeRatio: 10,
    loadOhms: 50,
  } as const;

  it('on an oscilloscope have the budget of a carrier of that height, and half its power on average', () => {
    const envelope = twoToneEnvelopeReading(scope);
    const carrier = oscilloscopeReading(scope);
    expect(envelope.components).toEqual(carrier.components);
    expect([envelope.value, envelope.calculation]).toEqual([carrier.value, 'two-tone-envelope/1']);
    within(envelope.averageWatts, (carrier.watts ?? NaN) / 2, 1e-9);
  });

  it.each(cascade.two_tone)('$id: on an analyzer, told both ways', ({ inputs, expected, tolerance }) => {
    const screen = {
      toneDivisionsDown: 1,
      productDivisionsDown: 1 + inputs.IM3_below_each_tone_dB / 10,
      dbPerDivision: 10,
      readToDivisions: 0.05,
      scaleFidelityDb: 0.5,
    };
    const againstTone = intermodulationReading({ ...screen, against: 'each tone' });
    const againstPeak = intermodulationReading({ ...screen, against: 'peak envelope power' });
    within(-againstTone.value, inputs.IM3_below_each_tone_dB, tolerance.dB);
    within(-againstPeak.value, expected.IM3_below_PEP_dB, tolerance.dB);
    within(twoToneOf(inputs.each_tone_dBm, -againstTone.value).belowPeakDb, -againstPeak.value, 1e-9);
    expect(againstPeak.unit).toBe('dBc');
    within(againstPeak.expandedUncertainty, (2 * Math.hypot(0.5, 0.5, 0.5)) / RECTANGULAR, 1e-9);
  });
});

describe('bench readings against published ones', () => {
  const row = (id: string) => mixers.bench_readings.find((known) => known.id === id)?.expected;
  const screen = { readToDivisions: 0.05, padsInLineDb: 0, amplitudeAccuracyDb: 1 };

  it('bench-04, bench-05, bench-07: an analyzer, with and without a pad', () => {
    const at = { referenceLevelDbm: 0, divisionsDown: 4.3, dbPerDivision: 10, ...screen };
    within(analyzerReading(at).value, row('bench-04')?.dBm ?? NaN, 1e-9);
    const padded = { ...at, referenceLevelDbm: 10, divisionsDown: 2.6, padsInLineDb: 30 };
    within(analyzerReading(padded).value, row('bench-05')?.at_source_dBm ?? NaN, 1e-9);
    const fine = { ...at, referenceLevelDbm: -20, divisionsDown: 3.5, dbPerDivision: 2 };
    within(analyzerReading(fine).value, row('bench-07')?.dBm ?? NaN, 1e-9);
  });

  it('bench-06, bench-08: a harmonic, and an oscilloscope behind ×10', () => {
    const harmonic = harmonicReading({
      fundamentalDivisionsDown: 0.8,
      harmonicDivisionsDown: 5.4,
      dbPerDivision: 10,
      readToDivisions: 0.05,
      scaleFidelityDb: 0.5,
      flatnessDb: 0.5,
    });
    within(harmonic.value, row('bench-06')?.harmonic_dBc ?? NaN, 1e-9);
    const scope = { voltsPerDivision: 0.2, divisionsPeakToPeak: 5.2, readToDivisions: 0.1, loadOhms: 50 };
    within(oscilloscopeReading({ ...scope, probeRatio: 10 }).value, row('bench-08')?.dBm_at_tip ?? NaN, 0.01);
  });
});

describe('the tap of a dummy load', () => {
  const tap = {
    referenceLevelDbm: 0,
    divisionsDown: 0.3,
    dbPerDivision: 10,
    readToDivisions: 0.05,
    padsInLineDb: 10,
    padToleranceDb: 0.2,
    amplitudeAccuracyDb: 1,
    tapLossDb: 30,
    tapToleranceDb: 0.5,
  };

  it('adds tap and pads to what the analyzer shows: −3 dBm behind 40 dB is 5 W', () => {
    const { value, unit, components } = dummyLoadTapReading(tap);
    within(value, 10 ** 0.7, 1e-9);
    expect([unit, components.length]).toEqual(['W', 4]);
  });

  it('carries its decibels into watts to first order', () => {
    const { value, expandedUncertainty } = dummyLoadTapReading(tap);
    const decibels = (2 * Math.hypot(0.5, 1, 0.2, 0.5)) / RECTANGULAR;
    within(expandedUncertainty, (decibels * value * Math.LN10) / 10, 1e-9);
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

describe('what a reading is not taken from', () => {
  const tones = {
    toneDivisionsDown: 1,
    productDivisionsDown: 4,
    dbPerDivision: 10,
    readToDivisions: 0.05,
    scaleFidelityDb: 0.5,
    against: 'each tone',
  } as const;

  it.each<[string, string, () => unknown]>([
    ['a voltage that is no number', 'volts', () => logDetectorReading({ ...detector, volts: NaN })],
    [
      'a flat detector',
      'voltsPerDb',
      () => logDetectorReading({ ...detector, calibration: { ...line, voltsPerDb: 0 } }),
    ],
    [
      'a range upside down',
      'validToDbm',
      () => logDetectorReading({ ...detector, calibration: { ...line, validToDbm: -80 } }),
    ],
    ['pads that gain', 'padsInLineDb', () => logDetectorReading({ ...detector, padsInLineDb: -1 })],
    ['a probe that shows nothing', 'directVolts', () => diodeProbeReading({ ...probe, directVolts: 0 })],
    ['a negative drop', 'diodeDropVolts', () => diodeProbeReading({ ...probe, diodeDropVolts: -0.1 })],
    ['a load of 0 ohm', 'loadOhms', () => diodeProbeReading({ ...probe, loadOhms: 0 })],
    [
      'a product off the screen',
      'productDivisionsDown',
      () => intermodulationReading({ ...tones, productDivisionsDown: 11 }),
    ],
    [
      'an unnamed reference',
      'against',
      () => intermodulationReading({ ...tones, against: 'noise' as 'each tone' }),
    ],
    [
      'a tap that is no number',
      'tapLossDb',
      () =>
        dummyLoadTapReading({
          referenceLevelDbm: 0,
          divisionsDown: 1,
          dbPerDivision: 10,
          readToDivisions: 0.05,
          padsInLineDb: 0,
          amplitudeAccuracyDb: 1,
          tapLossDb: NaN,
          tapToleranceDb: 0.5,
        }),
    ],
    [
      'a probe without resistance',
      'probeOhms',
      () => probeLoading({ circuitOhms: 25, probeOhms: 0, probeFarads: 1e-11, frequencyHertz: 1e6 }),
    ],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
