import { requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { dBm, hertz } from '../units';

/** Two equal tones and their third-order products, every way they are told. */
export interface TwoTone {
  eachToneDbm: number;
  /** 6.02 dB above each tone. */
  peakDbm: number;
  /** 3.01 dB above each tone. */
  averageDbm: number;
  /** Each product against each tone, negative. */
  intermodulationDbc: number;
  /** Each product below the peak envelope power, positive: 6.02 dB more than below a tone. */
  belowPeakDb: number;
  intermodulationDbm: number;
  /** Where tones and products would meet. */
  outputInterceptDbm: number;
}

const PEAK_OVER_TONE_DB = 20 * Math.log10(2);
const AVERAGE_OVER_TONE_DB = 10 * Math.log10(2);

/**
 * Peak, average and intercept of two equal tones from one tone and its products.
 *
 * A figure told below the peak envelope power is 6.02 dB larger than the same told below one tone: ask which.
 *
 * @param belowToneDb - each third-order product below each tone, 0 to 200 dB.
 * @throws OutOfDomainError naming the input.
 * @example twoToneOf(37, 33).peakDbm //=> 43.0206
 * @example twoToneOf(37, 33).outputInterceptDbm //=> 53.5
 * @see PEP = 4 × each tone = 2 × average; OIP3 = P + D/2; textbook
 */
export function twoToneOf(eachToneDbm: number, belowToneDb: number): TwoTone {
  const tone = dBm(eachToneDbm, 'eachToneDbm');
  const domain = {
    input: 'belowToneDb',
    label: 'Products below a tone',
    unit: 'dB',
    atLeast: 0,
    atMost: 200,
  };
  requireWithin(domain, belowToneDb);
  return {
    eachToneDbm: tone,
    peakDbm: tone + PEAK_OVER_TONE_DB,
    averageDbm: tone + AVERAGE_OVER_TONE_DB,
    intermodulationDbc: -belowToneDb,
    belowPeakDb: belowToneDb + PEAK_OVER_TONE_DB,
    intermodulationDbm: tone - belowToneDb,
    outputInterceptDbm: tone + belowToneDb / 2,
  };
}

/**
 * The same from an intercept instead of a measurement: what is to be expected, well under compression.
 *
 * @throws OutOfDomainError naming the input; tones at or over the intercept too, where the law has long ended.
 * @example twoToneFromIntercept(20, 40).intermodulationDbm //=> -20
 * @see IM3 = 3P − 2·OIP3; textbook
 */
export function twoToneFromIntercept(eachToneDbm: number, outputInterceptDbm: number): TwoTone {
  const intercept = dBm(outputInterceptDbm, 'outputInterceptDbm');
  requireWithin(
    { input: 'eachToneDbm', label: 'Each tone', unit: 'dBm', atLeast: -300, below: intercept },
    eachToneDbm,
  );
  return twoToneOf(eachToneDbm, 2 * (intercept - eachToneDbm));
}

/** Where the products of two tones lie, Hz, the lower first. */
export interface TwoToneProducts {
  second: [number, number];
  third: [number, number];
  fifth: [number, number];
}

/**
 * Frequencies of the products of two tones: difference and sum, and the pairs beside them.
 *
 * @throws OutOfDomainError naming the input; two tones on one frequency, or more than half an octave apart.
 * @example twoToneProducts(14.2e6, 14.2019e6).third //=> [14198100, 14203800]
 * @see 2·f1 − f2, 2·f2 − f1, 3·f1 − 2·f2, 3·f2 − 2·f1; arithmetic
 */
export function twoToneProducts(firstHertz: number, secondHertz: number): TwoToneProducts {
  const first = hertz(firstHertz, 'firstHertz');
  const second = hertz(secondHertz, 'secondHertz');
  const [low, high] = first < second ? [first, second] : [second, first];
  const permitted = 'another frequency than the first, less than half as high again';
  if (low === high || 3 * low <= 2 * high) {
    throw new OutOfDomainError(
      'secondHertz',
      secondHertz,
      permitted,
      `Second tone: it must have ${permitted}.`,
    );
  }
  return {
    second: [high - low, high + low],
    third: [2 * low - high, 2 * high - low],
    fifth: [3 * low - 2 * high, 3 * high - 2 * low],
  };
}

/**
 * Second-order intercept from a harmonic of one tone.
 *
 * @param belowDb - second harmonic below the tone, 0 to 200 dB.
 * @returns dBm at the output.
 * @throws OutOfDomainError naming the input.
 * @example secondHarmonicIntercept(30, 30) //=> 60
 * @see P + D for a harmonic; textbook
 */
export function secondHarmonicIntercept(toneDbm: number, belowDb: number): number {
  const tone = dBm(toneDbm, 'toneDbm');
  requireWithin(
    { input: 'belowDb', label: 'Harmonic below the tone', unit: 'dB', atLeast: 0, atMost: 200 },
    belowDb,
  );
  return dBm(tone + belowDb);
}
