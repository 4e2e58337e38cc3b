import type { CheckDescription, LevelPointDescription } from '@ferrite-row/api/plans/plan-description';
import { around, KINDS, measured, plannedLevel, SCOPE_START } from './checks';

/** Power in the dummy load by an analyzer on its tap, 30 dB down, behind the club's 20 dB pad. */
export function tapPower(
  key: string,
  title: string,
  instruction: string,
  [low, high, target]: [number, number, number],
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'dummy-load-tap', unit: 'W', window: { low, high }, target, instrumentKind: KINDS.analyzer },
    defaults: {
      ...{ referenceLevelDbm: -10, dbPerDivision: 2, readToDivisions: 0.05 },
      // A tap and a pad checked against the signal generator stay within 0.3 dB: common practice.
      ...{ padsInLineDb: 20, padToleranceDb: 0.3, tapLossDb: 30, tapToleranceDb: 0.3 },
    },
  });
}

/** Peak envelope power of two equal tones, from the height of their envelope. */
export function envelopePeak(
  key: string,
  title: string,
  instruction: string,
  [target, tolerance]: [number, number],
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'two-tone-envelope', unit: 'dBm', target, window: around(target, tolerance) },
    ...{ defaults: SCOPE_START, instrumentKind: KINDS.scope },
  });
}

/** Third-order products of two equal tones, at least so many decibels below the peak envelope power. */
export function belowPeak(
  key: string,
  title: string,
  instruction: string,
  decibelsDown: number,
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'intermodulation', unit: 'dBc', window: { high: -decibelsDown } },
    defaults: { dbPerDivision: 10, readToDivisions: 0.05, scaleFidelityDb: 0.5, againstPeakEnvelopePower: 1 },
    instrumentKind: KINDS.analyzer,
  });
}

/** A level of the plan too small for an oscilloscope behind a ×10 probe: a log detector reads it to a few tenths. */
export const detectorLevel = (
  key: string,
  point: LevelPointDescription,
  instruction: string,
): CheckDescription =>
  plannedLevel(key, point, instruction, {
    // The detector's own line comes with the instrument.
    ...{ method: 'log-detector', defaults: { readToVolts: 0.005, padsInLineDb: 0 } },
    instrumentKind: KINDS.detector,
  });

/** A level of the plan by the builder's own diode probe and a multimeter: no other instrument is needed. */
export const probeLevel = (
  key: string,
  point: LevelPointDescription,
  instruction: string,
): CheckDescription =>
  plannedLevel(key, point, instruction, {
    method: 'diode-probe',
    // A germanium diode into ten megohms drops 0.2 to 0.4 V: common practice.
    defaults: { readToVolts: 0.01, diodeDropVolts: 0.3, diodeDropPlusMinusVolts: 0.1, loadOhms: 50 },
    instrumentKind: KINDS.meter,
  });

/** About the right frequency, by counting cycles along the oscilloscope's screen; the window is in hertz. */
export function seenFrequency(
  key: string,
  title: string,
  instruction: string,
  [target, tolerance]: [number, number],
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'time-base', unit: 'Hz', target, window: around(target, tolerance) },
    ...{ defaults: { readToDivisions: 0.1 }, instrumentKind: KINDS.scope },
  });
}
