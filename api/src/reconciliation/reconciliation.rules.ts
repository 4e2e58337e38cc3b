import { faultOf, printReference } from '../common/creditor-reference.rules';
import { sumMinor, writeMinor } from '../common/minor-units';

export interface BookInvoice {
  id: string;
  number: string;
  reference: string;
  personId: string;
  openMinor: number;
}

/** A transfer that was written down before the bank showed it. */
export interface BookTransfer {
  id: string;
  receiptNumber: string;
  amountMinor: number;
  invoiceIds: readonly string[];
}

export interface Books {
  invoices: readonly BookInvoice[];
  transfers: readonly BookTransfer[];
}

export type Finding =
  | { kind: 'invoices'; invoices: BookInvoice[]; reasons: string[] }
  | { kind: 'transfer'; transfer: BookTransfer; reasons: string[] }
  | { kind: 'none'; reasons: string[] };

interface Line {
  description: string;
  amountMinor: number;
}

const WRITTEN = /(?<![A-Z0-9])RF\d{2}[A-Z0-9]*(?: [A-Z0-9]+)*/g;

/**
 * What in a bank's text may be a creditor reference. Banks keep or drop the spaces of the printed form, and write on
 * after it, so each beginning of the words is a candidate: `RF43 LRBD 0421 DUES` gives four.
 * @returns for each place that begins like a reference its candidates, longest first.
 */
export function candidatesIn(description: string): string[][] {
  const text = description.toUpperCase().replaceAll(/\s+/g, ' ');
  return [...text.matchAll(WRITTEN)].flatMap(([found]) => splitAtNext(found).map(beginnings));
}

/** Two references in a row are two. */
function splitAtNext(found: string): string[] {
  return found.split(/ (?=RF\d{2})/);
}

function beginnings(words: string): string[] {
  const parts = words.split(' ');
  return parts.map((_, index) => parts.slice(0, parts.length - index).join(''));
}

/**
 * Finds what a line pays by exact reference and exact amount; anything less is left to a person, with the reason.
 */
export function findByReference(line: Line, books: Books, currency: string): Finding {
  const places = candidatesIn(line.description);
  if (places.length === 0) return none('There is no reference on the line.');
  const invoices = places.map((candidates) =>
    candidates
      .map((candidate) => books.invoices.find(({ reference }) => reference === candidate))
      .find(Boolean),
  );
  const strange = places.filter((_, index) => !invoices[index]);
  const known = [...new Set(invoices.filter((invoice) => invoice !== undefined))];
  if (known.length === 0 || strange.length > 0) return none(...strange.map(whyStrange));
  return fit(line, known, books, currency);
}

function fit(line: Line, invoices: BookInvoice[], books: Books, currency: string): Finding {
  const write = (amountMinor: number): string => writeMinor(amountMinor, currency);
  const named = invoices.map(
    ({ reference, number }) => `Reference ${printReference(reference)} is that of ${number}`,
  );
  const transfer = books.transfers.find(
    ({ amountMinor, invoiceIds }) =>
      amountMinor === line.amountMinor && invoices.every(({ id }) => invoiceIds.includes(id)),
  );
  if (transfer) {
    const reason = `${transfer.receiptNumber}, a transfer of ${write(transfer.amountMinor)}, was written down for it`;
    return { kind: 'transfer', transfer, reasons: [...named, reason] };
  }
  if (new Set(invoices.map(({ personId }) => personId)).size > 1)
    return none(...named, 'They are invoices of different people');
  const open = invoices.map(({ openMinor }) => openMinor);
  if (sumMinor(open) === 0) return none(...named, 'It is paid already');
  if (sumMinor(open) !== line.amountMinor)
    return none(...named, `${write(sumMinor(open))} is open and ${write(line.amountMinor)} came`);
  const sum = open.length > 1 ? `${open.map(write).join(' + ')} = ` : '';
  return {
    kind: 'invoices',
    invoices,
    reasons: [...named, `${sum}${write(line.amountMinor)} is exactly what is open`],
  };
}

function whyStrange(candidates: string[]): string {
  const sound = candidates.find((candidate) => faultOf(candidate) === undefined);
  if (sound) return `Reference ${printReference(sound)} is none of the club’s`;
  // The shortest with a body is what was most likely meant: what follows are words.
  const meant = candidates.findLast((candidate) => candidate.length > 4) ?? candidates[0] ?? '';
  return `${printReference(meant)} looks like a reference, but ${faultOf(meant) ?? 'it is none'}`;
}

const none = (...reasons: string[]): Finding => ({ kind: 'none', reasons });

export interface Totals {
  openingMinor: number;
  matchedMinor: number;
  booksMinor: number;
  statementMinor: number;
  /** What earlier statements have left unmatched. */
  earlierMinor: number;
  /** Nothing when every line so far has its place in the books. */
  differenceMinor: number;
}

/** The running difference. `booksMinor` comes from the ledger, so the two sides are worked out apart. */
export function totals(
  statement: { openingMinor: number; closingMinor: number },
  lines: readonly { amountMinor: number; isMatched: boolean }[],
  booksMinor: number,
  earlierMinor: number,
): Totals {
  const matched = lines.filter(({ isMatched }) => isMatched).map(({ amountMinor }) => amountMinor);
  return {
    openingMinor: statement.openingMinor,
    matchedMinor: sumMinor(matched),
    booksMinor,
    statementMinor: statement.closingMinor,
    earlierMinor,
    differenceMinor: statement.closingMinor - booksMinor,
  };
}
