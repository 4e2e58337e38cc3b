import { formatAmount, formatMoney } from '../../lib/money';
import { listText } from '../../lib/text';
import type { BookItem, StatementLine, Totals } from './api/treasury';

/** What is chosen for the opened line: things of the books, or an account. */
export interface Choice {
  items: readonly BookItem[];
  accountCode: string;
  note: string;
}

type MatchBody = { invoiceIds: string[] } | { paymentId: string } | { accountCode: string; note?: string };

/** @returns why the choice cannot settle the line, or undefined when it can. */
export function faultOf(line: StatementLine, { items, accountCode }: Choice): string | undefined {
  if (items.length === 0) return accountCode ? undefined : 'choose what it pays';
  if (accountCode) return 'either the books or an account';
  if (line.amountMinor < 0) return 'money out pays no invoice';
  const payments = items.filter(({ kind }) => kind === 'payment');
  if (payments.length > 0 && items.length > 1) return 'one payment, or invoices';
  const [payment] = payments;
  if (payment && payment.amountMinor !== line.amountMinor)
    return `${payment.tag} is ${formatAmount(payment.amountMinor)}`;
  return new Set(items.map(({ name }) => name)).size > 1 ? 'invoices of one person' : undefined;
}

export function matchBody({ items, accountCode, note }: Choice): MatchBody {
  if (accountCode) return { accountCode, ...(note.trim() && { note: note.trim() }) };
  const payment = items.find(({ kind }) => kind === 'payment');
  if (payment) return { paymentId: payment.id };
  return { invoiceIds: items.map(({ id }) => id) };
}

/** 'FPI M Ostrow, £60.00 pays D-0415 and K-0088'. */
export function sentenceOf(line: StatementLine, items: readonly BookItem[], currency: string): string {
  const said = `${line.description}, ${formatMoney(line.amountMinor, currency)}`;
  return items.length === 0 ? said : `${said} pays ${listText(items.map(({ tag }) => tag))}`;
}

/** '24.00 + 36.00 = 60.00, exactly', or by how much it differs. */
export function sumOf(line: StatementLine, items: readonly BookItem[]): string | undefined {
  if (items.length === 0) return undefined;
  const sum = items.reduce((total, { amountMinor }) => total + amountMinor, 0);
  const parts = items.map(({ amountMinor }) => formatAmount(amountMinor)).join(' + ');
  const left = line.amountMinor - sum;
  const made = items.length > 1 ? `${parts} = ${formatAmount(sum)}` : parts;
  if (left === 0) return `${made}, exactly`;
  return left > 0
    ? `${made}, and ${formatAmount(left)} becomes credit`
    : `${made}, so ${formatAmount(-left)} stays open`;
}

/** The difference once the line is settled too. */
export const afterMatch = ({ differenceMinor }: Totals, line: StatementLine): number =>
  differenceMinor - line.amountMinor;

/** The next line without a match after this one, round to the first. */
export function nextUnmatched(
  lines: readonly StatementLine[],
  afterId: string | undefined,
): string | undefined {
  const at = lines.findIndex(({ id }) => id === afterId);
  const turned = [...lines.slice(at + 1), ...lines.slice(0, at + 1)];
  return turned.find(({ state }) => state === 'no match')?.id;
}

/**
 * What the books show beside a statement: what its lines were matched to, then the open items that may settle the opened
 * line, those of exactly its amount first; what is chosen never drops out of sight.
 */
export function booksShown(
  books: readonly BookItem[],
  line: StatementLine | undefined,
  { items: chosen }: Pick<Choice, 'items'>,
  { find, most }: { find: string; most: number },
): { shown: BookItem[]; hidden: number } {
  const matched = books.filter(({ lineId }) => lineId !== null);
  const words = find.trim().toLowerCase();
  const rank = (item: BookItem): number =>
    chosen.includes(item) ? 0 : item.amountMinor === line?.amountMinor ? 1 : 2;
  const open = books
    .filter((item) => item.lineId === null && (chosen.includes(item) || says(item, words)))
    .toSorted((a, b) => rank(a) - rank(b));
  const room = Math.max(most - matched.length, chosen.length, 3);
  return { shown: [...matched, ...open.slice(0, room)], hidden: Math.max(open.length - room, 0) };
}

const says = ({ tag, name, detail }: BookItem, words: string): boolean =>
  `${tag} ${name} ${detail}`.toLowerCase().includes(words);
