import { requireWithin } from '../domain';
import { wattsFromDbm } from '../conversions';
import { ratingToBuy } from '../pads/rating';
import { dBm } from '../units';

/** Losses pads are sold and built in, dB; common practice. */
const PAD_LOSSES_DB = [3, 6, 10, 20, 30, 40];

/** Room to keep under a damage level, dB: a carrier off by a little, a keying peak; common practice. */
export const GUARD_MARGIN_DB = 10;

/** An instrument and what is about to be connected to it. */
export interface GuardInput {
  /** Highest level the stage can give, not the one that is hoped for. */
  levelDbm: number;
  /** How far off that may be, dB; 0 where left out. */
  plusMinusDb?: number;
  /** At the instrument's connector, from its plate or manual. */
  damageDbm: number;
  /** Pads already in the line, 0 or more. */
  padsInLineDb?: number;
  /** Room to keep; {@link GUARD_MARGIN_DB} where left out. */
  marginDb?: number;
  /** Direct voltage on the line, and what the instrument stands; both or neither. */
  directVolts?: number;
  greatestDirectVolts?: number;
}

/** A pad that takes a level out of harm's way. */
export interface GuardPad {
  lossDb: number;
  /** Power that goes into it, average. */
  inputWatts: number;
  /** Rating to buy for it; absent when no part of the list stands it. */
  ratingWatts?: number;
}

/** What a level does to an instrument. It never says that a connection is safe. */
export interface GuardResult {
  /** 'would harm': may reach the damage level; 'little room': nearer than the margin; 'under the limit': neither. */
  state: 'would harm' | 'little room' | 'under the limit';
  /** At the connector, with the uncertainty added. */
  worstDbm: number;
  /** Damage level less that; negative is over it. */
  roomDb: number;
  /** What to put in line first, from the stage on, besides the pads there; empty when none is needed. */
  pads: GuardPad[];
  /** A capacitor in series is needed against direct voltage: no pad helps there. */
  needsBlock: boolean;
}

/**
 * Whether a level would harm an instrument, and which pads of which rating keep it away.
 *
 * Switch nothing on before the pads are in. The first pad takes nearly all of the power and gets hot; no pad keeps a
 * direct voltage away that it passes on.
 *
 * @throws OutOfDomainError naming the input.
 * @example instrumentGuard({ levelDbm: 37, damageDbm: 30 }).pads //=> [{ lossDb: 20, inputWatts: 5.011872, ratingWatts: 25 }]
 * @example instrumentGuard({ levelDbm: 10, damageDbm: 30 }).state //=> 'under the limit'
 * @see common practice; `ratingToBuy` for the rating
 */
export function instrumentGuard(input: GuardInput): GuardResult {
  const { plusMinusDb = 0, padsInLineDb = 0, marginDb = GUARD_MARGIN_DB } = input;
  const level = dBm(input.levelDbm, 'levelDbm');
  const damage = dBm(input.damageDbm, 'damageDbm');
  const decibel = { unit: 'dB', atLeast: 0, atMost: 200 };
  requireWithin({ ...decibel, input: 'plusMinusDb', label: 'Uncertainty' }, plusMinusDb);
  requireWithin({ ...decibel, input: 'padsInLineDb', label: 'Pads in line' }, padsInLineDb);
  requireWithin({ ...decibel, input: 'marginDb', label: 'Room to keep' }, marginDb);
  const worstDbm = level + plusMinusDb - padsInLineDb;
  const roomDb = damage - worstDbm;
  const needsBlock = directHarms(input);
  // A pad that fits exactly must be enough, binary noise or not.
  const isClose = roomDb < marginDb - 1e-9;
  return {
    state: roomDb <= 0 || needsBlock ? 'would harm' : isClose ? 'little room' : 'under the limit',
    worstDbm,
    roomDb,
    pads: isClose ? padsFor(marginDb - roomDb, level + plusMinusDb) : [],
    needsBlock,
  };
}

function directHarms({ directVolts, greatestDirectVolts }: GuardInput): boolean {
  if (directVolts === undefined && greatestDirectVolts === undefined) return false;
  const domain = { unit: 'V', atLeast: 0, atMost: 1e6 };
  const greatest = { ...domain, input: 'greatestDirectVolts', label: 'Direct voltage it stands' };
  requireWithin(greatest, greatestDirectVolts ?? NaN);
  const present = { ...domain, input: 'directVolts', label: 'Direct voltage on the line', atLeast: -1e6 };
  return Math.abs(requireWithin(present, directVolts ?? NaN)) > (greatestDirectVolts ?? 0);
}

/** One pad that is enough where there is one, otherwise the largest first and then what is left. */
function padsFor(neededDb: number, levelDbm: number): GuardPad[] {
  const pads: GuardPad[] = [];
  let [left, level] = [neededDb, levelDbm];
  while (left > 1e-9) {
    const lossDb = PAD_LOSSES_DB.find((loss) => loss >= left - 1e-9) ?? 40;
    const inputWatts = wattsFromDbm(dBm(level));
    pads.push({ lossDb, inputWatts, ratingWatts: ratingToBuy(inputWatts).ratingWatts });
    left -= lossDb;
    level -= lossDb;
  }
  return pads;
}
