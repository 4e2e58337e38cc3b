import {
  alFromMicrohenriesPer100,
  alFromMillihenriesPer1000,
  formatQuantity,
  henriesOfTurns,
  singleLayerHenries,
  singleLayerTurns,
  turnsFor,
} from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { MatchingInputs } from './inputs';
import { cellOf, type Sheet } from '../results/sheet';

/** So many whole turns and what they give. */
interface TurnsRow {
  turns: number;
  henries: number;
}

export interface WindingSheet extends Sheet {
  kind: 'winding';
  /** Absent where the turns were typed. */
  wantedHenries?: number;
  /** The turns to wind. */
  turns: number;
  /** Those and a few either side. */
  rows: TurnsRow[];
}

const EITHER_SIDE = 3;

export const henryText = (henries: number, digits = 4): string => formatQuantity(henries, 'H', digits);

/** 0.5 mm, not 500 µm. */
export const metreText = (metres: number): string => formatQuantity(metres, 'm', 3, 0.1);

export const offText = (henries: number, wanted: number): string =>
  `${signed(100 * (henries / wanted - 1), 1)} %`;

/** AL in nH per turn squared, however the core's table prints it. */
export function alOf({ al, alNanohenry, microhenries, millihenries }: MatchingInputs): number {
  if (al === 'uH') return alFromMicrohenriesPer100(microhenries);
  return al === 'mH' ? alFromMillihenriesPer1000(millihenries) : alNanohenry;
}

function rowsAround(turns: number, henriesOf: (turns: number) => number): TurnsRow[] {
  const first = Math.max(1, Math.round(turns) - EITHER_SIDE);
  return Array.from({ length: 2 * EITHER_SIDE + 1 }, (_, step) => first + step).map((count) => ({
    turns: count,
    henries: henriesOf(count),
  }));
}

const turnsText = (turns: number): string => `${Number(fixed(turns, 2))} ${turns === 1 ? 'turn' : 'turns'}`;

/** Whole turns on a core. */
export function workCore(values: MatchingInputs): WindingSheet {
  const al = alOf(values);
  const { turns, exactTurns, henries, errorRel } = turnsFor(values.henries, al);
  const wind = { name: 'Wind', figure: turnsText(turns) };
  const gives = { name: 'They give', figure: henryText(henries) };
  return {
    kind: 'winding',
    title: `${henryText(values.henries)} on a core of ${Number(al.toPrecision(6))} nH/turn²`,
    note: 'Cores of one kind differ by 5 % and more in AL, common practice: measure the coil.',
    wantedHenries: values.henries,
    turns,
    rows: rowsAround(turns, (count) => henriesOfTurns(count, al)),
    cells: [
      cellOf(wind, `exact ${fixed(exactTurns, 2)}; each pass through the hole is one`),
      cellOf(gives, `${signed(100 * errorRel, 1)} % against ${henryText(values.henries)}`),
    ],
    figures: [
      wind,
      { name: 'Exact', figure: `${fixed(exactTurns, 2)} turns` },
      gives,
      { name: 'Off by', figure: `${signed(100 * errorRel, 1)} %` },
    ],
  };
}

/** Of the whole numbers either side the one with the nearer inductance. */
function nearestWhole(exact: number, henriesOf: (turns: number) => number, wanted: number): number {
  const below = Math.max(1, Math.floor(exact));
  const off = (turns: number) => Math.abs(henriesOf(turns) - wanted);
  return off(below) <= off(below + 1) ? below : below + 1;
}

const exactTurnsOf = (values: MatchingInputs, wanted: number): number =>
  atField({ henries: 'coilHenries' }, () => singleLayerTurns(values, wanted));

const ACCURACY = 'the formula holds within 1 %';

/** A coil of one layer in air, for an inductance or from its turns. */
export function workAir(values: MatchingInputs): WindingSheet {
  const henriesOf = (turns: number) => singleLayerHenries(values, turns);
  const wanted = values.findOfCoil === 'turns' ? values.coilHenries : undefined;
  const exact = wanted === undefined ? values.turns : exactTurnsOf(values, wanted);
  const turns = wanted === undefined ? exact : nearestWhole(exact, henriesOf, wanted);
  const henries = henriesOf(turns);
  const wind = { name: wanted === undefined ? 'Turns' : 'Wind', figure: turnsText(turns) };
  const gives = { name: 'They give', figure: henryText(henries) };
  const pitch = { name: 'From turn to turn', figure: metreText(values.lengthMetres / turns) };
  const off = wanted === undefined ? [] : [{ name: 'Off by', figure: offText(henries, wanted) }];
  return {
    kind: 'winding',
    title: `One layer, ${metreText(values.diameterMetres)} across and ${metreText(values.lengthMetres)} long`,
    wantedHenries: wanted,
    turns,
    rows: rowsAround(turns, henriesOf),
    cells: [
      cellOf(wind, wanted === undefined ? undefined : `exact ${fixed(exact, 2)}`),
      cellOf(gives, wanted === undefined ? ACCURACY : `${offText(henries, wanted)}; ${ACCURACY}`),
      cellOf(pitch, 'the wire with its insulation is no thicker'),
    ],
    figures: [wind, gives, ...off, pitch],
  };
}
