import { requireWithin } from '../domain';
import { designPad } from '../pads/design-pad';
import type { PadDesign } from '../pads/design-pad';
import type { PreferredSeries } from '../pads/preferred-values';
import { wattsFromDbm } from '../conversions';
import { dBm } from '../units';

/** A drive within this of the rated one is left as it is; common practice. */
export const DRIVE_WINDOW_DB = 1;

/** A local-oscillator source and the mixer it drives. */
export interface DriveInput {
  /** What the mixer is made for: +7 dBm for a level-7 diode ring. */
  ratedDbm: number;
  /** What the source gives into `ohms`. */
  sourceDbm: number;
  /** 50 where left out. */
  ohms?: number;
  /** How far from the rated drive is well enough; {@link DRIVE_WINDOW_DB} where left out. */
  windowDb?: number;
  /** Of the pad's resistors; E24 where left out. */
  series?: PreferredSeries;
  kind?: 'pi' | 'tee';
  toleranceRel?: number;
}

/** What to do about a drive. */
export interface DriveCheck {
  drive: 'right' | 'too weak' | 'too strong';
  /** Source less rated, dB: positive is too much. */
  overDb: number;
  /** Only when too strong. */
  pad?: PadDesign;
  /** At the mixer, with the pad where there is one. */
  deliveredDbm: number;
}

/**
 * Checks a local oscillator against the drive its mixer is rated for, and designs the pad that corrects it.
 *
 * Too little drive costs loss and linearity, and no pad mends it; too much heats the diodes and leaks further.
 *
 * @throws OutOfDomainError naming the input.
 * @example driveCheck({ ratedDbm: 7, sourceDbm: 10 }).pad.resistors.map(({ ohms }) => ohms) //=> [300, 18, 300]
 * @example driveCheck({ ratedDbm: 7, sourceDbm: 10 }).deliveredDbm //=> 7.005357
 * @example driveCheck({ ratedDbm: 7, sourceDbm: 4 }) //=> { drive: 'too weak', overDb: -3, deliveredDbm: 4 }
 * @see common practice for the class of mixer; `designPad` for the pad
 */
export function driveCheck(input: DriveInput): DriveCheck {
  const { windowDb = DRIVE_WINDOW_DB, ohms = 50, kind = 'pi', series = 'E24', toleranceRel = 0.05 } = input;
  const rated = dBm(input.ratedDbm, 'ratedDbm');
  const source = dBm(input.sourceDbm, 'sourceDbm');
  requireWithin({ input: 'windowDb', label: 'Window', unit: 'dB', above: 0, atMost: 20 }, windowDb);
  const overDb = source - rated;
  if (overDb < -windowDb) return { drive: 'too weak', overDb, deliveredDbm: source };
  if (overDb <= windowDb) return { drive: 'right', overDb, deliveredDbm: source };
  const pad = designPad({
    kind,
    lossDb: overDb,
    sourceOhms: ohms,
    loadOhms: ohms,
    series,
    toleranceRel,
    inputWatts: wattsFromDbm(source),
  });
  return { drive: 'too strong', overDb, pad, deliveredDbm: source - pad.fitted.lossDb };
}
