import {
  dBm,
  dbmFromWatts,
  designPad,
  OutOfDomainError,
  ratingToBuy,
  watts,
  wattsFromDbm,
  type DesignedResistor,
  type PadDesign,
  type ResistorRating,
} from '@ferrite-row/levels';
import type { PadInputs } from './inputs';

/** One resistor as it is shown and bought. */
export interface PadRow extends DesignedResistor {
  /** The hottest of its parts. */
  rating: ResistorRating;
}

export interface WorkedPad {
  design: PadDesign;
  rows: PadRow[];
  asked: PadInputs;
  inputWatts: number;
  /** Levels at the two ends; absent where no power comes in. */
  levels?: { inDbm: number; outDbm: number };
  /** The resistor that takes most. */
  hottest: PadRow;
  /** Parts of the power the source has to give: the load's, and what goes back for want of a match. */
  shares: { load: number; back: number };
}

/** What `designPad` takes at most, 1 MW. */
const GREATEST_DBM = 90;

function powerIn({ told, inputDbm, inputWatts }: PadInputs): number {
  if (told === 'watts') return inputWatts;
  if (inputDbm <= GREATEST_DBM) return wattsFromDbm(dBm(inputDbm, 'inputDbm'));
  const permitted = `at most ${GREATEST_DBM} dBm`;
  throw new OutOfDomainError('inputDbm', inputDbm, permitted, `Level in: it must be ${permitted}.`);
}

const arrangementsOf = (parts: PadInputs['parts']) =>
  parts === 'parallel' || parts === 'series' ? [parts] : undefined;

const hotter = (one: PadRow, other: PadRow) => (other.rating.watts > one.rating.watts ? other : one);

/** A pad from parts that can be bought: what it gives, how far it may be off, how hot it gets. */
export function workPad(asked: PadInputs): WorkedPad {
  const inputWatts = powerIn(asked);
  const design = designPad({
    ...asked,
    inputWatts,
    atMostParts: asked.parts === 'one' ? 1 : 2,
    arrangements: arrangementsOf(asked.parts),
  });
  const rows = design.resistors.map((resistor) => {
    const [first, second] = resistor.ratings.map((rating) => ratingToBuy(rating.watts, asked.derating));
    return { ...resistor, rating: second && second.watts > first.watts ? second : first };
  });
  const load = 10 ** (-design.fitted.lossDb / 10);
  const heat = design.fitted.dissipationShares.reduce((sum, share) => sum + share, 0);
  return {
    design,
    rows,
    asked,
    inputWatts,
    levels: inputWatts > 0 ? levelsOf(inputWatts, design.fitted.lossDb) : undefined,
    hottest: rows.reduce(hotter),
    shares: { load, back: Math.max(1 - load - heat, 0) },
  };
}

function levelsOf(inputWatts: number, lossDb: number) {
  const inDbm = dbmFromWatts(watts(inputWatts));
  return { inDbm, outDbm: inDbm - lossDb };
}
