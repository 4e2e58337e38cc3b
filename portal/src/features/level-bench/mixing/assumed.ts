import { DIODE_RING_RANGES } from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import type { MixingValues } from './inputs';
import { spread } from './words';

/** A figure without needless noughts: '6.5', '35'. */
const figure = (db: number): string => fixed(db, Number.isInteger(db) ? 0 : 1);

const { compressionBelowDriveDb: compression, interceptAboveDriveDb: intercept } = DIODE_RING_RANGES;
const level = (dbm: number): string => signed(dbm, Number.isInteger(dbm) ? 0 : 1);
const between = (least: number, most: number): string => `${level(least)} to ${level(most)} dBm`;

/** What a ring of that rated drive is like, to hold the figures against. */
export const classFigures = ({ ratedDbm }: Pick<MixingValues, 'ratedDbm'>): [string, string][] => [
  ['A ring of this drive intercepts at', between(ratedDbm + intercept.least, ratedDbm + intercept.greatest)],
  ['and compresses from', between(ratedDbm - compression.greatest, ratedDbm - compression.least)],
];

/** The figures nobody measured, as they stand now. */
export function assumedFigures(values: MixingValues): [string, string][] {
  const { conversionLoss, conversionLossPlusMinus, loLeakage, ifLeakage, leakagePlusMinus } = values;
  const { inputInterceptDbm, evenLoBalanceDb, evenIfBalanceDb, higherOrderPlusMinusDb } = values;
  return [
    ['Conversion loss', `${figure(conversionLoss)} ${spread(conversionLossPlusMinus)} dB`],
    ['LO and IF leakage, down', `${figure(loLeakage)}, ${figure(ifLeakage)} ${spread(leakagePlusMinus)} dB`],
    ['Third intercept, at the input', `${level(inputInterceptDbm)} dBm`],
    ...classFigures(values),
    ['Even products, balance', `${figure(evenLoBalanceDb)} and ${figure(evenIfBalanceDb)} dB`],
    ['Higher orders', `${spread(higherOrderPlusMinusDb)} dB`],
    ['Filter, far from its band', `${spread(values.filterPlusMinusDb)} dB`],
  ];
}
