import { formatQuantity } from '@ferrite-row/levels';
import { capital, fixed } from '../../../lib/text';
import type { AnswerCell } from '../results/answer-line';
import { BUILDS } from './builds';
import type { FilterFigures } from './figures';
import { inHand, tightest, type Judged, type JudgedLimit, type JudgedReturnLoss } from './judged';
import type { ResponseRow } from './response-rows';

export const megahertz = (hertz: number, decimals = 1): string => fixed(hertz / 1e6, decimals);

export const grouped = (count: number): string => count.toLocaleString('en-GB');

/** "all 1,000", "979 of 1,000". */
const buildsWord = (count: number): string =>
  count === BUILDS
    ? `all ${grouped(BUILDS)}`
    : `${count === 0 ? 'none' : grouped(count)} of ${grouped(BUILDS)}`;

/** "4.1 dB in hand, 2.0 at worst"; what is missing is "short". */
export function inHandWords({ takenDb, neededDb, worstDb }: JudgedLimit): string {
  const nominal = takenDb - neededDb;
  const said = (db: number) => (db < 0 ? 'short' : 'in hand');
  const first = `${fixed(Math.abs(nominal))} dB ${said(nominal)}`;
  if (worstDb === undefined) return first;
  const worst = worstDb - neededDb;
  const word = said(worst) === said(nominal) ? '' : ` ${said(worst)}`;
  return `${first}, ${fixed(Math.abs(worst))}${word} at worst`;
}

export const returnLossWords = ({ wantedDb, passing }: JudgedReturnLoss): string =>
  passing === undefined
    ? `${fixed(wantedDb, 0)} wanted`
    : `${Number(wantedDb.toPrecision(3))} or more in ${buildsWord(passing)}`;

function passingWords(passing: number): string {
  if (passing === BUILDS) return 'All of them pass';
  if (passing === 0) return 'None of them passes';
  return `${capital(buildsWord(passing))} ${passing === 1 ? 'passes' : 'pass'}`;
}

/** What the histogram shows, as a sentence. */
export function spreadWords({ passing, worstDb }: JudgedLimit): string | undefined {
  if (passing === undefined || worstDb === undefined) return undefined;
  return `${passingWords(passing)}. The least is ${fixed(worstDb)} dB.`;
}

/** "Second harmonic, 28.0 MHz". */
export const nameOf = ({ name, hertz }: JudgedLimit): string => `${capital(name)}, ${megahertz(hertz)} MHz`;

const SHOWN = 2;

/** The answer: the tightest limits, the match and the loss. */
export function answerCells(figures: FilterFigures, { limits, returnLoss }: Judged): AnswerCell[] {
  const order = [...limits].sort((a, b) => inHand(a) - inHand(b)).slice(0, SHOWN);
  return [
    ...limits
      .filter((limit) => order.includes(limit))
      .map((limit): AnswerCell => {
        return {
          name: nameOf(limit),
          figure: fixed(limit.takenDb),
          unit: 'dB taken',
          words: inHandWords(limit),
          tone: limit.verdict === 'pass' ? 'plain' : 'caution',
          share: 1.15,
        };
      }),
    {
      name: 'Return loss in the band',
      figure: fixed(returnLoss.db),
      unit: 'dB',
      words: returnLossWords(returnLoss),
      tone: returnLoss.verdict === 'not yet' ? 'caution' : 'plain',
    },
    {
      name: 'Insertion loss',
      figure: fixed(figures.insertionLossDb, 2),
      unit: 'dB',
      words: `${formatQuantity(figures.heatWatts, 'W')} lost as heat`,
      share: 0.85,
    },
  ];
}

/** The answer as it is read out. */
export function spokenAnswer(figures: FilterFigures, { limits, returnLoss }: Judged): string {
  const least = tightest(limits);
  return [
    least && `${nameOf(least)}: ${fixed(least.takenDb)} dB taken, ${inHandWords(least)}.`,
    `Return loss in the band ${fixed(returnLoss.db)} dB, ${returnLossWords(returnLoss)}.`,
    `Insertion loss ${fixed(figures.insertionLossDb, 2)} dB.`,
  ]
    .filter(Boolean)
    .join(' ');
}

/** Where the needed figures come from. */
export function neededWords({ values, against }: FilterFigures): string {
  const loss = 'All against the carrier, so the filter’s own loss counts.';
  if (!against.rule) return loss;
  const [second, third, fourth] = [values.secondDbc, values.thirdDbc, values.fourthDbc].map((dbc) =>
    fixed(Math.abs(dbc), Number.isInteger(dbc) ? 0 : 1),
  );
  const uncertainty = values.spurUncertaintyDb ? `, each ± ${fixed(values.spurUncertaintyDb)}` : '';
  return `${loss} Needed is ${fixed(against.rule.attenuationDb)} less the ${second}, ${third} and ${fourth} dBc before the filter${uncertainty}.`;
}

/** One sentence for the plot. */
export function plotSummary(figures: FilterFigures, { limits, returnLoss }: Judged): string {
  const least = tightest(limits);
  const { kind } = figures.values;
  return [
    `Gain and return loss of the ${kind} filter from 0 to ${megahertz(figures.axis.endHertz, 0)} megahertz.`,
    least && `Tightest at ${megahertz(least.hertz)} megahertz: ${inHandWords(least)}.`,
    `Return loss in the band ${fixed(returnLoss.db)} dB.`,
  ]
    .filter(Boolean)
    .join(' ');
}

/** A frequency of the plot, as it is read out: "28.0 MHz. Gain −26.3 dB, …". */
export function rowWords(row: ResponseRow): string {
  const { hertz, gainDb, gainFromDb, gainToDb, returnLossDb, limit } = row;
  const spread =
    gainFromDb === undefined || gainToDb === undefined
      ? ''
      : `, ${fixed(gainFromDb)} to ${fixed(gainToDb)} in 95 %`;
  const judged = limit
    ? ` ${capital(limit.name)}: ${fixed(limit.neededDb)} needed, ${inHandWords(limit)}. ${capital(limit.verdict)}.`
    : '';
  return `${megahertz(hertz, 2)} MHz. Gain ${fixed(gainDb)} dB${spread}. Return loss ${fixed(Math.min(returnLossDb, 99.9))} dB.${judged}`;
}
