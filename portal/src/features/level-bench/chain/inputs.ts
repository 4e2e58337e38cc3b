import { choice, quantity, words, type BenchValues } from '../inputs/fields';

/**
 * The plan Larkmoor Twenty from the balanced modulator on: gains, windows and limits are the plan's. Noise, intercept
 * and compression are of the class of each stage, common practice; nobody measured them.
 */
const LARKMOOR_TWENTY = [
  'Crystal filter_-6_2____-14',
  'IF amplifier_14_1.5_4_20_12_8',
  'Mixer_-6.5_2__8.5_-5_-6',
  'Band-pass filter_-2.5_1.5',
  'Pre-driver_20.5_1.5_5_24_15_10',
  'Driver_19_1.5_6_38_30_25',
  'Power amplifier_17_1_8_50_42_39',
  'Low-pass filter_-0.5_1____43',
].join('*');

export const INPUTS = {
  inputDbm: quantity('PEP into the first stage', 'dBm', '-18'),
  signal: choice(
    'Signal',
    [
      { value: 'carrier', label: 'A carrier' },
      { value: 'tones', label: 'Two equal tones' },
      { value: 'speech', label: 'Speech, unprocessed' },
      { value: 'own', label: 'Another' },
    ],
    'carrier',
  ),
  peakOverAverageDb: quantity('Peak over average', 'dB', '6', { when: { signal: ['own'] } }),
  firstHertz: quantity('First tone', 'MHz', '14.2007'),
  secondHertz: quantity('Second tone', 'MHz', '14.2019'),
  stages: words('Stages', LARKMOOR_TWENTY, { longest: 3000 }),
};

export type ChainValues = BenchValues<typeof INPUTS>;

/** Peak envelope power over average, dB. Speech: a fifth of it on average, OET Bulletin 65, Supplement B, Table 2. */
export const PEAK_OVER_AVERAGE_DB = {
  carrier: 0,
  tones: 10 * Math.log10(2),
  speech: 10 * Math.log10(1 / 0.2),
} as const;
