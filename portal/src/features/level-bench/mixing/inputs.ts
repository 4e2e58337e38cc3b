import { choice, quantity, type BenchValues } from '../inputs/fields';
import { BAND_FILTERS, OWN_FILTERS } from './filters';

const own = { filter: OWN_FILTERS.map(({ value }) => value) };
const ownBandPass = { filter: ['own-band-pass'] };

/** Starting figures: the mixer of the sample plan's stage 8, a level-7 diode ring with its oscillator above. */
export const INPUTS = {
  ifHertz: quantity('IF', 'MHz', '8.867'),
  ifDbm: quantity('IF level', 'dBm', '-10.0'),
  loHertz: quantity('LO', 'MHz', '23.067'),
  maxOrder: quantity('Order up to', '', '7', { unitWords: 'm + n' }),
  wanted: choice(
    'Wanted product',
    [
      { value: 'difference', label: 'LO − IF' },
      { value: 'sum', label: 'LO + IF' },
    ],
    'difference',
  ),
  filter: choice(
    'Filter after it',
    [...BAND_FILTERS, ...OWN_FILTERS, { value: 'none', label: 'None' }],
    '20m',
  ),
  order: quantity('Order of the filter', '', '3', { unitWords: 'n', when: own }),
  inductorQ: quantity('Q of its coils', '', '165', { unitWords: 'Q', when: own }),
  centreHertz: quantity('Its centre', 'MHz', '14.175', { when: ownBandPass }),
  bandwidthHertz: quantity('Its bandwidth', 'kHz', '700', { when: ownBandPass }),
  resonatorHenries: quantity('Each coil', 'µH', '1', { when: ownBandPass }),
  cutoffHertz: quantity('Its cutoff', 'MHz', '17', { when: { filter: ['own-low-pass'] } }),
  goalDb: quantity('Goal, below the wanted', 'dB', '60'),
  ruleSet: choice(
    'Bands of',
    [
      { value: 'IARU-R1', label: 'Region 1' },
      { value: 'US-97', label: 'US' },
    ],
    'IARU-R1',
  ),
  ratedDbm: quantity('Rated LO level', 'dBm', '+7.0'),
  sourceDbm: quantity('LO source gives', 'dBm', '10'),
  conversionLoss: quantity('Conversion loss', 'dB', '6.5'),
  conversionLossPlusMinus: quantity('± of it', 'dB', '1'),
  loLeakage: quantity('LO leakage, down', 'dB', '35'),
  ifLeakage: quantity('IF leakage, down', 'dB', '30'),
  leakagePlusMinus: quantity('± of leakage', 'dB', '10'),
  inputInterceptDbm: quantity('Third intercept', 'dBm', '15'),
  evenLoBalanceDb: quantity('Even in LO, down', 'dB', '35'),
  evenIfBalanceDb: quantity('Even in IF, down', 'dB', '20'),
  higherOrderPlusMinusDb: quantity('± of higher orders', 'dB', '10'),
  filterPlusMinusDb: quantity('± of the filter', 'dB', '4'),
};

export type MixingValues = BenchValues<typeof INPUTS>;
export type MixingInputName = keyof typeof INPUTS;

/** Figures nobody typed unless they say so, in the order of their fields. */
export const ASSUMED = [
  'conversionLoss',
  'conversionLossPlusMinus',
  'loLeakage',
  'ifLeakage',
  'leakagePlusMinus',
  'inputInterceptDbm',
  'evenLoBalanceDb',
  'evenIfBalanceDb',
  'higherOrderPlusMinusDb',
  'filterPlusMinusDb',
] as const satisfies readonly MixingInputName[];

/** As long as these stand as they started they are the sample plan's. */
export const OF_THE_SAMPLE = [
  'ifHertz',
  'ifDbm',
  'loHertz',
  'wanted',
] as const satisfies readonly MixingInputName[];
