import {
  densityAt,
  exposureDistances,
  formatQuantity,
  MODE_DUTY,
  onFraction,
  US_EXPOSURE,
  type ExposureDistance,
  type ExposureTier,
} from '@ferrite-row/levels';
import { capital, fixed } from '../../../lib/text';
import type { GuardValues } from './inputs';
import type { Judged, JudgedFigure, JudgedRow } from './judged';

const TIERS = ['uncontrolled', 'controlled'] as const;
const WHO: Record<ExposureTier, string> = {
  controlled: 'trained people who know of it',
  uncontrolled: 'everybody else',
};

const dutyOf = ({ mode, modeDuty }: GuardValues): number =>
  mode === 'own' ? modeDuty : MODE_DUTY[mode as keyof typeof MODE_DUTY];

const partOf = ({ onMinutes, offMinutes }: GuardValues, tier: ExposureTier): number =>
  onFraction(onMinutes / 60, offMinutes / 60, US_EXPOSURE.averagingMinutes[tier]);

/** Up to the next tenth: a distance is never told shorter than it is. */
const metresText = (metres: number): string =>
  fixed(Math.ceil(Number((metres * 10).toPrecision(10))) / 10, 1);

const density = (milliwatts: number): string => `${Number(milliwatts.toPrecision(3))} mW/cm²`;

/** In the near field the far field's formula says too little about distance. */
const keptMetres = ({ metres, nearFieldMetres }: ExposureDistance): number =>
  Math.max(metres, nearFieldMetres);

function tierFigure(tier: ExposureTier, found: ExposureDistance): JudgedFigure {
  return {
    name: `${capital(tier)}, keep at least`,
    ...{ figure: metresText(keptMetres(found)), unit: 'm' },
    words: found.isInNearField ? `the near field’s edge; ${WHO[tier]}` : WHO[tier],
    tone: found.isInNearField ? 'caution' : 'plain',
  };
}

function rowsOf(values: GuardValues, found: Record<ExposureTier, ExposureDistance>): JudgedRow[] {
  const row = (name: string, text: (tier: ExposureTier) => string) => ({ cells: [name, ...TIERS.map(text)] });
  const { distanceMetres } = values;
  return [
    row('Averaged over', (tier) => `${US_EXPOSURE.averagingMinutes[tier]} min`),
    row('Transmits, part of it', (tier) => `${fixed(100 * partOf(values, tier), 0)} %`),
    row('Average power at the antenna', (tier) => formatQuantity(found[tier].averageWatts, 'W')),
    row('Radiated, EIRP', (tier) => formatQuantity(found[tier].eirpWatts, 'W')),
    row('Limit', (tier) => density(found[tier].limitMilliwattsPerSquareCentimetre)),
    row('Distance by the far field', (tier) => `${metresText(found[tier].metres)} m`),
    row('Near field up to', (tier) => `${metresText(found[tier].nearFieldMetres)} m`),
    ...(distanceMetres === undefined
      ? []
      : [
          row(`Density at ${formatQuantity(distanceMetres, 'm')}`, (tier) =>
            density(densityAt(found[tier], distanceMetres)),
          ),
        ]),
  ];
}

/** How far people must be from the antenna on average. */
export function judgeExposure(values: GuardValues): Judged {
  const { carrierHertz: frequencyHertz, peakWatts, feedLossDb, gainDbi, reflectionFactor } = values;
  const found = exposureDistances({
    ...{ frequencyHertz, peakWatts, feedLossDb, gainDbi },
    modeDuty: dutyOf(values),
    onFraction: { controlled: partOf(values, 'controlled'), uncontrolled: partOf(values, 'uncontrolled') },
    reflectionFactor: reflectionFactor === '1' ? 1 : reflectionFactor === '4' ? 4 : 2.56,
    limits: US_EXPOSURE,
  });
  return {
    figures: [
      ...TIERS.map((tier) => tierFigure(tier, found[tier])),
      {
        name: 'Average over peak',
        ...{ figure: fixed(100 * dutyOf(values), 0), unit: '%' },
        words: `${formatQuantity(found.uncontrolled.averageWatts, 'W')} on average, uncontrolled`,
      },
    ],
    tables: [
      {
        title: 'How it comes to that',
        heads: ['Figure', 'Uncontrolled', 'Controlled'],
        rows: rowsOf(values, found),
      },
    ],
    source: `${US_EXPOSURE.title}: ${US_EXPOSURE.source}. Distance: OET Bulletin 65 (1997), equations 3, 6 and 7; average over peak: its Supplement B, Table 2.`,
    caution: {
      kind: 'RF exposure',
      words:
        'An estimate for the far field, by the limits of the United States; national limits may be stricter and decide. Nobody touches an antenna that may be on: it burns at once, whatever the average.',
    },
  };
}
