import { dBm, formatQuantity, ohms, sumOfLevels, voltsRmsFromDbm, wattsFromDbm } from '@ferrite-row/levels';
import { counted, signed } from '../../../lib/text';
import type { ConversionValues } from './inputs';
import { dbmText, voltText } from './level';
import type { ConversionSheet } from './sheet';

const NAMES = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'] as const;

const LABELS: Record<(typeof NAMES)[number], string> = {
  first: 'First',
  second: 'Second',
  third: 'Third',
  fourth: 'Fourth',
  fifth: 'Fifth',
  sixth: 'Sixth',
};

/** Several levels in one resistance: as powers, and in phase, which is the most they can come to. */
export function workSum(values: ConversionValues): ConversionSheet {
  const resistance = ohms(values.resistance, 'resistance');
  const given = NAMES.flatMap((name) => {
    const level = values[name];
    return level === undefined ? [] : [{ name: LABELS[name], level: dBm(level, name) }];
  });
  const levels = given.map(({ level }) => level);
  const together = sumOfLevels(levels, 'power');
  const inPhase = sumOfLevels(levels, 'voltage');
  const total = wattsFromDbm(together);
  return {
    title: `${counted(given.length, 'level')} together in ${formatQuantity(resistance, 'ohm')}`,
    heading: 'What each gives',
    ohms: resistance,
    marks: [
      ...given.map(({ name, level }) => ({ db: level, words: name, tone: 'copper' as const })),
      { db: together, words: `together ${signed(together, 1)}`, tone: 'ink' },
    ],
    cells: [
      {
        name: 'Together',
        figure: signed(together, 2),
        unit: 'dBm',
        words: `${formatQuantity(total, 'W')}, signals unlike one another`,
      },
      {
        name: 'In phase, at most',
        figure: signed(inPhase, 2),
        unit: 'dBm',
        words: `${voltText(voltsRmsFromDbm(inPhase, resistance))} rms, one frequency`,
      },
      {
        name: 'Over the strongest',
        figure: signed(together - Math.max(...levels), 2),
        unit: 'dB',
      },
    ],
    figures: [
      ...given.map(({ name, level }) => ({
        name,
        figure: `${dbmText(level)}, ${Number(((100 * wattsFromDbm(level)) / total).toPrecision(3))} % of the power`,
      })),
      { name: 'Together, powers added', figure: dbmText(together) },
      { name: 'In phase, voltages added', figure: dbmText(inPhase) },
    ],
  };
}
