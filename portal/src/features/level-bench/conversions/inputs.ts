import { choice, quantity, type BenchValues } from '../inputs/fields';

/** A level may be told in any of these; each keeps its own field, so nothing typed is lost by looking at another. */
export const INPUTS = {
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
  ),
  dbm: quantity('Level', 'dBm', '0', { when: { from: ['dbm'] } }),
  watts: quantity('Power', 'W', '1 mW', { when: { from: ['watts'] } }),
  voltsRms: quantity('Volts rms', 'V', '224 mV', { when: { from: ['voltsRms'] } }),
  voltsPeak: quantity('Volts peak', 'V', '316 mV', { when: { from: ['voltsPeak'] } }),
  voltsPeakToPeak: quantity('Volts peak-to-peak', 'V', '632 mV', { when: { from: ['voltsPeakToPeak'] } }),
  amperesRms: quantity('Amperes rms', 'A', '4.47 mA', { when: { from: ['amperesRms'] } }),
  dbMicrovolt: quantity('Voltage level', 'dB', '107', { unitWords: 'dBµV', when: { from: ['dbMicrovolt'] } }),
  dbv: quantity('Voltage level', 'dB', '-13', { unitWords: 'dBV', when: { from: ['dbv'] } }),
  dbu: quantity('Voltage level', 'dB', '-10.8', { unitWords: 'dBu', when: { from: ['dbu'] } }),
  resistance: quantity('Resistance', 'ohm', '50'),
};

export type ConversionValues = BenchValues<typeof INPUTS>;

/** The fields of which one is shown. */
export const KNOWN = INPUTS.from.options.map(({ value }) => value);
