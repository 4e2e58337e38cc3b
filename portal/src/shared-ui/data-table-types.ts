import type { ReactNode } from 'react';

export interface Column<T> {
  key: string;
  header: string;
  cell: (row: T) => ReactNode;
  /** Money and readings stand at the right. */
  align?: 'left' | 'right';
  width?: string | number;
  /**
   * On a phone: in the row's first line, at its right end, in the second line (the default), a button at the end of
   * both, or left out.
   */
  phone?: 'first' | 'end' | 'second' | 'act' | 'hidden';
  sort?: { direction: 'ascending' | 'descending' | 'none'; onSort: () => void };
}

export interface DataTableProps<T> {
  /** What the table lists, for a screen reader. */
  label: string;
  /** The first one is the name you would say aloud. */
  columns: readonly Column<T>[];
  rows: readonly T[];
  rowKey: (row: T) => string;
  /** Opens a row; the name in its first cell becomes the button. */
  onOpen?: (row: T) => void;
  openKey?: string;
  /** States the whole: "48 people, 3 shown". */
  footer?: ReactNode;
}
