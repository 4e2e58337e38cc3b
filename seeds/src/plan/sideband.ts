import type { StageDescription } from '@ferrite-row/api/plans/plan-description';
import {
  below,
  carried,
  decibels,
  eyes,
  frequency,
  gain,
  KINDS,
  meter,
  photo,
  scopeLevel,
  tick,
} from './checks';
import { FREQUENCIES, LEVELS, RING_DRIVE_LEVEL } from './levels';
import { detectorLevel } from './other-ways';

/** Stages 4 to 6: from a carrier and a voice to one sideband at 8.867 MHz. */
export const balancedModulator: StageDescription = {
  name: 'Balanced modulator',
  summary: 'A diode ring that lets both sidebands through and holds the carrier back.',
  levelPoints: [LEVELS.modulator],
  checks: [
    carried('modulator-carrier', 'Carrier drive from stage 2', 'carrier-level', RING_DRIVE_LEVEL),
    scopeLevel('modulator-output', LEVELS.modulator, '1 kHz at 150 mV in, balance trimmed, 50 ohm at TP4.'),
    below(
      'modulator-carrier-left',
      'Carrier left over, 35 dB down',
      'One sideband against the carrier between them, 1 kHz apart on the screen.',
      35,
    ),
    photo('modulator-photo', 'Photo of the finished board', 'With the two transformers in view.'),
    eyes(
      'modulator-holds',
      'Balance holds when the board is tapped',
      'Tap it with a pencil and watch the carrier.',
    ),
  ],
};

export const crystalFilter: StageDescription = {
  name: 'Crystal filter',
  summary: 'Four crystals that pass 2.4 kHz and cut the other sideband off.',
  levelPoints: [LEVELS.filter],
  checks: [
    carried('filter-input', 'Input level at TP4', 'modulator-output', LEVELS.modulator),
    detectorLevel(
      'filter-output',
      LEVELS.filter,
      'At the middle of the passband, the detector’s own 50 ohm at TP5. Some 40 mV: behind a ×10 probe a scope shows too little.',
    ),
    gain(
      'filter-loss',
      'Loss of the filter',
      ['filter-output', 'filter-input'],
      [LEVELS.modulator, LEVELS.filter],
    ),
    frequency('filter-low-edge', 'Lower edge, 6 dB down', 'Tune down from the middle until TP5 has halved.', [
      ...FREQUENCIES.filterLowEdge,
    ]),
    frequency('filter-high-edge', 'Upper edge, 6 dB down', 'Tune up from the middle until TP5 has halved.', [
      ...FREQUENCIES.filterHighEdge,
    ]),
    photo('filter-photo', 'Photo of the finished board', 'With the crystals’ cans earthed.'),
  ],
};

export const ifAmplifier: StageDescription = {
  name: 'IF amplifier',
  summary: 'Makes up for the filter and sets the level the mixer is made for.',
  levelPoints: [LEVELS.ifAmplifier],
  checks: [
    meter('if-current', 'Supply current', 'In the 9 V lead.', [8, 1, 'mA']),
    carried('if-input', 'Input level at TP5', 'filter-output', LEVELS.filter),
    scopeLevel('if-output', LEVELS.ifAmplifier, 'At 8.867 MHz, 50 ohm at TP6.'),
    gain('if-gain', 'Gain at 8.867 MHz', ['if-output', 'if-input'], [LEVELS.filter, LEVELS.ifAmplifier], {
      low: 12.5,
      high: 15.5,
    }),
    decibels(
      'if-tilt',
      'Passband tilt',
      'Level at the lower edge against the upper, in decibels.',
      { high: 1 },
      KINDS.scope,
    ),
    photo('if-photo', 'Photos of the finished board', 'Top and underside; one of the trace at TP6.'),
    eyes('if-joints', 'Looked at the joints and screening', 'With a glass, both sides.'),
    eyes('if-stable', 'Stable with input open and shorted', 'No signal at TP6 either way.'),
    tick('if-heard', 'Heard the stage working', 'A tone at the input, a receiver near TP6.'),
  ],
};
