import type { StageDescription } from '@ferrite-row/api/plans/plan-description';
import {
  below,
  carried,
  decibels,
  eyes,
  gain,
  KINDS,
  meter,
  photo,
  safety,
  scopeLevel,
  tick,
} from './checks';
import { LEVELS } from './levels';
import { belowPeak, envelopePeak, probeLevel, tapPower } from './other-ways';

/** Stages 10 to 12: where it can burn, and where it can be heard. */
export const driver: StageDescription = {
  name: 'Driver',
  summary: 'A tenth of a watt for the power amplifier, from a transistor on a small heatsink.',
  cautions: ['load before power', 'hot parts'],
  levelPoints: [LEVELS.driver],
  checks: [
    safety(
      'driver-load',
      'Load fitted and heatsink mounted before power',
      '50 ohm, half a watt or more, at TP10. The heatsink stays hot after switching off.',
    ),
    meter('driver-bias', 'Standing current', 'In the 13.8 V lead, no signal, after two minutes.', [
      70,
      10,
      'mA',
    ]),
    carried('driver-input', 'Input level at TP9', 'predriver-output', LEVELS.preDriver),
    probeLevel(
      'driver-output',
      LEVELS.driver,
      'At 14.1 MHz, 50 ohm at TP10, by your own diode probe: the peak here is 3.3 V, well over its drop.',
    ),
    gain(
      'driver-gain',
      'Gain at 14.1 MHz',
      ['driver-output', 'driver-input'],
      [LEVELS.preDriver, LEVELS.driver],
    ),
    below('driver-harmonic', 'Second harmonic, 25 dB down', 'At 28.2 MHz through the 20 dB pad.', 25),
    photo('driver-photo', 'Photo of the finished board', 'With the heatsink on.'),
    eyes(
      'driver-mounting',
      'Transistor flat on its heatsink, washer in place',
      'Insulation checked with the ohmmeter, unplugged.',
    ),
  ],
};

export const amplifierAndLowPass: StageDescription = {
  name: 'PA and low-pass',
  summary: 'Five watts into the dummy load, and its harmonics below the limit.',
  cautions: ['rf power', 'load before power', 'hot parts'],
  levelPoints: [LEVELS.amplifier, LEVELS.lowPass],
  checks: [
    safety(
      'pa-load',
      'Dummy load of 10 W or more connected and checked',
      'Read 50 ohm at the plug first. Say “power on” to the bench. RF burns are deep; touch nothing while it is keyed.',
    ),
    meter('pa-idle', 'Idle current', 'No drive, after two minutes.', [100, 10, 'mA']),
    carried('pa-input', 'Input level at TP10', 'driver-output', LEVELS.driver),
    scopeLevel(
      'pa-output',
      LEVELS.amplifier,
      'Filter bypassed, dummy load at TP11A, at most ten seconds keyed.',
    ),
    gain('pa-gain', 'Gain at 14.1 MHz', ['pa-output', 'pa-input'], [LEVELS.driver, LEVELS.amplifier]),
    scopeLevel('lowpass-output', LEVELS.lowPass, 'Filter in line, dummy load at TP11.'),
    gain(
      'lowpass-loss',
      'Loss of the low-pass filter',
      ['lowpass-output', 'pa-output'],
      [LEVELS.amplifier, LEVELS.lowPass],
      // Two scope readings are good to 0.6 dB, so a loss is only asked to be small; a filter cannot amplify.
      { low: -1.5 },
    ),
    // +35 and +39 dBm are 3.16 and 7.94 W, rounded inwards: a second way to the same power, each good to about 1 dB.
    tapPower(
      'pa-power',
      'Power in the dummy load, by its tap',
      'Key down, five seconds. The 20 dB pad between tap and analyzer, always: −13 dBm are left at its input.',
      [3.2, 7.9, 5],
    ),
    envelopePeak(
      'pa-envelope',
      'Peak envelope power, two tones',
      '700 and 1,900 Hz, equal, into the microphone input; the envelope’s widest height at TP11.',
      [LEVELS.lowPass.plannedDbm, LEVELS.lowPass.toleranceDb],
    ),
    // Amateur transmitters reach 25 to 35 dB below the peak: common practice.
    belowPeak(
      'pa-products',
      'Third-order products, 25 dB below the peak',
      'The same two tones, on the tap behind the 20 dB pad, 1 kHz a division.',
      25,
    ),
    meter('pa-current', 'Supply current at full power', 'Key down, five seconds.', [1, 0.25, 'A']),
    // 43 + 10 lg 5 = 49.99 dB: ITU Radio Regulations, Appendix 3, amateur stations under 30 MHz (from memory).
    below(
      'pa-harmonic',
      'Second harmonic, 50 dB down',
      'At 28.2 MHz through the 30 dB power pad and the 20 dB pad. Local rules may ask for more.',
      50,
    ),
    tick(
      'pa-heat',
      'Heatsink under 60 °C after five minutes',
      'Ten seconds keyed in every thirty. Measure beside the transistor; it stays hot for ten minutes after.',
    ),
    photo('pa-photo', 'Photo of the finished board', 'With the heatsink and the filter’s coils in view.'),
  ],
};

export const onTheAir: StageDescription = {
  name: 'On the air',
  summary: 'Into an aerial for the first time, under a licence that covers it.',
  cautions: ['licence needed', 'rf exposure', 'rf power'],
  checks: [
    safety(
      'air-licence',
      'A licence for this band, mode and power is in force',
      'Yours, or that of the licensed person who supervises you. An organiser has seen it. Local rules decide.',
    ),
    safety(
      'air-exposure',
      'RF exposure worked out for this aerial and place',
      'Distance and time for people near the aerial, by your country’s rules, written down and on file.',
    ),
    decibels(
      'air-return-loss',
      'Return loss of the aerial',
      'At the plug, over 14.0 to 14.35 MHz, worst value. 14 dB is a standing-wave ratio of 1.5.',
      { low: 14 },
      KINDS.load,
    ),
    tick('air-listen', 'Listened first, and the frequency was clear', 'Then asked whether it is in use.'),
    eyes('air-signal', 'Signal heard clean on the club’s receiver', 'No clicks, no hum, no second signal.'),
    tick('air-logged', 'First contact written in the log', 'Time, frequency, mode and power.'),
  ],
};
