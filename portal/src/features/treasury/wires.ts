import type { BookItem, StatementLine } from './api/treasury';

/** One row of both lists is this high, so that a wire needs no measuring. */
export const ROW = 45;
export const GAP = 112;

export type WireKind = 'matched' | 'chosen' | 'none';

export interface Wire {
  key: string;
  kind: WireKind;
  /** Rows at the left and the right, from 0; without a right row it is a stub. */
  from: number;
  to?: number;
}

const middle = (row: number): number => row * ROW + ROW / 2;

/** Joins each line to its place in the books, the opened line to what is chosen for it, and ends the rest in a stub. */
export function wiresOf(
  lines: readonly StatementLine[],
  books: readonly BookItem[],
  openedId: string | undefined,
  chosenIds: ReadonlySet<string>,
): Wire[] {
  return lines.flatMap((line, from): Wire[] => {
    const isOpened = line.id === openedId;
    const rows = books.flatMap((item, row) => {
      const isJoined =
        line.state === 'matched'
          ? item.lineId === line.id
          : isOpened && item.lineId === null && chosenIds.has(item.id);
      return isJoined ? [row] : [];
    });
    if (rows.length === 0) return line.state === 'matched' ? [] : [{ key: line.id, kind: 'none', from }];
    const kind: WireKind = isOpened ? 'chosen' : 'matched';
    return rows.map((to) => ({ key: `${line.id}:${to}`, kind, from, to }));
  });
}

/** A curve that leaves and arrives level. */
export function pathOf({ from, to }: Wire): string {
  const start = middle(from);
  if (to === undefined) return `M4 ${start}H22M22 ${start - 5}v10`;
  const end = middle(to);
  const turn = GAP / 2;
  return `M4 ${start}C${turn} ${start} ${turn} ${end} ${GAP - 4} ${end}`;
}
