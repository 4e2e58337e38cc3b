import { CsvError, parse } from 'csv-parse/sync';
import { writeMinor } from '../common/minor-units';

/**
 * The club's own form of a statement file: UTF-8 text with commas and a heading line that names the columns `date`,
 * `description`, `amount` and `balance` in any order; further columns are passed over. Dates are 2026-09-30, amounts
 * have a point and at most the currency's decimals, money out is negative, `balance` is the account's after the line.
 * Lines stand oldest first or newest first.
 */
const COLUMNS = ['date', 'description', 'amount', 'balance'] as const;
type Column = (typeof COLUMNS)[number];

export const MOST_LINES = 5000;
const LONGEST_DESCRIPTION = 200;

export interface FileLine {
  day: string;
  description: string;
  amountMinor: number;
  balanceMinor: number;
}

export interface StatementFile {
  /** Oldest first. */
  lines: FileLine[];
  openingMinor: number;
  closingMinor: number;
}

/** What is wrong with which line of the file; the heading is line 1. */
export class BadLine extends Error {
  constructor(
    readonly line: number,
    readonly reason: string,
  ) {
    super(`Line ${line}: ${reason}`);
  }
}

interface NumberedLine extends FileLine {
  line: number;
}

/** @throws BadLine for the first line that cannot be taken as it stands. */
export function readStatement(text: string, currency: string, digits: number, today: string): StatementFile {
  const [heading, ...rows] = rowsOf(text);
  if (!heading) throw new BadLine(1, 'the file is empty.');
  const at = columnsOf(heading.cells);
  const read = rows.map(({ line, cells }) => readRow(line, cells, at, digits, today));
  const [first] = read;
  if (!first) throw new BadLine(2, 'there is no line under the heading.');
  const lines = chained(read, currency);
  const oldest = lines[0] ?? first;
  const newest = lines[lines.length - 1] ?? first;
  return {
    lines: lines.map(({ line: _, ...one }) => one),
    openingMinor: oldest.balanceMinor - oldest.amountMinor,
    closingMinor: newest.balanceMinor,
  };
}

/**
 * Minor units of a decimal, exactly; no rounding, no exponent.
 * @returns undefined when it is not an amount of that many decimals.
 * @example readDecimal('1,234.5', 2) //=> 123450
 */
export function readDecimal(text: string, digits: number): number | undefined {
  const parts = /^([-+−]?)(\d{1,12}|\d{1,3}(?:,\d{3}){1,3})(?:\.(\d+))?$/.exec(text.trim());
  if (!parts) return undefined;
  const [, sign, whole = '', decimals = ''] = parts;
  if (decimals.length > digits) return undefined;
  const minor = Number(whole.replaceAll(',', '') + decimals.padEnd(digits, '0'));
  if (!Number.isSafeInteger(minor)) return undefined;
  return sign === '-' || sign === '−' ? 0 - minor : minor;
}

function rowsOf(text: string): { line: number; cells: string[] }[] {
  try {
    const rows = parse(text, { bom: true, info: true, skip_empty_lines: true, to: MOST_LINES + 2 });
    if (rows.length > MOST_LINES + 1)
      throw new BadLine(
        MOST_LINES + 2,
        `a file may have ${MOST_LINES} lines. Take a shorter stretch of days.`,
      );
    return (rows as unknown as { info: { lines: number }; record: string[] }[]).map(({ info, record }) => ({
      line: info.lines,
      cells: record,
    }));
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    const line: unknown = Reflect.get(error, 'lines');
    const reason =
      error.code === 'CSV_RECORD_INCONSISTENT_FIELDS_LENGTH'
        ? 'it has more or fewer columns than the heading.'
        : 'its quotation marks do not close.';
    throw new BadLine(typeof line === 'number' ? line : 1, reason);
  }
}

function columnsOf(heading: string[]): Record<Column, number> {
  const names = heading.map((name) => name.trim().toLowerCase());
  const at = COLUMNS.map((column) => [column, names.indexOf(column)] as const);
  const missing = at.filter(([, index]) => index < 0).map(([column]) => column);
  if (missing.length > 0)
    throw new BadLine(1, `the heading has no ${missing.join(', no ')}. It names ${COLUMNS.join(', ')}.`);
  const twice = COLUMNS.find((column) => names.filter((name) => name === column).length > 1);
  if (twice) throw new BadLine(1, `the heading names ${twice} twice.`);
  return Object.fromEntries(at) as Record<Column, number>;
}

function readRow(
  line: number,
  cells: string[],
  at: Record<Column, number>,
  digits: number,
  today: string,
): NumberedLine {
  const cell = (column: Column): string => (cells[at[column]] ?? '').trim();
  const day = readDay(line, cell('date'), today);
  const description = cell('description').replaceAll(/\s+/g, ' ');
  if (description === '') throw new BadLine(line, 'the description is empty.');
  if (description.length > LONGEST_DESCRIPTION)
    throw new BadLine(line, `the description is longer than ${LONGEST_DESCRIPTION} characters.`);
  const amountMinor = readAmount(line, 'amount', cell('amount'), digits);
  if (amountMinor === 0) throw new BadLine(line, 'the amount is nothing.');
  return {
    line,
    day,
    description,
    amountMinor,
    balanceMinor: readAmount(line, 'balance', cell('balance'), digits),
  };
}

function readDay(line: number, text: string, today: string): string {
  const isDay = /^\d{4}-\d{2}-\d{2}$/.test(text) && isOnCalendar(text);
  if (!isDay) throw new BadLine(line, `“${shortened(text)}” is not a date such as 2026-09-30.`);
  if (text > today) throw new BadLine(line, `${text} has not come yet.`);
  return text;
}

/** 30 February is read as 2 March by Date, so it is written back and compared. */
function isOnCalendar(text: string): boolean {
  const date = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
}

function readAmount(line: number, column: 'amount' | 'balance', text: string, digits: number): number {
  const minor = readDecimal(text, digits);
  if (minor !== undefined) return minor;
  const example = digits === 0 ? '-12' : `-12.${'5'.padEnd(digits, '0')}`;
  throw new BadLine(line, `“${shortened(text)}” is no ${column} such as ${example}.`);
}

/** Oldest first, whichever way round the file is: the balances tell. */
function chained(lines: NumberedLine[], currency: string): NumberedLine[] {
  const broken = firstBreak(lines);
  if (!broken) return lines;
  const turned = lines.toReversed();
  if (!firstBreak(turned)) return turned;
  const { before, line } = broken;
  const expected = before.balanceMinor + line.amountMinor;
  const write = (minor: number): string => writeMinor(minor, currency);
  throw new BadLine(
    line.line,
    `${write(before.balanceMinor)} and ${write(line.amountMinor)} make ${write(expected)}, but the balance says ${write(line.balanceMinor)}. A line is missing, or one was changed.`,
  );
}

function firstBreak(lines: NumberedLine[]): { before: NumberedLine; line: NumberedLine } | undefined {
  for (const [index, line] of lines.entries()) {
    const before = lines[index - 1];
    if (before && before.balanceMinor + line.amountMinor !== line.balanceMinor) return { before, line };
  }
  return undefined;
}

const shortened = (text: string): string => (text.length > 30 ? `${text.slice(0, 30)}…` : text);
