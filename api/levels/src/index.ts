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

export {
  nearestPreferred,
  PREFERRED_SERIES,
  preferredBetween,
  preferredNeighbours,
  preferredSignificands,
} from './pads/preferred-values';
export type { NearestPreferred, PreferredNeighbours, PreferredSeries } from './pads/preferred-values';
export { ENOUGH_REL, fittedPart } from './pads/fitted-part';
export type { FitChoice, FittedPart, PartQuantity } from './pads/fitted-part';
export { minimumLossDb, padValues } from './pads/pad-values';
export type { PadInput, PadKind, PadPoint, PadResistor } from './pads/pad-values';
export { padPerformance } from './pads/pad-performance';
export type { PadEnds, PadPerformance, PadPort } from './pads/pad-performance';
export { padWorstCase } from './pads/worst-case';
export type { PadWorstCase } from './pads/worst-case';
export { DERATING, ratingToBuy, RESISTOR_RATINGS_WATTS } from './pads/rating';
export type { ResistorRating } from './pads/rating';
export { designPad } from './pads/design-pad';
export type { DesignedResistor, DesignPadInput, PadDesign } from './pads/design-pad';

export { GREATEST_ORDER, mixingProducts, productTable } from './mixing/products';
export type { MixingInput, MixingProduct, ProductSign, ProductTable } from './mixing/products';
export { convert, receiveImage } from './mixing/conversion';
export type { Conversion, ReceiveImage, ReceiveInput, WantedProduct } from './mixing/conversion';
export { scanProducts } from './mixing/scan';
export type { Scan, ScanInput } from './mixing/scan';
export { crossovers } from './mixing/crossovers';
export type { Crossover, CrossoverInput } from './mixing/crossovers';
export { DIODE_RING, DIODE_RING_RANGES, productLevel } from './mixing/product-levels';
export type { FigureDb, MixerFigures, MixerLevels, ProductLevel } from './mixing/product-levels';
export { judgeProducts } from './mixing/judge-products';
export type { JudgedProduct, JudgedProducts, JudgeInput } from './mixing/judge-products';
export { DRIVE_WINDOW_DB, driveCheck } from './mixing/drive-check';
export type { DriveCheck, DriveInput } from './mixing/drive-check';

export { GREATEST_FILTER_ORDER, prototypeOf } from './filters/prototype';
export type { FilterFamily, Prototype, PrototypeInput } from './filters/prototype';
export {
  halfPowerRatio,
  idealAttenuationDb,
  leastOrder,
  returnLossFromRipple,
  rippleFromReturnLoss,
} from './filters/attenuation';
export type { OrderInput } from './filters/attenuation';
export type { Ladder, LadderElement } from './filters/ladder';
export { highPassLadder, lowPassLadder } from './filters/ladder-design';
export type { FirstElement, LadderInput } from './filters/ladder-design';
export {
  coupledResonatorBandPass,
  couplingCoefficients,
  dissipationLossDb,
} from './filters/coupled-resonators';
export type { BandPassInput, CouplingCoefficients } from './filters/coupled-resonators';
export { frequencyGrid, ladderResponse, PERFECT_RETURN_LOSS_DB } from './filters/response';
export type { LadderResponse, PartQ } from './filters/response';
export { ladderMatrix } from './filters/abcd';
export type { ChainMatrix, Complex } from './filters/abcd';
export { fitLadder } from './filters/fit-ladder';
export type { FitLadderInput, FittedElement, FittedLadder } from './filters/fit-ladder';
export { trimmedLadder } from './filters/trim';
export { ladderBuilds, spreadBands } from './filters/spread';
export type { Builds, SpreadBands, SpreadInput } from './filters/spread';
export { harmonicRejections, powerShares } from './filters/rejection';
export type { HarmonicNeed, HarmonicRejection, PowerShares } from './filters/rejection';
export {
  alFromMicrohenriesPer100,
  alFromMillihenriesPer1000,
  alFromWinding,
  henriesOfTurns,
  turnsFor,
} from './matching/turns';
export type { Turns } from './matching/turns';
export {
  matchFromImpedance,
  matchFromReflection,
  matchFromReturnLoss,
  matchFromVswr,
  mismatchBounds,
} from './matching/match';
export type { Impedance, Match, MismatchBounds } from './matching/match';
export { lNetworkLoss } from './matching/l-network-loss';
export type { LNetworkLoss } from './matching/l-network-loss';
export { lNetworks } from './matching/l-network';
export type { LNetwork, LNetworkInput } from './matching/l-network';
export {
  capacitiveReactance,
  coilQ,
  inductiveReactance,
  loadedQ,
  resonantHertz,
  resonatingFarads,
  resonatingHenries,
  resonatorLossDb,
} from './matching/resonance';
export {
  COPPER_OHM_METRES,
  peakFluxTesla,
  singleLayerHenries,
  singleLayerTurns,
  skinDepthMetres,
  wireOhmsPerMetre,
} from './matching/windings';
export type { FluxInput, SingleLayerCoil } from './matching/windings';

export { chainOf } from './chain/chain';
export type { ChainInput, ChainRow, ChainStage } from './chain/chain';
export { noiseDbm, noiseKelvin, REFERENCE_KELVIN } from './chain/noise';
export { secondHarmonicIntercept, twoToneFromIntercept, twoToneOf, twoToneProducts } from './chain/two-tone';
export type { TwoTone, TwoToneProducts } from './chain/two-tone';
export { explainShortfall, shortfallText } from './chain/shortfall';
export type { PlannedStage, Shortfall, StageShare } from './chain/shortfall';

export { US_97 } from './rule-sets/us-97';
export { IARU_REGION_1 } from './rule-sets/iaru-region-1';
export { ICNIRP_EXPOSURE, MODE_DUTY, US_EXPOSURE } from './rule-sets/exposure-limits';
export type { ExposureLimits, ExposureRow, ExposureTier } from './rule-sets/exposure-limits';
export type {
  BandRow,
  ChannelRow,
  ClassRow,
  EmissionKind,
  NoteRow,
  PowerRow,
  RuleSet,
  SegmentRow,
  Span,
} from './rule-sets/rule-set';
export type { SpuriousRule, SpuriousRuleId } from './rule-sets/spurious-rules';
export { occupiedBand } from './guards/occupied';
export type { EmissionSide, OccupiedBand } from './guards/occupied';
export { bandsOf } from './guards/bands';
export type { AmateurBand } from './guards/bands';
export { checkEmission } from './guards/check-emission';
export type { EmissionCheck } from './guards/check-emission';
export type { EmissionInput } from './guards/asked';
export type { EmissionReason } from './guards/emission-reasons';
export type { PowerLimit } from './guards/power-limits';
export { radiatedPower } from './guards/radiated-power';
export type { PowerInput, RadiatedPower } from './guards/radiated-power';
export { harmonicFilterFor, judgeSpurs, SPURIOUS_RULE_IDS, spuriousLimit } from './guards/spurious';
export type {
  HarmonicFilter,
  HarmonicFilterInput,
  JudgedSpur,
  MeasuredSpur,
  SpuriousLimit,
} from './guards/spurious';
export { GUARD_MARGIN_DB, instrumentGuard } from './guards/instrument-guard';
export type { GuardInput, GuardPad, GuardResult } from './guards/instrument-guard';
export {
  densityAt,
  exposureDistances,
  exposureExemption,
  exposureLimit,
  onFraction,
} from './guards/exposure';
export type { ExposureDistance, ExposureExemption, ExposureInput } from './guards/exposure';
export { deratedWatts, heatChain, HOT_TO_TOUCH_CELSIUS, sinkNeeded } from './guards/heat-sink';
export type { HeatChain, HeatPath, SinkNeeded } from './guards/heat-sink';
export {
  classBEfficiency,
  classBHeat,
  loadForPower,
  supplyBalance,
  supplyDropVolts,
} from './guards/power-stage';
export type { ClassBHeat, SupplyWire } from './guards/power-stage';
export { densityOfField, exposureSum, isExemptByPower } from './guards/exposure-sources';
export type { ExposureSum } from './guards/exposure-sources';
export type { AmplifierClass, SupplyBalance, SupplyInput } from './guards/power-stage';

export { ASSUMED_METER_ACCURACY_REL, logDetectorReading } from './readings/log-detector';
export type { DetectorLine, DetectorTable, LogDetectorInput } from './readings/log-detector';
export { diodeProbeReading } from './readings/diode-probe';
export type { DiodeProbeInput } from './readings/diode-probe';
export { twoToneEnvelopeReading } from './readings/two-tone-envelope';
export type { TwoToneEnvelopeReading } from './readings/two-tone-envelope';
export { intermodulationReading } from './readings/intermodulation';
export type { IntermodulationInput } from './readings/intermodulation';
export { dummyLoadTapReading } from './readings/dummy-load-tap';
export type { DummyLoadTapInput } from './readings/dummy-load-tap';
export { ASSUMED_TIME_BASE_REL, timeBaseReading } from './readings/time-base';
export { ASSUMED_RISE_REL, riseTimeReading } from './readings/rise-time';
export type { RiseTimeInput, RiseTimeReading } from './readings/rise-time';
export type { TimeBaseInput } from './readings/time-base';
export { probeLoading } from './readings/probe-loading';
export type { ProbeLoading, ProbeLoadingInput } from './readings/probe-loading';

export {
  dbFromNepers,
  emfLevelFromMatched,
  levelFigures,
  levelFrom,
  loadedLevel,
  sumOfLevels,
  voltageLevel,
  voltsRmsFromLevel,
} from './voltage-levels';
export type {
  Addition,
  LevelFigures,
  LevelQuantity,
  LoadedLevel,
  LoadedSource,
  VoltageLevelUnit,
} from './voltage-levels';

export { verdictOf, whyTooClose } from './verdict';
export type { StraddledEnd, Verdict, VerdictWindow } from './verdict';
export { SMALLEST_VOLTS_PER_DIVISION, tighterScale } from './tighter-scale';
export type { TighterScale } from './tighter-scale';
export { tooCloseText } from './too-close';

export { readQuantity } from './read-quantity';
export type { ReadQuantity } from './read-quantity';
export { baseUnitsIn } from './quantity-units';
export type { BaseUnit, Prefix, QuantityUnit } from './quantity-units';
export { decimalsFor, formatAtLeast, formatAtMost, formatFixed, formatReading, formatSigned } from './format';
export { formatQuantity, formatUnderstood } from './format-quantity';

export { ENTRY_METHODS, entryFields, METER_UNITS, methodGives, methodUnit } from './entry-fields';
export type { EntryField, EntryMethod } from './entry-fields';
export { meterUnitOf, readEntry } from './entry';
export type { Entry, ReadEntry } from './entry';
export { assumptionsWith, figuresFor, figureWords, INSTRUMENT_FIGURES } from './instrument-figures';
export type { FigureWords, InstrumentFigures } from './instrument-figures';
export { ASSUMED, readingFromInputs, scopeInput } from './entry-readings';
export type { Assumptions } from './entry-readings';
