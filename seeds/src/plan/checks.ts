import type {
  CheckDescription,
  LevelPointDescription,
  MeasureDescription,
} from '@ferrite-row/api/plans/plan-description';

/** Kinds of instrument the plan asks for; the club's own have the same names. */
export const KINDS = {
  scope: 'Oscilloscope',
  analyzer: 'Spectrum analyzer',
  meter: 'Multimeter',
  counter: 'Frequency counter',
  load: 'Dummy load and wattmeter',
  detector: 'Log detector',
} as const;

/** Half a decibel wider than the gain's own tolerance would leave no room for the uncertainty of two readings. */
const GAIN_TOLERANCE_DB = 1.5;

export const tick = (key: string, title: string, instruction: string): CheckDescription => ({
  key,
  kind: 'tick',
  title,
  instruction,
});

export const safety = (key: string, title: string, instruction: string): CheckDescription => ({
  key,
  kind: 'safety',
  title,
  instruction,
});

export const photo = (key: string, title: string, instruction: string): CheckDescription => ({
  key,
  kind: 'photo',
  title,
  instruction,
});

export const eyes = (key: string, title: string, instruction: string): CheckDescription => ({
  key,
  kind: "mentor's eyes",
  title,
  instruction,
});

/** A check whose value is read or worked out. */
export const measured = (
  key: string,
  title: string,
  instruction: string,
  measure: MeasureDescription,
): CheckDescription => ({ key, kind: 'measure', title, instruction, measure });

/** A current, a voltage or a ratio read from a meter: about its target, by a tolerance in the same unit. */
export function meter(
  key: string,
  title: string,
  instruction: string,
  [target, tolerance, unit]: [number, number, 'V' | 'mV' | 'mA' | 'A'],
): CheckDescription {
  const window = around(target, tolerance);
  // A hand-held meter within 1 % on these ranges: common practice.
  return measured(key, title, instruction, {
    ...{ method: 'meter', unit, window, target, instrumentKind: KINDS.meter },
    defaults: { accuracyRel: 0.01 },
  });
}

/** How a level is taken: its method, the instrument's kind, and what its form starts with. */
type Way = Pick<MeasureDescription, 'method' | 'instrumentKind' | 'defaults'>;

/** A level of the plan, taken one way or another: its window is planned ± tolerance. */
export function plannedLevel(
  key: string,
  { testPoint, plannedDbm, toleranceDb }: LevelPointDescription,
  instruction: string,
  way: Way,
): CheckDescription {
  return measured(key, `Output level at ${testPoint}`, instruction, {
    ...{ unit: 'dBm', levelPoint: testPoint, target: plannedDbm },
    window: around(plannedDbm, toleranceDb),
    ...way,
  });
}

/** A level of the plan, read on the oscilloscope across the load. */
export const scopeLevel = (
  key: string,
  point: LevelPointDescription,
  instruction: string,
): CheckDescription =>
  plannedLevel(key, point, instruction, {
    ...{ method: 'oscilloscope', defaults: SCOPE_START, instrumentKind: KINDS.scope },
  });

/** What the scope's form starts with: the probe at ×10 into 50 ohm, read to a tenth of a division. */
export const SCOPE_START = { probeRatio: 10, loadOhms: 50, readToDivisions: 0.1 };

/** A level that is no column of the level diagram, such as an oscillator's drive. */
export function driveLevel(
  key: string,
  title: string,
  instruction: string,
  [target, tolerance]: [number, number],
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'oscilloscope', unit: 'dBm', target, window: around(target, tolerance) },
    defaults: SCOPE_START,
    instrumentKind: KINDS.scope,
  });
}

/** A level of the plan where other products stand beside the wanted one, so only the analyzer tells them apart. */
export const analyzerLevel = (
  key: string,
  point: LevelPointDescription,
  instruction: string,
): CheckDescription =>
  plannedLevel(key, point, instruction, {
    ...{ method: 'analyzer', instrumentKind: KINDS.analyzer },
    defaults: { referenceLevelDbm: 0, dbPerDivision: 10, readToDivisions: 0.02, padsInLineDb: 0 },
  });

/** A level measured at an earlier stage, carried over as what this stage is fed with. */
export function carried(
  key: string,
  title: string,
  from: string,
  { plannedDbm, toleranceDb }: Pick<LevelPointDescription, 'plannedDbm' | 'toleranceDb'>,
): CheckDescription {
  return measured(key, title, 'Carried over from the stage before; measure there again if it has changed.', {
    ...{ method: 'carried', unit: 'dBm', from: [from], target: plannedDbm },
    window: around(plannedDbm, toleranceDb),
  });
}

/** Output less input; a loss is negative. */
export function gain(
  key: string,
  title: string,
  [output, input]: [string, string],
  [before, after]: [LevelPointDescription, LevelPointDescription],
  window?: { low?: number; high?: number },
): CheckDescription {
  const target = tenths(after.plannedDbm - before.plannedDbm);
  return measured(key, title, 'Works itself out from the two levels, with both uncertainties.', {
    ...{ method: 'gain', unit: 'dB', from: [output, input], target },
    window: window ?? around(target, GAIN_TOLERANCE_DB),
  });
}

/** Something unwanted, at least so many decibels below the carrier. */
export function below(
  key: string,
  title: string,
  instruction: string,
  decibelsDown: number,
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'harmonic', unit: 'dBc', window: { high: -decibelsDown }, instrumentKind: KINDS.analyzer },
    defaults: { dbPerDivision: 10, readToDivisions: 0.05, scaleFidelityDb: 0.5, flatnessDb: 0.8 },
  });
}

/** A frequency from the counter; the window is in hertz. */
export function frequency(
  key: string,
  title: string,
  instruction: string,
  [low, high]: [number, number],
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'counter', unit: 'Hz', window: { low, high }, target: (low + high) / 2 },
    defaults: { gateSeconds: 1, timeBasePpm: 1 },
    instrumentKind: KINDS.counter,
  });
}

/** A ratio that an instrument shows in decibels; the fixed part is the limit of its difference of two readings. */
export function decibels(
  key: string,
  title: string,
  instruction: string,
  window: { low?: number; high?: number },
  instrumentKind: string,
): CheckDescription {
  return measured(key, title, instruction, {
    ...{ method: 'meter', unit: 'dB', window, instrumentKind },
    defaults: { readToValue: 0.1, accuracyRel: 0, accuracyFixed: 0.15 },
  });
}

/** From so much under a target to so much over it. */
export function around(target: number, tolerance: number): { low: number; high: number } {
  return { low: tenths(target - tolerance), high: tenths(target + tolerance) };
}

/** Sums of decimals, without the dust of binary fractions. */
function tenths(value: number): number {
  return Number(value.toFixed(6));
}
