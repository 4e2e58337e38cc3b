import { choice, optional, quantity, type BenchValues } from '../inputs/fields';

/** A level or a ratio may be told in any of these; each keeps its own field, so nothing typed is lost by looking at another. */
export const INPUTS = {
  calculation: choice(
    'To work out',
    [
      { value: 'level', label: 'A level, every way' },
      { value: 'ratio', label: 'A ratio in dB' },
      { value: 'sum', label: 'Several levels together' },
      { value: 'loaded', label: 'A source and its load' },
    ],
    'level',
  ),
  from: choice(
    'What is known',
    [
      { value: 'dbm', label: 'Level, dBm' },
      { value: 'watts', label: 'Power' },
      { value: 'voltsRms', label: 'Volts rms' },
      { value: 'voltsPeak', label: 'Volts peak' },
      { value: 'voltsPeakToPeak', label: 'Volts peak-to-peak' },
      { value: 'amperesRms', label: 'Amperes rms' },
      { value: 'dbMicrovolt', label: 'dBµV' },
      { value: 'dbv', label: 'dBV' },
      { value: 'dbu', label: 'dBu' },
    ],
    'dbm',
    { when: { calculation: ['level'] } },
  ),
  dbm: quantity('Level', 'dBm', '0', { when: { calculation: ['level'], from: ['dbm'] } }),
  watts: quantity('Power', 'W', '1 mW', { when: { calculation: ['level'], from: ['watts'] } }),
  voltsRms: quantity('Volts rms', 'V', '224 mV', { when: { calculation: ['level'], from: ['voltsRms'] } }),
  voltsPeak: quantity('Volts peak', 'V', '316 mV', { when: { calculation: ['level'], from: ['voltsPeak'] } }),
  voltsPeakToPeak: quantity('Volts peak-to-peak', 'V', '632 mV', {
    when: { calculation: ['level'], from: ['voltsPeakToPeak'] },
  }),
  amperesRms: quantity('Amperes rms', 'A', '4.47 mA', {
    when: { calculation: ['level'], from: ['amperesRms'] },
  }),
  dbMicrovolt: quantity('Voltage level', 'dB', '107', {
    unitWords: 'dBµV',
    when: { calculation: ['level'], from: ['dbMicrovolt'] },
  }),
  dbv: quantity('Voltage level', 'dB', '-13', {
    unitWords: 'dBV',
    when: { calculation: ['level'], from: ['dbv'] },
  }),
  dbu: quantity('Voltage level', 'dB', '-10.8', {
    unitWords: 'dBu',
    when: { calculation: ['level'], from: ['dbu'] },
  }),
  ratioFrom: choice(
    'What is known',
    [
      { value: 'ratioDb', label: 'Decibels' },
      { value: 'powerRatio', label: 'Power ratio' },
      { value: 'voltageRatio', label: 'Voltage ratio' },
      { value: 'nepers', label: 'Nepers' },
      { value: 'powers', label: 'Two powers' },
    ],
    'ratioDb',
    { when: { calculation: ['ratio'] } },
  ),
  ratioDb: quantity('Ratio', 'dB', '3', { when: { calculation: ['ratio'], ratioFrom: ['ratioDb'] } }),
  powerRatio: quantity('Power ratio', '', '2', {
    unitWords: 'to 1',
    when: { calculation: ['ratio'], ratioFrom: ['powerRatio'] },
  }),
  voltageRatio: quantity('Voltage ratio', '', '2', {
    unitWords: 'to 1',
    when: { calculation: ['ratio'], ratioFrom: ['voltageRatio'] },
  }),
  nepers: quantity('Nepers', '', '1', {
    unitWords: 'Np',
    when: { calculation: ['ratio'], ratioFrom: ['nepers'] },
  }),
  wattsOut: quantity('Power out', 'W', '5', { when: { calculation: ['ratio'], ratioFrom: ['powers'] } }),
  wattsIn: quantity('Power in', 'W', '200 mW', { when: { calculation: ['ratio'], ratioFrom: ['powers'] } }),
  first: quantity('First', 'dBm', '0', { when: { calculation: ['sum'] } }),
  second: quantity('Second', 'dBm', '-3', { when: { calculation: ['sum'] } }),
  third: optional('Third', 'dBm', { when: { calculation: ['sum'] } }),
  fourth: optional('Fourth', 'dBm', { when: { calculation: ['sum'] } }),
  fifth: optional('Fifth', 'dBm', { when: { calculation: ['sum'] } }),
  sixth: optional('Sixth', 'dBm', { when: { calculation: ['sum'] } }),
  emfVoltsRms: quantity('Open circuit, rms', 'V', '447 mV', { when: { calculation: ['loaded'] } }),
  sourceOhms: quantity('Source', 'ohm', '50', { when: { calculation: ['loaded'] } }),
  loadOhms: quantity('Load', 'ohm', '75', { when: { calculation: ['loaded'] } }),
  resistance: quantity('Resistance', 'ohm', '50', { when: { calculation: ['level', 'sum'] } }),
};

export type ConversionValues = BenchValues<typeof INPUTS>;
