import { dBm, formatQuantity, wattsFromDbm } from '@ferrite-row/levels';
import { fixed, plusMinus, signed } from '../../../lib/text';
import type { LevelPoint } from '../../../shared-ui/level-diagram/level-point';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { WorkedChain, WorkedStage } from './work';

export const powerText = (dbm: number): string => formatQuantity(wattsFromDbm(dBm(dbm)), 'W', 3);

const told = (value: number | undefined, text: (value: number) => string): string =>
  value === undefined ? '' : text(value);

/** Columns of the chain's table, with what they are called beside a figure where there is no head. */
export const FIGURES: {
  key: string;
  header: string;
  beside: string;
  text: (stage: WorkedStage) => string;
}[] = [
  { key: 'peak', header: 'PEP, dBm', beside: '', text: ({ peakDbm }) => signed(peakDbm) },
  { key: 'average', header: 'Average', beside: 'average', text: ({ averageDbm }) => signed(averageDbm) },
  { key: 'gain', header: 'Gain so far', beside: 'gain', text: ({ totalGainDb }) => signed(totalGainDb) },
  {
    key: 'noise',
    header: 'Noise figure',
    beside: 'noise figure',
    text: ({ noiseFigureDb }) => told(noiseFigureDb, fixed),
  },
  {
    key: 'intercept',
    header: 'Intercept out',
    beside: 'intercept',
    text: ({ outputInterceptDbm }) => told(outputInterceptDbm, signed),
  },
  {
    key: 'compression',
    header: '1 dB less at',
    beside: '1 dB less at',
    text: ({ outputCompressionDbm }) => told(outputCompressionDbm, signed),
  },
  {
    key: 'products',
    header: 'Products, dBc',
    beside: 'products',
    text: ({ intermodulationDbc }) => told(intermodulationDbc, signed),
  },
  {
    key: 'headroom',
    header: 'Headroom',
    beside: 'headroom',
    text: ({ headroomDb, isLow }) => told(headroomDb, (value) => `${fixed(value)}${isLow ? ' low' : ''}`),
  },
];

export const pointsOf = ({ stages }: WorkedChain): LevelPoint[] =>
  stages.map(({ name, peakDbm, toleranceDb, limitDbm, measured, verdict }, index) => ({
    id: String(index),
    stageNumber: index + 1,
    name,
    planDbm: peakDbm,
    toleranceDb,
    limitDbm,
    measured,
    verdict,
  }));

const pair = ([low, high]: readonly [number, number]): string =>
  `${fixed(low / 1e6, 4)} and ${fixed(high / 1e6, 4)} MHz`;

/** What two tones of this peak power come to at the chain's output. */
export function twoToneRows({ twoTone, products }: WorkedChain): { name: string; figure: string }[] {
  const levels: [string, string][] = twoTone
    ? [
        ['Each tone', `${signed(twoTone.eachToneDbm)} dBm, ${powerText(twoTone.eachToneDbm)}`],
        ['Peak envelope power', `${signed(twoTone.peakDbm)} dBm, ${powerText(twoTone.peakDbm)}`],
        ['Average', `${signed(twoTone.averageDbm)} dBm, ${powerText(twoTone.averageDbm)}`],
        ['Third-order products, below each tone', `${signed(twoTone.intermodulationDbc)} dBc`],
        ['Third-order products, below PEP', `${fixed(twoTone.belowPeakDb)} dB`],
      ]
    : [];
  const places: [string, string][] = [
    ['Third-order products at', pair(products.third)],
    ['Fifth-order products at', pair(products.fifth)],
  ];
  return [...levels, ...places].map(([name, figure]) => ({ name, figure }));
}

function stageLine(stage: WorkedStage): string {
  const figures = FIGURES.slice(1).flatMap(({ beside, text }) => {
    const figure = text(stage);
    return figure === '' ? [] : [`${beside} ${figure}`];
  });
  const { measured, verdict } = stage;
  const seen = measured
    ? `, measured ${signed(measured.levelDbm)} ${plusMinus(measured.expandedUncertaintyDb)}${verdict ? `, ${VERDICTS[verdict].words.toLowerCase()}` : ''}`
    : '';
  return `${stage.name}: ${signed(stage.peakDbm)} dBm PEP, ${figures.join(', ')}${seen}`;
}

export const spokenChain = ({ whole, leastHeadroom, shortfall }: WorkedChain): string =>
  [
    `Out of the chain ${signed(whole.peakDbm)} dBm PEP`,
    ...(leastHeadroom
      ? [`Least headroom ${fixed(leastHeadroom.headroomDb ?? 0)} dB at the ${leastHeadroom.name}`]
      : []),
    ...(shortfall ? [shortfall] : []),
  ].join('. ');

/** The chain as lines for a letter. */
export const inText = (chain: WorkedChain): string =>
  [
    `Into the chain: ${signed(chain.inputDbm)} dBm PEP`,
    ...chain.stages.map(stageLine),
    ...(chain.shortfall ? [chain.shortfall] : []),
    'Two equal tones of that PEP:',
    ...twoToneRows(chain).map(({ name, figure }) => `  ${name}: ${figure}`),
    'Intercepts add in voltage, the worst case; compression is an estimate.',
  ].join('\n');
