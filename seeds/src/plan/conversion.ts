import type { StageDescription } from '@ferrite-row/api/plans/plan-description';
import { analyzerLevel, below, carried, gain, meter, photo, safety, scopeLevel } from './checks';
import { LEVELS, RING_DRIVE_LEVEL } from './levels';

/** Stages 8 and 9: to 14 MHz, and up to a milliwatt and a half. */
export const mixerAndBandPass: StageDescription = {
  name: 'Mixer and band-pass',
  summary: 'Local oscillator less IF gives 14.2 MHz; the band-pass filter keeps that and little else.',
  levelPoints: [LEVELS.mixer, LEVELS.bandPass],
  checks: [
    carried('mixer-drive', 'Drive from the local oscillator', 'lo-level', RING_DRIVE_LEVEL),
    carried('mixer-input', 'Input level at TP6', 'if-output', LEVELS.ifAmplifier),
    analyzerLevel(
      'mixer-output',
      LEVELS.mixer,
      'The product at 14.2 MHz alone, with the filter’s input disconnected and the analyzer as the load.',
    ),
    gain(
      'mixer-loss',
      'Conversion loss',
      ['mixer-output', 'mixer-input'],
      [LEVELS.ifAmplifier, LEVELS.mixer],
    ),
    scopeLevel('bandpass-output', LEVELS.bandPass, 'Filter connected again, 50 ohm at TP8.'),
    gain(
      'bandpass-loss',
      'Loss of the band-pass filter',
      ['bandpass-output', 'mixer-output'],
      [LEVELS.mixer, LEVELS.bandPass],
    ),
    below(
      'bandpass-leak',
      'Local oscillator, 40 dB down at TP8',
      'At 23.1 MHz against 14.2 MHz, one screen.',
      40,
    ),
    photo('mixer-photo', 'Photo of the finished board', 'With the ring and the filter’s coils in view.'),
  ],
};

export const preDriver: StageDescription = {
  name: 'Pre-driver',
  summary: 'Twenty decibels into 50 ohm at 14 MHz, still under ten milliwatts.',
  cautions: ['load before power'],
  levelPoints: [LEVELS.preDriver],
  checks: [
    meter('predriver-current', 'Supply current', 'In the 13.8 V lead, no signal.', [22, 3, 'mA']),
    carried('predriver-input', 'Input level at TP8', 'bandpass-output', LEVELS.bandPass),
    photo('predriver-photo', 'Photo of the finished board', 'Top and underside.'),
    scopeLevel('predriver-output', LEVELS.preDriver, 'At 14.1 MHz, 50 ohm fitted at TP9.'),
    gain(
      'predriver-gain',
      'Gain at 14.1 MHz',
      ['predriver-output', 'predriver-input'],
      [LEVELS.bandPass, LEVELS.preDriver],
    ),
    below(
      'predriver-harmonic',
      'Second harmonic, 25 dB down',
      'At 28.2 MHz, on one screen with the carrier.',
      25,
    ),
    safety(
      'predriver-load',
      'The 50 ohm load was at TP9 whenever it was on',
      'Without a load the stage can oscillate at full swing and spoil what is connected to it.',
    ),
  ],
};
