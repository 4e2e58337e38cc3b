import {
  densityAt,
  exposureDistances,
  exposureExemption,
  exposureSum,
  formatQuantity,
  ICNIRP_EXPOSURE,
  isExemptByPower,
  MODE_DUTY,
  onFraction,
  US_EXPOSURE,
  OutOfDomainError,
  type ExposureDistance,
  type ExposureLimits,
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

/** Limits that go with a rule set: those of the United States, and elsewhere the international guidelines. */
const LIMITS: Record<GuardValues['ruleSet'], ExposureLimits> = {
  'US-97': US_EXPOSURE,
  'IARU-R1': ICNIRP_EXPOSURE,
};

const partOf = ({ onMinutes, offMinutes, ruleSet }: GuardValues, tier: ExposureTier): number =>
  onFraction(onMinutes / 60, offMinutes / 60, LIMITS[ruleSet].averagingMinutes[tier]);

/** '0.4 0.35' as two parts; none where nothing was typed. */
function partsOf({ otherParts }: GuardValues): number[] {
  const texts = otherParts.split(/[\s;]+/).filter(Boolean);
  return texts.map((text) => {
    const part = Number(text.replace(',', '.'));
    if (Number.isFinite(part) && part >= 0) return part;
    const permitted = 'numbers from 0, such as 0.4 0.35';
    throw new OutOfDomainError('parts', text, permitted, `Other sources: ${permitted}.`);
  });
}

/** Up to the next tenth: a distance is never told shorter than it is. */
const metresText = (metres: number): string =>
  fixed(Math.ceil(Number((metres * 10).toPrecision(10))) / 10, 1);

const density = (milliwatts: number): string => `${Number(milliwatts.toPrecision(3))} mW/cm²`;

/** In the near field the far field's formula says too little about distance. */
const keptMetres = ({ metres, nearFieldMetres }: ExposureDistance, left: number): number =>
  Math.max(metres / Math.sqrt(left), nearFieldMetres);

/** Of the limit, for this station: what the other sources leave. */
const leftOf = (values: GuardValues): number => {
  const parts = partsOf(values);
  return parts.length === 0 ? 1 : exposureSum(parts).left;
};

function tierFigure(tier: ExposureTier, found: ExposureDistance, left: number): JudgedFigure {
  const name = `${capital(tier)}, keep at least`;
  if (left === 0) return { name, figure: 'None', words: 'the other sources leave nothing', tone: 'caution' };
  const isNear = found.metres / Math.sqrt(left) < found.nearFieldMetres;
  return {
    name,
    ...{ figure: metresText(keptMetres(found, left)), unit: 'm' },
    words: isNear ? `the near field’s edge; ${WHO[tier]}` : WHO[tier],
    tone: isNear ? 'caution' : 'plain',
  };
}

function rowsOf(values: GuardValues, found: Record<ExposureTier, ExposureDistance>): JudgedRow[] {
  const row = (name: string, text: (tier: ExposureTier) => string) => ({ cells: [name, ...TIERS.map(text)] });
  const { distanceMetres } = values;
  return [
    row('Averaged over', (tier) => `${LIMITS[values.ruleSet].averagingMinutes[tier]} min`),
    row('Transmits, part of it', (tier) => `${fixed(100 * partOf(values, tier), 0)} %`),
    row('Average power at the antenna', (tier) => formatQuantity(found[tier].averageWatts, 'W')),
    row('Radiated, EIRP', (tier) => formatQuantity(found[tier].eirpWatts, 'W')),
    row('Limit', (tier) => density(found[tier].limitMilliwattsPerSquareCentimetre)),
    row('Distance by the far field', (tier) => `${metresText(found[tier].metres)} m`),
    row('Near field up to', (tier) => `${metresText(found[tier].nearFieldMetres)} m`),
    ...(distanceMetres === undefined
      ? []
      : [
          row(`Part of the limit at ${formatQuantity(distanceMetres, 'm')}`, (tier) =>
            withOthers(
              values,
              densityAt(found[tier], distanceMetres) / found[tier].limitMilliwattsPerSquareCentimetre,
            ),
          ),
          row(`Density at ${formatQuantity(distanceMetres, 'm')}`, (tier) =>
            density(densityAt(found[tier], distanceMetres)),
          ),
        ]),
  ];
}

/** '0.21, 0.96 with the others'. */
function withOthers(values: GuardValues, own: number): string {
  const parts = partsOf(values);
  const told = (part: number) => String(Number(part.toPrecision(2)));
  if (parts.length === 0) return told(own);
  const { sum, isWithinLimits } = exposureSum([...parts, own]);
  return `${told(own)}, ${told(sum)} with the others${isWithinLimits ? '' : ': over'}`;
}

const DIPOLE_DBI = 2.15;

/** Only the United States let a source go without an evaluation by a table; the rows are for a source that stands alone. */
function exemptRows(values: GuardValues, found: Record<ExposureTier, ExposureDistance>): JudgedRow[] {
  const { ruleSet, carrierHertz, distanceMetres } = values;
  if (ruleSet !== 'US-97') return [];
  const row = (name: string, text: (tier: ExposureTier) => string) => ({ cells: [name, ...TIERS.map(text)] });
  if (partsOf(values).length > 0)
    return [row('Evaluation, 47 CFR 1.1307(b)(3)(ii)(B)', () => 'by the sum: other sources count')];
  if (TIERS.every((tier) => isExemptByPower(found[tier].averageWatts)))
    return [row('Evaluation, 47 CFR 1.1307(b)(3)(i)(A)', () => 'exempt: 1 mW or less')];
  if (distanceMetres === undefined) return [];
  const exemption = (tier: ExposureTier) =>
    exposureExemption(carrierHertz, distanceMetres, found[tier].eirpWatts / 10 ** (DIPOLE_DBI / 10));
  return [
    row(`Evaluation at ${formatQuantity(distanceMetres, 'm')}, 47 CFR 1.1307(b)(3)(i)(C)`, (tier) => {
      const { isApplicable, isExempt, thresholdErpWatts } = exemption(tier);
      if (!isApplicable) return 'needed: nearer than the table holds';
      return `${isExempt ? 'exempt' : 'needed'}, table to ${formatQuantity(thresholdErpWatts, 'W')} ERP`;
    }),
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
    limits: LIMITS[values.ruleSet],
  });
  return {
    figures: [
      ...TIERS.map((tier) => tierFigure(tier, found[tier], leftOf(values))),
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
        rows: [...rowsOf(values, found), ...exemptRows(values, found)],
      },
    ],
    source: `${LIMITS[values.ruleSet].title}: ${LIMITS[values.ruleSet].source}. Distance: OET Bulletin 65 (1997), equations 3, 6 and 7; average over peak: its Supplement B, Table 2.`,
    caution: {
      kind: 'RF exposure',
      words:
        'An estimate for the far field, by the limits named; national limits may be stricter and decide. Nobody touches an antenna that may be on: it burns at once, whatever the average.',
    },
  };
}
