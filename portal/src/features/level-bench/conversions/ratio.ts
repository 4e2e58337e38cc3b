import {
  dB,
  dbFromNepers,
  dbFromPowerRatio,
  dbFromVoltageRatio,
  OutOfDomainError,
  powerRatioFromDb,
  voltageRatioFromDb,
} from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { ConversionValues } from './inputs';
import type { ConversionSheet } from './sheet';

/** Beyond it ratios leave what a number can hold in words. */
const GREATEST_DB = 400;

function dbOf(values: ConversionValues): number {
  switch (values.ratioFrom) {
    case 'ratioDb':
      return values.ratioDb;
    case 'powerRatio':
      return atField({ ratio: 'powerRatio' }, () => dbFromPowerRatio(values.powerRatio));
    case 'voltageRatio':
      return atField({ ratio: 'voltageRatio' }, () => dbFromVoltageRatio(values.voltageRatio));
    case 'nepers':
      return dbFromNepers(values.nepers);
    case 'powers':
      return dbOfPowers(values);
  }
}

function dbOfPowers({ wattsIn, wattsOut }: ConversionValues): number {
  for (const [input, value] of [
    ['wattsOut', wattsOut],
    ['wattsIn', wattsIn],
  ] as const)
    if (!(value > 0))
      throw new OutOfDomainError(input, value, 'more than 0 W', 'Power: it must be more than 0 W.');
  return dbFromPowerRatio(wattsOut / wattsIn);
}

function requireReadable(db: number, input: string): number {
  if (Math.abs(db) <= GREATEST_DB) return db;
  const permitted = `−${GREATEST_DB} to ${GREATEST_DB} dB`;
  throw new OutOfDomainError(input, db, permitted, `Ratio: it must be within ${permitted}.`);
}

/** '19.95', and '1 × 10^12' where that would be long. */
export function ratioText(ratio: number): string {
  if (ratio >= 1e-3 && ratio < 1e6) return String(Number(ratio.toPrecision(4)));
  const [mantissa = '', exponent = ''] = ratio.toExponential(3).split('e');
  return `${Number(mantissa)} × 10^${exponent.replace('+', '').replace('-', '−')}`;
}

/** A ratio as decibels, of powers, of voltages and in nepers. */
export function workRatio(values: ConversionValues): ConversionSheet {
  const input = values.ratioFrom === 'powers' ? 'wattsOut' : values.ratioFrom;
  const db = requireReadable(dbOf(values), input);
  const power = ratioText(powerRatioFromDb(dB(db)));
  const voltage = ratioText(voltageRatioFromDb(dB(db)));
  const back = dB(-db);
  return {
    title: `A ratio of ${signed(db, 2)} dB`,
    heading: 'Every way to say it',
    marks: [{ db, words: `${signed(db, 2)} dB`, tone: 'copper' }],
    cells: [
      { name: 'Ratio', figure: signed(db, 2), unit: 'dB' },
      { name: 'Of powers', figure: power, unit: 'to 1' },
      { name: 'Of voltages', figure: voltage, unit: 'to 1', words: 'in one resistance' },
    ],
    figures: [
      { name: 'Decibels', figure: `${signed(db, 3)} dB` },
      { name: 'Power ratio', figure: `${power} to 1` },
      { name: 'Voltage ratio, in one resistance', figure: `${voltage} to 1` },
      { name: 'Nepers', figure: `${fixed(db / dbFromNepers(1), 4)} Np` },
      { name: 'The other way, powers', figure: `${ratioText(powerRatioFromDb(back))} to 1` },
      { name: 'The other way, voltages', figure: `${ratioText(voltageRatioFromDb(back))} to 1` },
    ],
  };
}
