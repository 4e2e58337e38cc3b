import { MODE_DUTY, US_97 } from '@ferrite-row/levels';
import { capital } from '../../../lib/text';
import { choice, isShown, optional, quantity, words, type BenchValues } from '../inputs/fields';
import type { TypedTexts } from '../inputs/read-values';
import { RULE_SET_CHOICES, USUAL_RULE_SET } from './rule-set';

const on = (...judge: string[]) => ({ when: { judge } });
const underUs = (judge: string) => ({ when: { judge: [judge], ruleSet: ['US-97'] } });

/** The day the page was opened, so that a link without one is judged by the rules of its reader's day. */
const TODAY = new Date().toISOString().slice(0, 10);

const MODES = [
  ...Object.entries(MODE_DUTY).map(([mode, duty]) => ({
    value: mode,
    label: `${capital(mode.replace('conversational ', ''))}, ${100 * duty} %`,
  })),
  { value: 'own', label: 'Measured' },
];

/**
 * Starts are those of the plan Larkmoor Twenty: 5 W on 20 metres, harmonics as they leave its power stage without the
 * filter, and class figures for its heat.
 */
export const INPUTS = {
  judge: choice(
    'What is to be judged',
    [
      { value: 'instrument', label: 'An instrument’s input' },
      { value: 'spurious', label: 'Spurious emissions' },
      { value: 'band', label: 'Band and privileges' },
      { value: 'exposure', label: 'RF exposure' },
      { value: 'heat', label: 'A heat sink' },
    ],
    'instrument',
  ),
  ruleSet: choice('Rule set', RULE_SET_CHOICES, USUAL_RULE_SET, on('spurious', 'band', 'exposure')),

  levelDbm: quantity('Greatest level', 'dBm', '38', on('instrument')),
  plusMinusDb: quantity('May be off by', 'dB', '1', on('instrument')),
  damageDbm: quantity('Damage level', 'dBm', '30', on('instrument')),
  marginDb: quantity('Room to keep', 'dB', '10', { ...on('instrument'), hint: 'Common practice' }),
  padsInLineDb: quantity('Pads in line', 'dB', '0', on('instrument')),
  directVolts: optional('Direct volts there', 'V', on('instrument')),
  greatestDirectVolts: optional('Direct volts it stands', 'V', on('instrument')),

  carrierHertz: quantity('Carrier', 'MHz', '14.2', on('spurious', 'band', 'exposure')),
  carrierWatts: quantity('Its power', 'W', '5', on('spurious')),
  installed: choice(
    'Transmitter installed',
    [
      { value: 'after', label: 'After 2003-01-01' },
      { value: 'before', label: 'Until that day' },
    ],
    'after',
    underUs('spurious'),
  ),
  dbc2: { ...optional('Second harmonic', 'dBc', on('spurious')), start: '-28' },
  dbc3: { ...optional('Third harmonic', 'dBc', on('spurious')), start: '-17' },
  dbc4: { ...optional('Fourth harmonic', 'dBc', on('spurious')), start: '-38' },
  dbcOther: optional('Any other', 'dBc', on('spurious')),
  spurUncertaintyDb: quantity('Measured, ±', 'dB', '1.1', on('spurious')),
  cutoffHertz: quantity('Filter up to', 'MHz', '15.5', on('spurious')),
  returnLossDb: quantity('Return loss in it', 'dB', '20', on('spurious')),

  licenceClass: choice(
    'Licence class',
    US_97.licenceClasses.map((value) => ({ value, label: capital(value) })),
    'general',
    underUs('band'),
  ),
  region: choice(
    'Region of the ITU',
    [1, 2, 3].map((region) => ({ value: String(region), label: String(region) })),
    '2',
    underUs('band'),
  ),
  emission: choice(
    'Emission',
    [
      { value: 'phone', label: 'Phone' },
      { value: 'CW', label: 'Morse, CW' },
      { value: 'data', label: 'Data' },
      { value: 'RTTY', label: 'RTTY' },
      { value: 'image', label: 'Image' },
      { value: 'MCW', label: 'Tone-modulated Morse, MCW' },
      { value: 'test', label: 'Test' },
    ],
    'phone',
    on('band'),
  ),
  side: choice(
    'Lies above or below the carrier',
    [
      { value: 'upper', label: 'Above' },
      { value: 'lower', label: 'Below' },
      { value: 'both', label: 'Both' },
    ],
    'upper',
    on('band'),
  ),
  bandwidthHertz: quantity('Bandwidth', 'kHz', '2.7', on('band')),
  day: words('Day', TODAY, { longest: 10, ...on('band'), hint: 'As 2026-12-01' }),

  peakWatts: quantity('Peak envelope power', 'W', '5', on('band', 'exposure')),
  feedLossDb: quantity('Loss of the feeder', 'dB', '0', on('band', 'exposure')),
  antennaGainDbd: quantity('Antenna gain', 'dB', '0', { unitWords: 'dBd', ...on('band') }),

  mode: choice('Mode, average over peak', MODES, 'conversational SSB, no processing', on('exposure')),
  modeDuty: quantity('Average over peak', '%', '30', { when: { judge: ['exposure'], mode: ['own'] } }),
  onMinutes: quantity('Transmits for', 'min', '2', on('exposure')),
  offMinutes: quantity('then listens for', 'min', '2', on('exposure')),
  gainDbi: quantity('Antenna gain', 'dB', '2.15', { unitWords: 'dBi', ...on('exposure') }),
  distanceMetres: optional('People at', 'm', on('exposure')),
  otherParts: words('Other sources, parts of the uncontrolled limit', '', {
    longest: 80,
    ...on('exposure'),
    hint: 'As 0.4 0.35, at the same place and time',
  }),
  reflectionFactor: choice(
    'Ground',
    [
      { value: '1', label: 'None, free space' },
      { value: '2.56', label: 'Usual, reflects 60 %' },
      { value: '4', label: 'Reflects all' },
    ],
    '2.56',
    on('exposure'),
  ),

  heatOf: choice(
    'Heat',
    [
      { value: 'told', label: 'As measured' },
      { value: 'class-B', label: 'Class B, its worst' },
    ],
    'told',
    on('heat'),
  ),
  watts: quantity('Turned to heat', 'W', '8.8', { when: { judge: ['heat'], heatOf: ['told'] } }),
  classPeakWatts: quantity('Peak envelope power', 'W', '5', {
    when: { judge: ['heat'], heatOf: ['class-B'] },
  }),
  ambientCelsius: quantity('Air', '°C', '35', on('heat')),
  junctionToCase: quantity('Junction to case', 'K/W', '3', on('heat')),
  caseToSink: quantity('Case to sink', 'K/W', '0.5', on('heat')),
  sinkToAir: quantity('Sink to air', 'K/W', '5', on('heat')),
  greatestJunctionCelsius: quantity('Junction at most', '°C', '150', on('heat')),
  supplyAmperes: optional('Supply current', 'A', on('heat')),
  wireMetres: quantity('Supply wires, one way', 'm', '1', on('heat')),
  wireSquareMillimetres: quantity('Their cross section', '', '1.5', { unitWords: 'mm²', ...on('heat') }),
};

export type GuardValues = BenchValues<typeof INPUTS>;
export type Judge = GuardValues['judge'];

/** The inputs of what is chosen, in the order they are typed. */
export const shownOf = (texts: TypedTexts): string[] =>
  Object.keys(INPUTS).filter((name) => name !== 'judge' && isShown(INPUTS, name, texts));
