import {
  dB,
  dBm,
  formatQuantity,
  LevelsError,
  ohms,
  powerRatioFromDb,
  voltageRatioFromDb,
  voltsRmsFromDbm,
  wattsFromDbm,
  type Ohms,
} from '@ferrite-row/levels';
import { signed } from '../../../lib/text';
import { ratioText } from './ratio';
import type { ConversionSheet, RuleMark } from './sheet';

/** One figure of the rule: its decibels, and what they are as a power and a voltage. */
interface RuleTick {
  db: number;
  words: readonly [level: string, power: string, voltage: string];
}

export interface RuleScale {
  from: number;
  to: number;
  ticks: RuleTick[];
  /** Heads of the three rows. */
  rows: readonly [level: string, power: string, voltage: string];
}

/** Room on either side of the marks, and the least that is shown. */
const ROOM_DB = 15;
const LEAST_DB = 60;

/** A figure needs so much room. */
const TICK_WIDTH = 62;

const STEPS = [10, 20, 30, 50, 100, 200, 500];

function rangeOf(marks: readonly RuleMark[]): [from: number, to: number] {
  const all = marks.map(({ db }) => db);
  const [low, high] = [Math.min(...all) - ROOM_DB, Math.max(...all) + ROOM_DB];
  const missing = Math.max(LEAST_DB - (high - low), 0) / 2;
  return [Math.floor((low - missing) / 10) * 10, Math.ceil((high + missing) / 10) * 10];
}

type TickWords = RuleTick['words'];

const ratioWords = (db: number): TickWords => [
  signed(db, 0),
  ratioText(powerRatioFromDb(dB(db))),
  ratioText(voltageRatioFromDb(dB(db))),
];

/** At the far ends of a rule there may be no power or voltage that can be told: its place stays empty. */
function tellable(tell: () => string): string {
  try {
    return tell();
  } catch (error) {
    if (error instanceof LevelsError) return '';
    throw error;
  }
}

const levelWords =
  (resistance: Ohms) =>
  (db: number): TickWords => [
    signed(db, 0),
    tellable(() => formatQuantity(wattsFromDbm(dBm(db)), 'W')),
    tellable(() => formatQuantity(voltsRmsFromDbm(dBm(db), resistance), 'V')),
  ];

/** The level as a rule has it: no more figures than can be read in so many pixels. */
export function ruleScale({ marks, ohms: resistance }: ConversionSheet, width: number): RuleScale {
  const [from, to] = rangeOf(marks);
  const most = Math.max(2, Math.floor(width / TICK_WIDTH));
  const step = STEPS.find((size) => (to - from) / size <= most) ?? 1000;
  const first = Math.ceil(from / step) * step;
  const count = Math.floor((to - first) / step) + 1;
  const wordsOf = resistance === undefined ? ratioWords : levelWords(ohms(resistance));
  return {
    from,
    to,
    rows: resistance === undefined ? ['dB', 'Powers', 'Voltages'] : ['dBm', 'Power', 'Volts rms'],
    ticks: Array.from({ length: count }, (_, index) => first + index * step).map((db) => ({
      db,
      words: wordsOf(db),
    })),
  };
}

/**
 * The row over the rule in which each mark's words stand clear of the others, 0 the lowest. From right to left, so that
 * a line down to the rule never crosses words, which stand to its right.
 */
export function markRows(xs: readonly number[], room: number): number[] {
  const starts: number[] = [];
  const order = xs.map((x, index) => ({ x, index })).sort((a, b) => b.x - a.x);
  const rows = new Array<number>(xs.length).fill(0);
  for (const { x, index } of order) {
    const free = starts.findIndex((start) => x + room <= start);
    const row = free === -1 ? starts.length : free;
    starts[row] = x;
    rows[index] = row;
  }
  return rows;
}
