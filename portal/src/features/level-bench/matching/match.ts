import {
  matchFromImpedance,
  matchFromReflection,
  matchFromReturnLoss,
  matchFromVswr,
  mismatchBounds,
  OutOfDomainError,
  type Match,
  type MismatchBounds,
} from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { MatchingInputs } from './inputs';
import { cellOf, type Figure, type Sheet } from '../results/sheet';

export interface MatchSheet extends Sheet {
  kind: 'match';
  match: Match;
}

/** The largest mismatch loss of which a reflection can still be told: beyond it all but a millionth comes back. */
const GREATEST_LOSS_DB = 60;

function matchFromLoss(lossDb: number): Match {
  if (lossDb >= 0 && lossDb <= GREATEST_LOSS_DB)
    return matchFromReflection(Math.sqrt(1 - 10 ** (-lossDb / 10)));
  const permitted = `0 to ${GREATEST_LOSS_DB} dB`;
  throw new OutOfDomainError('mismatchLossDb', lossDb, permitted, `Mismatch loss: it must be ${permitted}.`);
}

function matchOf(values: MatchingInputs): Match {
  switch (values.known) {
    case 'returnLossDb':
      return matchFromReturnLoss(values.returnLossDb);
    case 'vswr':
      return matchFromVswr(values.vswr);
    case 'reflection':
      return matchFromReflection(values.reflection);
    case 'mismatchLossDb':
      return matchFromLoss(values.mismatchLossDb);
    case 'impedance':
      return impedanceMatch(values);
  }
}

function impedanceMatch({ loadOhms, loadReactanceOhms, lineOhms }: MatchingInputs): Match {
  const names = { resistanceOhms: 'loadOhms', reactanceOhms: 'loadReactanceOhms' };
  const load = { resistanceOhms: loadOhms, reactanceOhms: loadReactanceOhms };
  return atField(names, () => matchFromImpedance(load, lineOhms));
}

const dbText = (db: number | undefined, none: string, decimals = 2): string =>
  db === undefined ? none : `${fixed(db, decimals)} dB`;

export const vswrText = ({ vswr }: Pick<Match, 'vswr'>): string =>
  vswr === undefined ? 'no bound' : vswr < 100 ? fixed(vswr, 2) : vswr.toPrecision(4);

const shareText = (share: number): string => `${Number((100 * share).toPrecision(3))} %`;

const boundsText = ({ leastDb, greatestDb }: MismatchBounds): string =>
  `${signed(-greatestDb, 2)} to ${signed(-leastDb, 2)} dB`;

/** A match told every way, and what it can do against the match that faces it. */
export function workMatch(values: MatchingInputs): MatchSheet {
  const match = matchOf(values);
  const facing = atField({ returnLossDb: 'facingDb' }, () => matchFromReturnLoss(values.facingDb)).reflection;
  // Where everything comes back, from either side, the level between them has no bound.
  const isBounded = match.reflection < 1 && facing < 1;
  const bounds = isBounded ? boundsText(mismatchBounds(facing, match.reflection)) : 'no bound';
  const loss = { name: 'Return loss', figure: dbText(match.returnLossDb, 'no reflection') };
  const vswr = { name: 'VSWR', figure: vswrText(match) };
  const lost = { name: 'Mismatch loss', figure: dbText(match.mismatchLossDb, 'all of it', 3) };
  const between = { name: `Against ${fixed(values.facingDb)} dB facing it`, figure: bounds };
  const figures: Figure[] = [
    loss,
    vswr,
    { name: 'Reflection coefficient', figure: match.reflection.toFixed(4) },
    lost,
    { name: 'Power that comes back', figure: shareText(match.reflectedPower) },
    { name: 'Power that goes in', figure: shareText(1 - match.reflectedPower) },
    between,
  ];
  return {
    kind: 'match',
    title: 'A match',
    match,
    figures,
    cells: [
      cellOf(loss),
      cellOf(vswr, `${shareText(match.reflectedPower)} of the power comes back`),
      cellOf(lost),
      {
        name: between.name,
        figure: bounds.replace(' dB', ''),
        unit: isBounded ? 'dB' : undefined,
        words: 'of level, with the phase unknown',
        share: 1.3,
      },
    ],
  };
}

/** Of the chart and its table: VSWR over return loss. */
export interface MatchRow {
  returnLossDb: number;
  vswr: number;
  reflection: number;
  mismatchLossDb: number;
}

/** Return losses of the table, dB; those of the chart lie between them. */
const TABLED = [3, 6, 10, 12, 14, 16, 18, 20, 25, 30, 40];

function rowOf(returnLossDb: number): MatchRow {
  const { vswr = Infinity, reflection, mismatchLossDb = Infinity } = matchFromReturnLoss(returnLossDb);
  return { returnLossDb, vswr, reflection, mismatchLossDb };
}

export const tabledMatches: readonly MatchRow[] = TABLED.map(rowOf);

export const chartedMatches: readonly MatchRow[] = Array.from({ length: 75 }, (_, step) =>
  rowOf(3 + step / 2),
);
