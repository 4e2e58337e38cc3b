import { fixed, signed } from '../../../lib/text';
import type { MixingValues } from './inputs';
import { spread } from './words';

/** A figure without needless noughts: '6.5', '35'. */
const figure = (db: number): string => fixed(db, Number.isInteger(db) ? 0 : 1);

/** The figures nobody measured, as they stand now. */
export function assumedFigures(values: MixingValues): [string, string][] {
  const { conversionLoss, conversionLossPlusMinus, loLeakage, ifLeakage, leakagePlusMinus } = values;
  const { inputInterceptDbm, evenLoBalanceDb, evenIfBalanceDb, higherOrderPlusMinusDb } = values;
  return [
    ['Conversion loss', `${figure(conversionLoss)} ${spread(conversionLossPlusMinus)} dB`],
    ['LO and IF leakage, down', `${figure(loLeakage)}, ${figure(ifLeakage)} ${spread(leakagePlusMinus)} dB`],
    [
      'Third intercept, at the input',
      `${signed(inputInterceptDbm, Number.isInteger(inputInterceptDbm) ? 0 : 1)} dBm`,
    ],
    ['Even products, balance', `${figure(evenLoBalanceDb)} and ${figure(evenIfBalanceDb)} dB`],
    ['Higher orders', `${spread(higherOrderPlusMinusDb)} dB`],
    ['Filter, far from its band', `${spread(values.filterPlusMinusDb)} dB`],
  ];
}
