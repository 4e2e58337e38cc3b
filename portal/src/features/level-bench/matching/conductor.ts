import {
  formatQuantity,
  OutOfDomainError,
  peakFluxTesla,
  skinDepthMetres,
  wireOhmsPerMetre,
} from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { MatchingInputs } from './inputs';
import { cellOf, type Sheet } from '../results/sheet';
import { metreText } from './windings';

/** A figure over the amateur bands. */
interface BandRow {
  hertz: number;
  value: number;
}

export interface BandSheet extends Sheet {
  kind: 'bands';
  /** What `value` of the rows is, and its unit. */
  quantity: { name: string; unit: 'µm' | 'mT' };
  rows: BandRow[];
  /** A line across the chart. */
  limit?: { value: number; words: string };
  /** Of a round wire: diameter and depth, m. */
  wire?: { diameter: number; depth: number };
}

/** Somewhere in each band from 160 to 6 m; for a table, not for a rule. */
const BANDS_HERTZ = [1.85e6, 3.6e6, 5.3e6, 7.1e6, 10.1e6, 14.2e6, 18.1e6, 21.2e6, 24.9e6, 28.5e6, 50.2e6];

const rowsOf = (valueAt: (hertz: number) => number): BandRow[] =>
  BANDS_HERTZ.map((hertz) => ({ hertz, value: valueAt(hertz) }));

function requirePositive(input: string, label: string, value: number): number {
  if (value > 0) return value;
  throw new OutOfDomainError(input, value, 'more than 0', `${label}: it must be more than 0.`);
}

const hertzText = (hertz: number) => formatQuantity(hertz, 'Hz', 4);

/** Ten depths across: thinner, the current is no longer all at the surface. */
const isThick = (diameter: number, depth: number): boolean => diameter >= 10 * depth;

/** How deep a current runs in copper. */
export function workSkin({ frequencyHertz, wireMetres }: MatchingInputs): BandSheet {
  const diameter = requirePositive('wireMetres', 'Wire', wireMetres);
  const depth = skinDepthMetres(frequencyHertz);
  const skin = { name: `Skin depth at ${hertzText(frequencyHertz)}`, figure: metreText(depth) };
  const inside = Math.max(diameter - 2 * depth, 0);
  const used = 100 * (1 - (inside / diameter) ** 2);
  const section = { name: 'Of the wire within one depth', figure: `${used.toPrecision(2)} %` };
  const resistance = {
    name: 'Resistance of a metre of it',
    figure: isThick(diameter, depth)
      ? formatQuantity(wireOhmsPerMetre(frequencyHertz, diameter), 'ohm')
      : 'nearer to that for direct current: it is under ten depths across',
  };
  return {
    kind: 'bands',
    title: 'Skin depth in copper',
    note: 'Copper at 20 °C, 17.24 nohm m, from memory. Resistance of a straight wire; turns that lie close have more.',
    quantity: { name: 'Skin depth', unit: 'µm' },
    rows: rowsOf((hertz) => 1e6 * skinDepthMetres(hertz)),
    wire: { diameter, depth },
    cells: [
      cellOf(skin, 'where the current has fallen to 37 %'),
      cellOf(section, `of its cross section, ${metreText(diameter)} across`),
      ...(isThick(diameter, depth) ? [cellOf(resistance, 'straight, at this frequency')] : []),
    ],
    figures: [skin, section, resistance],
  };
}

const MILLI = 1e3;

/** Flux in a core under a sine. */
export function workFlux(values: MatchingInputs): BandSheet {
  const { voltsRms, frequencyHertz, permittedMillitesla: permitted } = values;
  const areaSquareMetres =
    requirePositive('areaSquareMillimetres', 'Core cross section', values.areaSquareMillimetres) * 1e-6;
  const turns = values.fluxTurns;
  if (permitted !== undefined) requirePositive('permittedMillitesla', 'Flux permitted', permitted);
  const milliteslaAt = (hertz: number) =>
    MILLI *
    atField({ turns: 'fluxTurns', areaSquareMetres: 'areaSquareMillimetres' }, () =>
      peakFluxTesla({ voltsRms, frequencyHertz: hertz, turns, areaSquareMetres }),
    );
  const peak = milliteslaAt(frequencyHertz);
  const flux = { name: `Peak flux at ${hertzText(frequencyHertz)}`, figure: `${peak.toPrecision(3)} mT` };
  const gauss = { name: 'The same in gauss', figure: `${fixed(10 * peak)} gauss` };
  const most =
    permitted === undefined || peak === 0
      ? []
      : [
          {
            name: `For ${permitted} mT at most`,
            figure: `${formatQuantity((voltsRms * permitted) / peak, 'V')} rms`,
          },
        ];
  return {
    kind: 'bands',
    title: `${formatQuantity(voltsRms, 'V')} rms across ${turns} turns`,
    quantity: { name: 'Peak flux', unit: 'mT' },
    rows: rowsOf(milliteslaAt),
    limit: permitted === undefined ? undefined : { value: permitted, words: `permitted ${permitted} mT` },
    cells: [
      cellOf(flux, permitted === undefined ? undefined : verdictWords(peak, permitted)),
      cellOf(gauss),
      ...most.map((figure) => cellOf(figure)),
    ],
    figures: [flux, gauss, ...most],
  };
}

const verdictWords = (peak: number, permitted: number): string =>
  peak > permitted ? `over what is permitted, ${permitted} mT` : `within ${permitted} mT`;
