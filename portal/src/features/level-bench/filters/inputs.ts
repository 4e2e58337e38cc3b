import { choice, optional, quantity, type BenchValues } from '../inputs/fields';

const LADDERS = { kind: ['low-pass', 'high-pass'] } as const;
const LOW_PASS = { kind: ['low-pass'] } as const;
const HIGH_PASS = { kind: ['high-pass'] } as const;
const BAND_PASS = { kind: ['band-pass'] } as const;
/** What a transmitter's rule is held against: a high-pass lets harmonics through. */
const AGAINST_RULE = { kind: ['low-pass', 'band-pass'] } as const;

const counts = <const T extends string>(...words: T[]) => words.map((value) => ({ value, label: value }));

/** Starts as the low-pass after the club's power amplifier, 20 m, 5 W. */
export const INPUTS = {
  kind: choice(
    'Kind',
    [
      { value: 'low-pass', label: 'Low-pass' },
      { value: 'high-pass', label: 'High-pass' },
      { value: 'band-pass', label: 'Band-pass' },
    ],
    'low-pass',
  ),
  family: choice(
    'Shape',
    [
      { value: 'Chebyshev', label: 'Chebyshev' },
      { value: 'Butterworth', label: 'Butterworth' },
    ],
    'Chebyshev',
  ),
  order: choice('Elements', counts('3', '5', '7', '9'), '5', { when: LADDERS }),
  resonators: choice('Resonators', counts('2', '3', '4', '5'), '3', { when: BAND_PASS }),
  cutoffHertz: quantity('Passband edge', 'MHz', '15.5', { when: LOW_PASS }),
  lowEdgeHertz: quantity('Passband edge', 'MHz', '12.5', { when: HIGH_PASS }),
  centreHertz: quantity('Centre', 'MHz', '14.175', { when: BAND_PASS }),
  bandwidthHertz: quantity('Bandwidth', 'kHz', '700', { when: BAND_PASS }),
  returnLossDb: quantity('Return loss in it', 'dB', '20', { when: { family: ['Chebyshev'] } }),
  sourceOhms: quantity('Impedance', 'ohm', '50'),
  alNanohenry: quantity('Core', 'nH', '4.2', { unitWords: 'nH/turn²' }),
  resonatorHenries: quantity('Coil of each', 'nH', '500', { when: BAND_PASS }),
  trimmed: choice(
    'Resonators',
    [
      { value: 'no', label: 'As their parts come' },
      { value: 'yes', label: 'Trimmed to the centre' },
    ],
    'no',
    { when: BAND_PASS },
  ),
  inductorQ: quantity('Coil Q', '', '180'),
  toleranceRel: quantity('Part tolerance', '%', '5', { unitWords: '± %' }),
  capacitorQ: quantity('Capacitor Q', '', '500'),
  series: choice('Capacitors from', counts('E6', 'E12', 'E24'), 'E24'),
  seed: quantity('Seed of the builds', '', '1'),

  rule: choice(
    'Rule set',
    [
      { value: 'ITU below 30 MHz', label: 'ITU, below 30 MHz' },
      { value: 'ITU above 30 MHz', label: 'ITU, above 30 MHz' },
      { value: 'US below 30 MHz', label: 'US, below 30 MHz' },
      { value: 'US below 30 MHz, before 2003', label: 'US, below 30 MHz, set of 2003 or before' },
      { value: 'US 30 to 225 MHz', label: 'US, 30 to 225 MHz' },
    ],
    'ITU below 30 MHz',
  ),
  band: choice(
    'Band',
    [
      ...['160 m', '80 m', '40 m', '30 m', '20 m', '17 m', '15 m', '12 m', '10 m', '6 m'].map((value) => ({
        value,
        label: value,
      })),
      { value: 'other', label: 'Other' },
    ],
    '20 m',
  ),
  carrierLowHertz: quantity('Carrier from', 'MHz', '14', { when: { band: ['other'] } }),
  carrierHighHertz: quantity('Carrier to', 'MHz', '14.35', { when: { band: ['other'] } }),
  powerDbm: quantity('Power out', 'dBm', '+37.0'),
  secondDbc: quantity('Second before it', 'dBc', '-28', { when: AGAINST_RULE }),
  thirdDbc: quantity('Third before it', 'dBc', '-17', { when: AGAINST_RULE }),
  fourthDbc: quantity('Fourth before it', 'dBc', '-38', { when: AGAINST_RULE }),
  spurUncertaintyDb: optional('± of the harmonics', 'dB', { when: AGAINST_RULE }),
  unwantedHertz: quantity('Keep out', 'MHz', '5', { when: HIGH_PASS }),
  unwantedDb: quantity('To be taken', 'dB', '30', { when: HIGH_PASS }),
  wantedReturnLossDb: quantity('Return loss wanted', 'dB', '16'),
};

export type FilterValues = BenchValues<typeof INPUTS>;
