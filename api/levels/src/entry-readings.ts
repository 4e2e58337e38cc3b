import { analyzerReading, harmonicReading } from './analyzer';
import type { AnalyzerInput } from './analyzer';
import { counterReading } from './counter';
import { dummyLoadReading } from './dummy-load';
import { notOffered } from './entry';
import type { EntryMethod } from './entry-fields';
import { OutOfDomainError } from './errors';
import { meterReading } from './meter';
import { oscilloscopeReading } from './oscilloscope';
import type { OscilloscopeInput } from './oscilloscope';
import type { LevelReading, MeterUnit } from './reading';
import { diodeProbeReading } from './readings/diode-probe';
import { dummyLoadTapReading } from './readings/dummy-load-tap';
import { intermodulationReading } from './readings/intermodulation';
import { logDetectorReading } from './readings/log-detector';
import { timeBaseReading } from './readings/time-base';
import { twoToneEnvelopeReading } from './readings/two-tone-envelope';

/** What the method takes for granted: accuracies of the instrument and of the plan, by name, as numbers. */
export type Assumptions = Readonly<Record<string, number>>;

/**
 * Taken where neither instrument nor plan states its own. Common practice for the club's class of instrument, not from
 * any one data sheet: a bench analyzer within 1.5 dB, its scale within 0.5 dB and its flatness within 0.8 dB; a hand-held
 * meter within 1 %; a counter's time base within 1 ppm.
 */
export const ASSUMED = {
  amplitudeAccuracyDb: 1.5,
  scaleFidelityDb: 0.5,
  flatnessDb: 0.8,
  accuracyRel: 0.01,
  timeBasePpm: 1,
  tapToleranceDb: 0.5,
  conformityDb: 1,
  diodeDropPlusMinusVolts: 0.1,
} as const;

/** An entry's numbers by field name; one that is missing is no number, which the method refuses by its name. */
interface Given {
  of: (name: string) => number;
  inputs: Readonly<Record<string, number>>;
  assumptions: Assumptions;
  assumed: (name: keyof typeof ASSUMED) => number;
}

const scaleOf = ({ of }: Given) => ({
  dbPerDivision: of('dbPerDivision'),
  readToDivisions: of('readToDivisions'),
});

const analyzerInput = (given: Given): AnalyzerInput => ({
  ...scaleOf(given),
  referenceLevelDbm: given.of('referenceLevelDbm'),
  divisionsDown: given.of('divisionsDown'),
  padsInLineDb: given.of('padsInLineDb'),
  padToleranceDb: given.assumptions.padToleranceDb,
  amplitudeAccuracyDb: given.assumed('amplitudeAccuracyDb'),
});

const METHODS: Record<Exclude<EntryMethod, 'meter'>, (given: Given) => LevelReading> = {
  oscilloscope: ({ inputs, assumptions }) => oscilloscopeReading(scopeInput(inputs, assumptions)),
  'dummy-load': ({ inputs, assumptions }) => dummyLoadReading(scopeInput(inputs, assumptions)),
  'two-tone-envelope': ({ inputs, assumptions }) => twoToneEnvelopeReading(scopeInput(inputs, assumptions)),
  analyzer: (given) => analyzerReading(analyzerInput(given)),
  'dummy-load-tap': (given) =>
    dummyLoadTapReading({
      ...analyzerInput(given),
      tapLossDb: given.of('tapLossDb'),
      tapToleranceDb: given.assumed('tapToleranceDb'),
    }),
  harmonic: (given) =>
    harmonicReading({
      ...scaleOf(given),
      fundamentalDivisionsDown: given.of('fundamentalDivisionsDown'),
      harmonicDivisionsDown: given.of('harmonicDivisionsDown'),
      scaleFidelityDb: given.assumed('scaleFidelityDb'),
      flatnessDb: given.assumed('flatnessDb'),
    }),
  intermodulation: (given) =>
    intermodulationReading({
      ...scaleOf(given),
      toneDivisionsDown: given.of('toneDivisionsDown'),
      productDivisionsDown: given.of('productDivisionsDown'),
      scaleFidelityDb: given.assumed('scaleFidelityDb'),
      against: given.assumptions.againstPeakEnvelopePower === 1 ? 'peak envelope power' : 'each tone',
    }),
  counter: ({ of, assumptions, assumed }) =>
    namingTheField('frequencyHertz', 'frequencyMegahertz', () =>
      counterReading({
        frequencyHertz: of('frequencyMegahertz') * 1e6,
        gateSeconds: of('gateSeconds'),
        timeBasePpm: assumed('timeBasePpm'),
        prescaler: assumptions.prescaler,
      }),
    ),
  'log-detector': ({ of, assumptions, assumed }) =>
    logDetectorReading({
      volts: of('volts'),
      readToVolts: of('readToVolts'),
      meterAccuracyRel: assumptions.meterAccuracyRel,
      calibration: {
        voltsPerDb: of('voltsPerDb'),
        interceptDbm: of('interceptDbm'),
        validFromDbm: of('validFromDbm'),
        validToDbm: of('validToDbm'),
      },
      conformityDb: assumed('conformityDb'),
      padsInLineDb: of('padsInLineDb'),
      padToleranceDb: assumptions.padToleranceDb,
    }),
  'diode-probe': ({ of, assumptions, assumed }) =>
    diodeProbeReading({
      directVolts: of('directVolts'),
      readToVolts: of('readToVolts'),
      meterAccuracyRel: assumptions.meterAccuracyRel,
      peakPerVolt: assumptions.peakPerVolt,
      diodeDropVolts: of('diodeDropVolts'),
      diodeDropPlusMinusVolts: assumed('diodeDropPlusMinusVolts'),
      loadOhms: of('loadOhms'),
      loadToleranceRel: assumptions.loadToleranceRel,
    }),
  'time-base': ({ of, assumptions }) =>
    timeBaseReading({
      cycles: of('cycles'),
      divisions: of('divisions'),
      secondsPerDivision: of('secondsPerDivision'),
      readToDivisions: of('readToDivisions'),
      timeBaseToleranceRel: assumptions.timeBaseToleranceRel,
    }),
};

/**
 * The reading of an entry whose every field could be read.
 *
 * @param inputs - from `readEntry`.
 * @param assumptions - what is left out is as in {@link ASSUMED}, or as the method says; `againstPeakEnvelopePower: 1`
 *   tells intermodulation below the peak envelope power in place of each tone.
 * @param unit - of the reading; only a meter depends on it.
 * @throws OutOfDomainError naming the field.
 * @example readingFromInputs('counter', { frequencyMegahertz: 14.1, gateSeconds: 1 }, { timeBasePpm: 1 }, 'W').value //=> 14100000
 * @example readingFromInputs('time-base', { cycles: 3, divisions: 4, secondsPerDivision: 0.2e-6, readToDivisions: 0.1 }, {}, 'V').value //=> 3750000
 */
export function readingFromInputs(
  method: EntryMethod,
  inputs: Readonly<Record<string, number>>,
  assumptions: Assumptions,
  unit: MeterUnit,
): LevelReading {
  const of = (name: string): number => inputs[name] ?? Number.NaN;
  const assumed = (name: keyof typeof ASSUMED): number => assumptions[name] ?? ASSUMED[name];
  if (method !== 'meter') return METHODS[method]({ of, inputs, assumptions, assumed });
  return meterReading({
    value: of('value'),
    readToValue: of('readToValue'),
    unit,
    accuracyRel: assumed('accuracyRel'),
    accuracyFixed: assumptions.accuracyFixed,
  });
}

/**
 * What a scope's inputs mean to its calculation.
 *
 * @throws OutOfDomainError when the probe is neither ×1 nor ×10.
 * @example scopeInput({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }, {}).probeRatio //=> 10
 */
export function scopeInput(
  inputs: Readonly<Record<string, number>>,
  assumptions: Assumptions,
): OscilloscopeInput {
  const { voltsPerDivision = NaN, divisionsPeakToPeak = NaN, readToDivisions = NaN } = inputs;
  const { probeRatio = NaN, loadOhms = NaN } = inputs;
  const { verticalGainToleranceRel, probeToleranceRel, loadToleranceRel } = assumptions;
  if (probeRatio !== 1 && probeRatio !== 10) throw notOffered('probeRatio', 'Probe', probeRatio, [1, 10]);
  return {
    ...{ voltsPerDivision, divisionsPeakToPeak, readToDivisions, probeRatio, loadOhms },
    ...{ verticalGainToleranceRel, probeToleranceRel, loadToleranceRel },
  };
}

/** The member typed megahertz, so that is the field an error is about. */
function namingTheField<T>(inside: string, field: string, work: () => T): T {
  try {
    return work();
  } catch (error) {
    if (error instanceof OutOfDomainError && error.input === inside)
      throw new OutOfDomainError(field, error.value, error.permitted, error.message);
    throw error;
  }
}
