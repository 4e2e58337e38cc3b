import { formatQuantity, type PadPort, type PadResistor, type ResistorRating } from '@ferrite-row/levels';
import { capital, fixed, signed } from '../../../lib/text';
import type { AnswerCell } from '../results/answer-line';
import type { PadRow, WorkedPad } from './figures';

export const ohmText = (ohms: number, digits = 4): string => formatQuantity(ohms, 'ohm', digits);

export const wattText = (watts: number): string => formatQuantity(watts, 'W');

/** 0.05 as '5 %'. */
export const percentText = (rel: number): string => `${Number((100 * rel).toPrecision(3))} %`;

const WHERE = { in: 'in', mid: 'middle', out: 'out', ground: 'ground' } as const;

/** 'in to ground'. */
export const whereText = ({ from, to }: Pick<PadResistor, 'from' | 'to'>): string =>
  `${WHERE[from]} to ${WHERE[to]}`;

/** '560 and 620 ohm in parallel'. */
export function partsText({ fitted }: Pick<PadRow, 'fitted'>): string {
  const [first = 0, second] = fitted.parts;
  if (second === undefined) return ohmText(first);
  const [larger = '', unit] = ohmText(first).split(' ');
  const isSameUnit = ohmText(second).endsWith(` ${unit}`);
  return `${isSameUnit ? larger : ohmText(first)} and ${ohmText(second)} in ${fitted.arrangement}`;
}

export const ratingText = ({ ratingWatts }: ResistorRating): string =>
  ratingWatts === undefined ? 'share it among several' : formatQuantity(ratingWatts, 'W', 3, 0.1);

const ENDLESS = 'no reflection';

/** Beyond this no bench can tell one match from another. */
const BEYOND_BENCH_DB = 60;

/** '44.6 dB'. */
export function returnLossText(db: number | undefined): string {
  if (db === undefined) return ENDLESS;
  return db > BEYOND_BENCH_DB ? `over ${BEYOND_BENCH_DB} dB` : `${fixed(db)} dB`;
}

export const kindText = ({ kind }: Pick<WorkedPad['design'], 'kind'>): string =>
  capital(kind === 'minimum loss' ? 'minimum-loss pad' : `${kind} pad`);

const worstLossText = ({ design: { worst } }: WorkedPad): string =>
  `${fixed(worst.leastLossDb, 2)} to ${fixed(worst.greatestLossDb, 2)} dB`;

function portCell(name: string, { returnLossDb, ohms }: PadPort, worst: number | undefined): AnswerCell {
  const [figure, unit] = returnLossText(returnLossDb).split(/ (?=dB$)/);
  return {
    name,
    figure: figure ?? ENDLESS,
    unit,
    words: `${ohmText(ohms, 3)}; at worst ${returnLossText(worst)}`,
  };
}

function ratingCell({ hottest, rows, inputWatts }: WorkedPad): AnswerCell {
  const isOne = rows.every(({ rating }) => rating.ratingWatts === hottest.rating.ratingWatts);
  const [figure, unit] =
    hottest.rating.ratingWatts === undefined ? ['none'] : ratingText(hottest.rating).split(' ');
  return {
    name: isOne ? 'Rating to buy' : 'Highest rating to buy',
    figure: figure ?? '',
    unit,
    words:
      inputWatts === 0
        ? 'no power comes in'
        : `${hottest.name} takes ${wattText(hottest.rating.watts)}${figure === 'none' ? ': share it among several' : ''}`,
    tone: inputWatts >= RF_CAUTION_WATTS ? 'caution' : 'plain',
  };
}

/** From here on the design's caution for power stands. */
export const RF_CAUTION_WATTS = 1;

/** What the nearest values really give. */
export function answerCells(worked: WorkedPad): AnswerCell[] {
  const { fitted, worst } = worked.design;
  return [
    {
      name: 'Really gives',
      figure: fixed(fitted.lossDb, 2),
      unit: 'dB',
      words: `at worst ${worstLossText(worked)}`,
    },
    portCell('Return loss, source side', fitted.input, worst.leastInputReturnLossDb),
    portCell('Return loss, load side', fitted.output, worst.leastOutputReturnLossDb),
    ratingCell(worked),
  ];
}

const levelText = (dbm: number): string => `${signed(dbm, 2)} dBm`;

export const endText = (worked: WorkedPad, end: 'in' | 'out'): string | undefined =>
  worked.levels && levelText(end === 'in' ? worked.levels.inDbm : worked.levels.outDbm);

/** The pad for a letter or a notebook. */
export function inText(worked: WorkedPad): string {
  const { design, asked, levels } = worked;
  const { fitted, worst } = design;
  return [
    `${kindText(design)} between ${ohmText(asked.sourceOhms)} and ${ohmText(asked.loadOhms)}, ${asked.series}, ± ${percentText(asked.toleranceRel)}:`,
    ...worked.rows.map(
      (row) =>
        `${row.name}, ${whereText(row)}: ${partsText(row)} (exact ${ohmText(row.exactOhms)}), ${wattText(row.watts)}, rating ${ratingText(row.rating)}`,
    ),
    `Really gives ${fixed(fitted.lossDb, 2)} dB, ${worstLossText(worked)} at worst.`,
    `Return loss at the source ${returnLossText(fitted.input.returnLossDb)}, ${returnLossText(worst.leastInputReturnLossDb)} at worst; at the load ${returnLossText(fitted.output.returnLossDb)}, ${returnLossText(worst.leastOutputReturnLossDb)} at worst.`,
    levels
      ? `In ${levelText(levels.inDbm)} (${wattText(worked.inputWatts)}), out ${levelText(levels.outDbm)}.`
      : 'No power comes in.',
  ].join('\n');
}
