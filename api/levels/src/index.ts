export {
  AskingError,
  LevelsError,
  OutOfDomainError,
  UnreadableQuantityError,
  WrongUnitError,
} from './errors';

export { dB, dBm, hertz, ohms, volts, watts } from './units';
export type { Dbm, Decibel, Hertz, Ohms, Volts, Watts } from './units';

export {
  dbFromPowerRatio,
  dbFromVoltageRatio,
  dbmFromVoltsPeakToPeak,
  dbmFromVoltsRms,
  dbmFromWatts,
  powerRatioFromDb,
  voltageRatioFromDb,
  voltsPeakToPeakFromDbm,
  voltsPeakToPeakFromRms,
  voltsRmsFromDbm,
  voltsRmsFromPeakToPeak,
  wattsFromDbm,
  wattsFromVoltsRms,
} from './conversions';

export { COVERAGE_FACTOR, dbFromPowerTolerance, dbFromVoltageTolerance, uncertaintyBudget } from './budget';
export type { Distribution, UncertaintyBudget, UncertaintyComponent, UncertaintySource } from './budget';

export type { Calculation, LevelReading, MeterUnit, ReadingUnit } from './reading';
export { ASSUMED_SCOPE_LIMITS, oscilloscopeReading, SCREEN_DIVISIONS } from './oscilloscope';
export type { OscilloscopeInput } from './oscilloscope';
export { dummyLoadReading } from './dummy-load';
export { analyzerReading, ASSUMED_PAD_TOLERANCE_DB, harmonicReading } from './analyzer';
export type { AnalyzerInput, HarmonicInput } from './analyzer';
export { meterReading } from './meter';
export type { MeterInput } from './meter';
export { counterReading } from './counter';
export type { CounterInput } from './counter';
export { gainBetween, gainReading, headroomTo, levelAfter, LOW_HEADROOM_DB } from './gain';
export type { GainInput, Headroom, MeasuredLevel } from './gain';

export { verdictOf, whyTooClose } from './verdict';
export type { StraddledEnd, Verdict, VerdictWindow } from './verdict';
export { SMALLEST_VOLTS_PER_DIVISION, tighterScale } from './tighter-scale';
export type { TighterScale } from './tighter-scale';
export { tooCloseText } from './too-close';

export { readQuantity } from './read-quantity';
export type { ReadQuantity } from './read-quantity';
export type { BaseUnit, Prefix, QuantityUnit } from './quantity-units';
export { decimalsFor, formatAtLeast, formatAtMost, formatFixed, formatReading, formatSigned } from './format';
export { formatQuantity, formatUnderstood } from './format-quantity';

export { ENTRY_METHODS, entryFields, methodGives } from './entry-fields';
export type { EntryField, EntryMethod } from './entry-fields';
export { ASSUMED, meterUnitOf, readEntry, readingFromInputs, scopeInput } from './entry';
export type { Assumptions, Entry, ReadEntry } from './entry';
