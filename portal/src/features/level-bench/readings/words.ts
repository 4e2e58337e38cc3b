import { decimalsFor, formatQuantity, type ReadingUnit } from '@ferrite-row/levels';
import { capital, fixed, plusMinus, signed } from '../../../lib/text';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { ShownReading, WorkedReading } from './work';
import { wayName } from './ways';

/** Hertz are told in kilohertz: a dial and a counter are read so. */
const scaleOf = (unit: ReadingUnit): [number, string] => (unit === 'Hz' ? [1000, 'kHz'] : [1, unit]);

const isSigned = (unit: string): boolean => unit.startsWith('dB');

export interface Figure {
  value: string;
  unit: string;
  plusMinus: string;
}

/** A value and its uncertainty, each to the digits the uncertainty deserves. */
export function figureOf({ value, unit, expandedUncertainty }: ShownReading): Figure {
  const [scale, shownUnit] = scaleOf(unit);
  const decimals = Math.max(decimalsFor(expandedUncertainty / scale), isSigned(unit) ? 2 : 0);
  const text = isSigned(unit) ? signed(value, decimals) : fixed(value / scale, decimals);
  return { value: text, unit: shownUnit, plusMinus: plusMinus(expandedUncertainty / scale, decimals) };
}

const endText = (value: number, unit: ReadingUnit): string => {
  const [scale] = scaleOf(unit);
  const [, fraction = ''] = String(Number((value / scale).toPrecision(12))).split('.');
  const decimals = Math.min(Math.max(fraction.length, 1), 6);
  return isSigned(unit) ? signed(value, decimals) : fixed(value / scale, decimals);
};

/** '0.0 to +3.0', 'at most −25.0', '14.0 or more'. */
export function windowText({ window, reading }: WorkedReading): string {
  if (!window) return '';
  const { low, high } = window;
  if (low === undefined) return high === undefined ? '' : `at most ${endText(high, reading.unit)}`;
  if (high === undefined) return `${endText(low, reading.unit)} or more`;
  return `${endText(low, reading.unit)} to ${endText(high, reading.unit)}`;
}

export interface BudgetRow {
  name: string;
  limit: string;
  distribution: string;
  standard: string;
  /** Of the combined variance, 0 to 100. */
  share: number;
}

/** Where the ± comes from, the most first. */
export function budgetRows({ components, uncertaintyUnit }: ShownReading): BudgetRow[] {
  const variance = components.reduce((sum, { standardUncertainty }) => sum + standardUncertainty ** 2, 0);
  const amount = (value: number) => formatQuantity(value, uncertaintyUnit, 3);
  return components
    .map(({ name, limit, distribution, standardUncertainty }) => ({
      name: capital(name),
      limit: `± ${amount(limit)}`,
      distribution: capital(distribution),
      standard: amount(standardUncertainty),
      share: variance === 0 ? 0 : (100 * standardUncertainty ** 2) / variance,
    }))
    .sort((a, b) => b.share - a.share);
}

/** The same reading told in other ways; empty where there is no other. */
export function otherFigures(reading: ShownReading): { name: string; figure: string }[] {
  const { unit, voltsPeakToPeak, watts, averageWatts, averageDbm, eachToneDbm } = reading;
  const { shownSeconds, instrumentSeconds } = reading;
  const timeText = (seconds?: number) => (seconds === undefined ? undefined : formatQuantity(seconds, 's'));
  const isEnvelope = averageWatts !== undefined;
  const told: [string, string | undefined][] = [
    [
      isEnvelope ? 'Across the load at the crest' : 'Across the load',
      voltsPeakToPeak === undefined ? undefined : `${formatQuantity(voltsPeakToPeak, 'V', 3, 0.1)} p-p`,
    ],
    [
      isEnvelope ? 'Peak envelope power' : 'Power',
      watts === undefined || unit === 'W' ? undefined : formatQuantity(watts, 'W', 3),
    ],
    [
      'Average of the two tones',
      averageWatts === undefined || averageDbm === undefined
        ? undefined
        : `${formatQuantity(averageWatts, 'W', 3)}, ${signed(averageDbm, 2)} dBm`,
    ],
    ['Shown', timeText(shownSeconds)],
    ['The oscilloscope’s own', timeText(instrumentSeconds)],
    ['Each tone', eachToneDbm === undefined ? undefined : `${signed(eachToneDbm, 2)} dBm`],
  ];
  return told.flatMap(([name, figure]) => (figure === undefined ? [] : [{ name, figure }]));
}

/** The answer: figure, unit and what stands under it. */
export interface Headline extends Omit<Figure, 'plusMinus'> {
  name: string;
  words: string;
}

/** What a probe takes has no ± of its own: left uncorrected, it is a part of another reading's. */
export function headlineOf({ way, reading }: WorkedReading): Headline {
  const { value, unit, plusMinus: within } = figureOf(reading);
  if (way === 'probe-loading') {
    const words = `lower with the probe on. Left uncorrected it counts ${within} dB at 95 %.`;
    return { name: 'The probe takes', value: fixed(-reading.value, 2), unit, words };
  }
  const words = `${within} ${reading.unit === 'Hz' ? unit : reading.uncertaintyUnit} at 95 %`;
  return { name: wayName(way), value, unit, words };
}

/** 'Analyzer: +0.37 dBm, ± 0.47 dB at 95 %'. */
export function sentence(worked: WorkedReading): string {
  const { name, value, unit, words } = headlineOf(worked);
  return `${name}: ${value} ${unit}${worked.way === 'probe-loading' ? ' ' : ', '}${words}`;
}

/** The whole page as lines for a letter. */
export function inText(worked: WorkedReading): string {
  const { reading, verdict, advice } = worked;
  const { unit } = figureOf(reading);
  return [
    sentence(worked),
    ...otherFigures(reading).map(({ name, figure }) => `${name}: ${figure}`),
    ...(verdict
      ? [`Window ${windowText(worked)} ${unit}: ${VERDICTS[verdict].words.toLowerCase()}. ${advice}`.trim()]
      : []),
    'Where the ± comes from:',
    ...budgetRows(reading).map(
      ({ name, limit, distribution, standard, share }) =>
        `  ${name}: limit ${limit}, ${distribution.toLowerCase()}, standard ${standard}, ${fixed(share, 0)} %`,
    ),
  ].join('\n');
}
