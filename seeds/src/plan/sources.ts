import type { StageDescription } from '@ferrite-row/api/plans/plan-description';
import { below, decibels, driveLevel, eyes, frequency, KINDS, meter, photo, safety, tick } from './checks';
import { FREQUENCIES, RING_DRIVE } from './levels';
import { seenFrequency } from './other-ways';

/** Stages 1 to 3 and 7: what everything else is fed with. Currents are such as small-signal stages draw (common practice). */
export const supplyRails: StageDescription = {
  name: 'Supply rails',
  summary:
    'Everything runs from 13.8 V; a regulator makes 9 V for the small stages and another 5 V for the rest.',
  cautions: ['hot parts'],
  checks: [
    safety(
      'supply-limit',
      'Current limit set to 0.5 A before the first power',
      'Set it on the bench supply with its terminals shorted, then connect the board. Mind the polarity.',
    ),
    meter('supply-input', 'Input voltage', 'At the board, with the board connected.', [13.8, 0.3, 'V']),
    meter('supply-nine', 'The 9 V rail', 'With a 470 ohm load on it.', [9, 0.3, 'V']),
    meter('supply-five', 'The 5 V rail', 'With a 470 ohm load on it.', [5, 0.2, 'V']),
    tick(
      'supply-warm',
      'Regulators no more than warm',
      'After ten minutes, under 60 °C at the tab by the contact thermometer. Too hot to touch is too hot.',
    ),
    photo(
      'supply-photo',
      'Photo of the finished board',
      'Both sides, so that the polarity marks can be read.',
    ),
  ],
};

export const carrierOscillator: StageDescription = {
  name: 'Carrier oscillator',
  summary: 'A crystal pulled to 300 Hz above the filter, loud enough for the diode ring.',
  checks: [
    meter('carrier-current', 'Supply current', 'In the 9 V lead.', [11, 3, 'mA']),
    seenFrequency(
      'carrier-seen',
      'Swings at the crystal’s own frequency',
      'Count whole cycles at TP2 along the screen: its third overtone would be three times as many.',
      [8_868_500, 700_000],
    ),
    frequency(
      'carrier-frequency',
      'Carrier frequency',
      'Let it run for five minutes, then trim it to 8.8685 MHz.',
      [...FREQUENCIES.carrier],
    ),
    driveLevel('carrier-level', 'Output level at TP2', 'Across 50 ohm at TP2.', RING_DRIVE),
    below(
      'carrier-harmonic',
      'Second harmonic, 20 dB down',
      'At 17.737 MHz, on one screen with the carrier.',
      20,
    ),
    photo('carrier-photo', 'Photo of the finished board', 'With the crystal’s can in view.'),
    eyes('carrier-starts', 'Starts every time', 'Switch it off and on five times, a few seconds apart.'),
  ],
};

export const micAmplifier: StageDescription = {
  name: 'Mic amplifier',
  summary: 'From a few millivolts of speech to what the modulator takes, and no hum on the way.',
  checks: [
    meter('mic-current', 'Supply current', 'In the 9 V lead, no signal.', [3, 0.8, 'mA']),
    meter('mic-output', 'Output at TP3', '5 mV rms at 1 kHz in, gain at its middle mark.', [150, 30, 'mV']),
    decibels(
      'mic-low-end',
      'Level at 300 Hz against 1 kHz',
      'Same input at 300 Hz; read the change at TP3 in decibels.',
      { low: -4, high: 0.5 },
      KINDS.meter,
    ),
    tick('mic-quiet', 'No hum or whistle at full gain', 'Listen at TP3 with the input shorted, then open.'),
    photo('mic-photo', 'Photo of the finished board', 'With the screened input lead in view.'),
  ],
};

export const localOscillator: StageDescription = {
  name: 'Local oscillator',
  summary: 'Tunes 22.87 to 23.22 MHz, so that less 8.87 MHz it covers the whole of 20 metres.',
  checks: [
    meter('lo-current', 'Supply current', 'In the 9 V lead.', [22, 4, 'mA']),
    seenFrequency(
      'lo-seen',
      'Swings where the coil says',
      'At the middle of the dial, by whole cycles at TP7; the coil’s turns are wrong if it is far off.',
      [23_043_500, 1_800_000],
    ),
    frequency('lo-low', 'Low end of the dial', 'Fully anticlockwise, never below the band’s edge.', [
      ...FREQUENCIES.oscillatorLowEnd,
    ]),
    frequency('lo-high', 'High end of the dial', 'Fully clockwise, never above the band’s edge.', [
      ...FREQUENCIES.oscillatorHighEnd,
    ]),
    driveLevel(
      'lo-level',
      'Output level at TP7',
      'Across 50 ohm at TP7, at the middle of the dial.',
      RING_DRIVE,
    ),
    below('lo-harmonic', 'Second harmonic, 25 dB down', 'At 46.1 MHz, on one screen with the carrier.', 25),
    tick('lo-drift', 'Drifts no more than 100 Hz in ten minutes', 'From ten minutes after switching on.'),
    photo('lo-photo', 'Photo of the finished board', 'With the screening can open.'),
  ],
};
