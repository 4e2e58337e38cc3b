import type { Verdict } from '@ferrite-row/levels';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { CautionKind } from '../../../shared-ui/caution-symbols';

/** A figure of the answer line. */
export interface JudgedFigure {
  name: string;
  figure: string;
  unit?: string;
  words?: string;
  tone?: 'plain' | 'caution';
}

export interface JudgedRow {
  cells: readonly string[];
  verdict?: Verdict;
}

/** A table of the results; its first column is the name. */
export interface JudgedTable {
  title: string;
  heads: readonly string[];
  rows: readonly JudgedRow[];
  /** Said where there are no rows. */
  none?: string;
}

/** What any of the guards comes to. It never says that something may be done. */
export interface Judged {
  figures: readonly JudgedFigure[];
  tables: readonly JudgedTable[];
  /** Where the rule or the method comes from, with its day. */
  source: string;
  caution: { kind: CautionKind; words: string };
}

/** A head inside a line: small, but for a unit or an abbreviation. */
const within = (head: string): string =>
  /^[A-Z][a-z]/.test(head) && !head.startsWith('MHz') ? head.charAt(0).toLowerCase() + head.slice(1) : head;

function rowText({ heads, rows, none = '' }: JudgedTable): string[] {
  if (rows.length === 0) return [`  ${none}`];
  const isPair = heads.length <= 2;
  return rows.map(({ cells: [name, ...rest], verdict }) => {
    const told = rest.flatMap((cell, index) => {
      if (cell === '') return [];
      return [isPair ? cell : `${within(heads[index + 1] ?? '')} ${cell}`];
    });
    const all = [...told, ...(verdict ? [VERDICTS[verdict].words.toLowerCase()] : [])];
    return all.length === 0 ? `  ${name}` : `  ${name}: ${all.join(', ')}`;
  });
}

const figureText = ({ name, figure, unit = '', words }: JudgedFigure): string =>
  `${name}: ${`${figure} ${unit}`.trim()}${words ? ` (${words.replace(/\.$/, '')})` : ''}`;

/** The same as lines for a letter, the caution last. */
export const inText = ({ figures, tables, source, caution }: Judged): string =>
  [
    ...figures.map(figureText),
    ...tables.flatMap((table) => [`${table.title}:`, ...rowText(table)]),
    `Source: ${source}`,
    caution.words,
  ].join('\n');

export const spoken = ({ figures }: Judged): string =>
  figures.map(({ name, figure, unit = '', words = '' }) => `${name} ${figure} ${unit}. ${words}`).join(' ');
