import { choice, quantity, type BenchValues } from '../inputs/fields';

const WITH_LOSS = ['pi', 'tee', 'bridged tee'] as const;

/** Starts as the pad between the club plan's oscillator, +10 dBm, and a diode ring that wants +7. */
export const INPUTS = {
  kind: choice(
    'Kind of pad',
    [
      { value: 'pi', label: 'Pi' },
      { value: 'tee', label: 'Tee' },
      { value: 'bridged tee', label: 'Bridged tee, equal resistances' },
      { value: 'minimum loss', label: 'Minimum loss, two resistors' },
    ],
    'pi',
  ),
  lossDb: quantity('Attenuation', 'dB', '3', { when: { kind: WITH_LOSS } }),
  sourceOhms: quantity('From', 'ohm', '50'),
  loadOhms: quantity('To', 'ohm', '50'),
  told: choice(
    'Power told in',
    [
      { value: 'dBm', label: 'dBm' },
      { value: 'watts', label: 'Watts' },
    ],
    'dBm',
  ),
  inputDbm: quantity('Level in, average', 'dBm', '+10', { when: { told: ['dBm'] } }),
  inputWatts: quantity('Power in, average', 'W', '10 mW', { when: { told: ['watts'] } }),
  series: choice(
    'Series of values',
    [
      { value: 'E12', label: 'E12' },
      { value: 'E24', label: 'E24' },
      { value: 'E48', label: 'E48' },
      { value: 'E96', label: 'E96' },
    ],
    'E24',
  ),
  parts: choice(
    'Parts for a value',
    [
      { value: 'one', label: 'One' },
      { value: 'parallel', label: 'Two in parallel' },
      { value: 'series', label: 'Two in series' },
      { value: 'two', label: 'Two, whichever is nearer' },
    ],
    'one',
  ),
  toleranceRel: quantity('Part tolerance', '%', '5', { unitWords: '± %' }),
  derating: quantity('Part of its rating used', '%', '50'),
  enoughRel: quantity('One part will do within', '%', '1', {
    unitWords: '± %',
    when: { parts: ['parallel', 'series', 'two'] },
  }),
};

export type PadInputs = BenchValues<typeof INPUTS>;
