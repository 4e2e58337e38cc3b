import type { MatchedHow } from '../line-match.entity';

export class StatementDto {
  id: string;
  fileName: string;
  fromOn: string;
  toOn: string;
  openingMinor: number;
  closingMinor: number;
  lineCount: number;
  matchedCount: number;
  /** Sum of the lines that have no match yet. */
  unmatchedMinor: number;
  /** Lines of the file that an earlier statement had brought, and that were not counted again. */
  knownLines: number;
  importedAt: string;
}

export class StatementsPageDto {
  items: StatementDto[];
  total: number;
  page: number;
  perPage: number;
}

export class LineMatchDto {
  how: MatchedHow;
  matchedAt: string;
  paymentId: string | null;
}

export const LINE_STATES = ['matched', 'no match'] as const;
export type LineState = (typeof LINE_STATES)[number];

export class StatementLineDto {
  id: string;
  day: string;
  description: string;
  /** Money in is positive. */
  amountMinor: number;
  state: LineState;
  /** Why it is matched, or why it did not match by itself. */
  reasons: string[];
  match: LineMatchDto | null;
}

export const BOOK_KINDS = ['invoice', 'payment', 'account'] as const;
export type BookKind = (typeof BOOK_KINDS)[number];

/** Something in the books: what a line was matched to, or what is still waiting for its line. */
export class BookItemDto {
  kind: BookKind;
  /** Of the invoice or payment; the code of an account. */
  id: string;
  /** @example D-0412 */
  tag: string;
  name: string;
  detail: string;
  amountMinor: number;
  /** The statement's line it belongs to; null while it is open. */
  lineId: string | null;
}

export class TotalsDto {
  openingMinor: number;
  matchedMinor: number;
  /** The current account by the ledger, after this statement's matches. */
  booksMinor: number;
  statementMinor: number;
  /** What earlier statements have left unmatched; part of the difference. */
  earlierMinor: number;
  differenceMinor: number;
}

export class SettlingAccountDto {
  code: string;
  name: string;
}

export class StatementDetailDto extends StatementDto {
  currency: string;
  lines: StatementLineDto[];
  books: BookItemDto[];
  /** Open items that the list has no room for. */
  booksLeftOut: number;
  totals: TotalsDto;
  /** Accounts a line may be settled against by hand. */
  accounts: SettlingAccountDto[];
}
