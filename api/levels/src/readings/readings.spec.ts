import attenuators from '../../reference/attenuators.json';
import cascade from '../../reference/cascade.json';
import mixers from '../../reference/mixers.json';
import { errorOf } from '../../testing/error-of';
import { within, withinRel } from '../../testing/within';
import {
  analyzerReading,
  convert,
  dBm,
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
  riseTimeReading,
  timeBaseReading,
  twoToneEnvelopeReading,
  twoToneOf,
  wattsFromDbm,
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

const probe: DiodeProbeInput = {
  directVolts: 9.7,
  readToVolts: 0.05,
  meterAccuracyRel: 0.01,
  diodeDropVolts: 0.3,
  diodeDropPlusMinusVolts: 0.1,
  loadOhms: 50,
  loadToleranceRel: 0.01,
};

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

  it.each([
    ['bench-03', { cycles: 3, divisions: 4, secondsPerDivision: 2e-7 }],
    ['bench-09', { cycles: 7, divisions: 5, secondsPerDivision: 1e-7 }],
  ])('%s: frequency from the time base', (id, seen) => {
    const found = timeBaseReading({ ...seen, readToDivisions: 0.1, timeBaseToleranceRel: 0.02 });
    withinRel(found.value, row(id)?.f_Hz ?? NaN, 1e-9);
    const relative = (2 * Math.hypot(0.1 / seen.divisions, 0.02)) / RECTANGULAR;
    withinRel(found.expandedUncertainty, found.value * relative, 1e-9);
    expect([found.unit, found.calculation]).toEqual(['Hz', 'time-base/1']);
  });

  it('bench-01, bench-02: both products of a mixer, and ten microwatts', () => {
    const products = [convert(9.3e6, 5.5e6, 'difference'), convert(9.3e6, 5.5e6, 'sum')];
    products.forEach(({ hertz }, index) =>
      within(hertz / 1e6, row('bench-01')?.products_MHz?.[index] ?? NaN, 1e-9),
    );
    withinRel(wattsFromDbm(dBm(-20)), row('bench-02')?.W ?? NaN, 1e-6);
  });

  it('through-02: −12.4 dBm behind 10 and 20 dB is +17.6 dBm at the source', () => {
    const through = attenuators.use_checks.find(({ id }) => id === 'through-02');
    const pads = (through?.inputs.pads_dB ?? []).reduce((sum, pad) => sum + pad, 0);
    const at = { referenceLevelDbm: 0, dbPerDivision: 10, ...screen, padsInLineDb: pads };
    const divisionsDown = -(through?.inputs.analyzer_dBm ?? NaN) / 10;
    within(analyzerReading({ ...at, divisionsDown }).value, through?.expected.source_dBm ?? NaN, 1e-9);
  });

  it('bench-10: the rise of an edge without the oscilloscope’s own', () => {
    const input = { divisions: 6, secondsPerDivision: 1e-9, readToDivisions: 0.1, bandwidthHertz: 100e6 };
    const found = riseTimeReading({ ...input, timeBaseToleranceRel: 0.02, riseToleranceRel: 0.1 });
    withinRel(found.instrumentSeconds, row('bench-10')?.scope_rise_s ?? NaN, 1e-3);
    withinRel(found.value, 1e9 * (row('bench-10')?.signal_rise_s ?? NaN), 1e-3);
    // By hand, each limit by its derivative: 0.1 and 0.02 × 6 ns times 6/4.873, 0.1 × 3.5 ns times 3.5/4.873.
    const limits = [0.1 * (6 / 4.8734), 0.12 * (6 / 4.8734), 0.35 * (3.5 / 4.8734)];
    found.components.forEach(({ limit }, index) => withinRel(limit, limits[index] ?? NaN, 1e-3));
    expect(errorOf(() => riseTimeReading({ ...input, divisions: 3.6 })).input).toBe('divisions');
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
      'no cycles',
      'cycles',
      () => timeBaseReading({ cycles: 0, divisions: 4, secondsPerDivision: 1e-6, readToDivisions: 0.1 }),
    ],
    [
      'a trace hardly read',
      'readToDivisions',
      () => timeBaseReading({ cycles: 1, divisions: 4, secondsPerDivision: 1e-6, readToDivisions: 1.1 }),
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
