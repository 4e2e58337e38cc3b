import { dbmFromVoltsRms, dbmFromWatts, voltsRmsFromDbm, wattsFromDbm } from './conversions';
import { requireSome, requireWithin } from './domain';
import { dBm, ohms, volts, watts } from './units';
import type { Dbm, Ohms, Volts } from './units';

// Voltage levels: they say nothing of a resistance. Definitions: Recommendation ITU-R V.574; IEC 60027-3.

/** Volts at 0 dBu: what 1 mW makes in 600 ohm. */
const VOLTS_AT_0_DBU = Math.sqrt(0.6);

/** Decibels above one volt rms, above one microvolt rms, and above 0.775 V rms. */
export type VoltageLevelUnit = 'dBV' | 'dBµV' | 'dBu';

const REFERENCE_VOLTS: Record<VoltageLevelUnit, number> = { dBV: 1, dBµV: 1e-6, dBu: VOLTS_AT_0_DBU };

/**
 * Voltage level of an rms voltage.
 *
 * @throws OutOfDomainError when the voltage is zero: nothing has no level.
 * @example voltageLevel(volts(0.223607), 'dBµV') //=> 106.989708
 * @example voltageLevel(volts(1), 'dBV') //=> 0
 * @see Recommendation ITU-R V.574
 */
export function voltageLevel(voltsRms: Volts, unit: VoltageLevelUnit): number {
  const positive = requireWithin({ input: 'voltsRms', label: 'Voltage', unit: 'V', above: 0 }, voltsRms);
  return 20 * Math.log10(positive / REFERENCE_VOLTS[unit]);
}

/**
 * Rms voltage of a voltage level.
 *
 * @param level - −400 to +400 dB.
 * @throws OutOfDomainError outside that.
 * @example voltsRmsFromLevel(4, 'dBu') //=> 1.227653
 * @see Recommendation ITU-R V.574
 */
export function voltsRmsFromLevel(level: number, unit: VoltageLevelUnit): Volts {
  requireWithin({ input: 'level', label: 'Voltage level', unit, atLeast: -400, atMost: 400 }, level);
  return volts(REFERENCE_VOLTS[unit] * 10 ** (level / 20));
}

/**
 * Level of a source's emf (open circuit) from its voltage level across a matched load.
 *
 * @returns in the same unit, 6.02 dB higher.
 * @throws OutOfDomainError when not finite.
 * @example emfLevelFromMatched(34) //=> 40.0206
 * @see a matched load takes half of the emf
 */
export function emfLevelFromMatched(level: number): number {
  return (
    requireWithin({ input: 'level', label: 'Voltage level', atLeast: -400, atMost: 400 }, level) +
    20 * Math.log10(2)
  );
}

/** A level told every way it can be told in one resistance; a sine where it is a peak. */
export interface LevelFigures {
  dbm: number;
  watts: number;
  voltsRms: number;
  voltsPeak: number;
  voltsPeakToPeak: number;
  amperesRms: number;
  dbv: number;
  dbMicrovolt: number;
  dbu: number;
}

/**
 * Every figure of a level across a resistance.
 *
 * @example levelFigures(dBm(0), ohms(50)).dbMicrovolt //=> 106.9897
 * @example levelFigures(dBm(30), ohms(50)).voltsPeak //=> 10
 * @see IEC 60027-3; Recommendation ITU-R V.574; P = V²/R
 */
export function levelFigures(level: Dbm, resistance: Ohms): LevelFigures {
  const dbm = dBm(level);
  const voltsRms = voltsRmsFromDbm(dbm, ohms(resistance));
  return {
    dbm,
    watts: wattsFromDbm(dbm),
    voltsRms,
    voltsPeak: voltsRms * Math.SQRT2,
    voltsPeakToPeak: voltsRms * 2 * Math.SQRT2,
    amperesRms: voltsRms / resistance,
    dbv: voltageLevel(voltsRms, 'dBV'),
    dbMicrovolt: voltageLevel(voltsRms, 'dBµV'),
    dbu: voltageLevel(voltsRms, 'dBu'),
  };
}

/** What a member may start from. */
export type LevelQuantity = keyof LevelFigures;

/**
 * Level of any one figure across a resistance: the way back from `levelFigures`.
 *
 * @param quantity - the name of the figure.
 * @throws OutOfDomainError naming it; a power, voltage or current must be above 0.
 * @example levelFrom('amperesRms', 0.02, ohms(50)) //=> 13.0103
 * @example levelFrom('voltsPeak', 0, ohms(50)) //=> throws OutOfDomainError
 * @see as `levelFigures`
 */
export function levelFrom(quantity: LevelQuantity, value: number, resistance: Ohms): Dbm {
  const load = ohms(resistance);
  const rms = (voltsRms: number) => dbmFromVoltsRms(volts(voltsRms, quantity), load);
  const positive = () => requireWithin({ input: quantity, label: 'Value', above: 0, atMost: 1e18 }, value);
  switch (quantity) {
    case 'dbm':
      return dBm(value);
    case 'watts':
      return dbmFromWatts(watts(positive()));
    case 'voltsRms':
      return rms(positive());
    case 'voltsPeak':
      return rms(positive() / Math.SQRT2);
    case 'voltsPeakToPeak':
      return rms(positive() / (2 * Math.SQRT2));
    case 'amperesRms':
      return rms(positive() * load);
    case 'dbv':
      return rms(voltsRmsFromLevel(value, 'dBV'));
    case 'dbMicrovolt':
      return rms(voltsRmsFromLevel(value, 'dBµV'));
    case 'dbu':
      return rms(voltsRmsFromLevel(value, 'dBu'));
  }
}

/** Whether signals add as powers, or in phase as voltages, which is the most they can. */
export type Addition = 'power' | 'voltage';

/**
 * Level of several signals together in one resistance.
 *
 * @param levels - dBm, 1 to 1000.
 * @param how - 'power' for signals that have nothing to do with each other, 'voltage' for the worst case in phase.
 * @throws OutOfDomainError naming the input.
 * @example sumOfLevels([0, 0], 'power') //=> 3.0103
 * @example sumOfLevels([0, 0], 'voltage') //=> 6.0206
 * @see textbook
 */
export function sumOfLevels(levels: readonly number[], how: Addition): Dbm {
  requireSome({ input: 'levels', label: 'Levels' }, levels);
  const per = how === 'power' ? 10 : 20;
  return dBm(per * Math.log10(levels.reduce((sum, level) => sum + 10 ** (dBm(level, 'levels') / per), 0)));
}

/**
 * Decibels of a number of nepers.
 *
 * @throws OutOfDomainError when outside ±100 Np.
 * @example dbFromNepers(1) //=> 8.68589
 * @see Recommendation ITU-R V.574: 1 Np = 20/ln 10 dB
 */
export function dbFromNepers(nepers: number): number {
  return (
    (20 / Math.LN10) *
    requireWithin({ input: 'nepers', label: 'Nepers', unit: 'Np', atLeast: -100, atMost: 100 }, nepers)
  );
}

/** A source and the load on it. */
export interface LoadedSource {
  emfVoltsRms: number;
  sourceOhms: number;
  loadOhms: number;
}

/** What a load gets. */
export interface LoadedLevel {
  voltsRms: number;
  dbm: number;
  /** Against a matched load, dB; 0 or less. */
  mismatchDb: number;
}

/**
 * Voltage and level in a load on a source.
 *
 * @throws OutOfDomainError naming the input.
 * @example loadedLevel({ emfVoltsRms: 1, sourceOhms: 50, loadOhms: 50 }).dbm //=> 6.9897
 * @see voltage divider
 */
export function loadedLevel({ emfVoltsRms, sourceOhms, loadOhms }: LoadedSource): LoadedLevel {
  requireWithin(
    { input: 'emfVoltsRms', label: 'Open-circuit voltage', unit: 'V', above: 0, atMost: 1e9 },
    emfVoltsRms,
  );
  const [source, load] = [ohms(sourceOhms, 'sourceOhms'), ohms(loadOhms, 'loadOhms')];
  const voltsRms = volts((emfVoltsRms * load) / (source + load));
  const mismatchDb = Math.min(10 * Math.log10((4 * source * load) / (source + load) ** 2), 0);
  return { voltsRms, dbm: dbmFromVoltsRms(voltsRms, load), mismatchDb };
}
