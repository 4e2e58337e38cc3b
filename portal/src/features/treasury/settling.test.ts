import { describe, expect, it } from 'vitest';
import type { BookItem, StatementLine } from './api/treasury';
import { afterMatch, booksShown, faultOf, matchBody, nextUnmatched, sentenceOf, sumOf } from './settling';
import { pathOf, ROW, wiresOf } from './wires';

const line = (overrides: Partial<StatementLine> = {}): StatementLine => ({
  id: 'line',
  day: '2026-09-09',
  description: 'FPI M Ostrow',
  amountMinor: 6000,
  state: 'no match',
  reasons: ['There is no reference on the line.'],
  match: null,
  ...overrides,
});
const item = (overrides: Partial<BookItem> = {}): BookItem => ({
  kind: 'invoice',
  id: 'd415',
  tag: 'D-0415',
  name: 'Marek Ostrow',
  detail: 'Dues, October to December',
  amountMinor: 2400,
  lineId: null,
  ...overrides,
});
const kit = item({ id: 'k88', tag: 'K-0088', detail: 'Kit, 3 of 4', amountMinor: 3600 });
const choice = (...items: BookItem[]) => ({ items, accountCode: '', note: '' });

describe('settling a line by hand', () => {
  it.each([
    ['nothing chosen', choice(), 'choose what it pays'],
    ['two invoices of one person', choice(item(), kit), undefined],
    [
      'invoices of two people',
      choice(item(), item({ id: 'x', name: 'Lena Quist' })),
      'invoices of one person',
    ],
    ['a payment of another amount', choice(item({ kind: 'payment', tag: 'R-0377' })), 'R-0377 is 24.00'],
    ['a payment of its amount', choice(item({ kind: 'payment', amountMinor: 6000 })), undefined],
    ['an account', { ...choice(), accountCode: '5000' }, undefined],
    ['both', { ...choice(item()), accountCode: '5000' }, 'either the books or an account'],
  ])('%s', (_what, chosen, fault) => {
    expect(faultOf(line(), chosen)).toBe(fault);
  });

  it('lets money out pay no invoice', () => {
    expect(faultOf(line({ amountMinor: -650 }), choice(item()))).toBe('money out pays no invoice');
  });

  it('says the sum, and what becomes of the rest', () => {
    expect(sumOf(line(), [item(), kit])).toBe('24.00 + 36.00 = 60.00, exactly');
    expect(sumOf(line(), [item()])).toBe('24.00, and 36.00 becomes credit');
    expect(sumOf(line({ amountMinor: 2000 }), [item()])).toBe('24.00, so 4.00 stays open');
    expect(sentenceOf(line(), [item(), kit], 'GBP')).toBe('FPI M Ostrow, £60.00 pays D-0415 and K-0088');
  });

  it('sends one of the three', () => {
    expect(matchBody(choice(item(), kit))).toEqual({ invoiceIds: ['d415', 'k88'] });
    expect(matchBody(choice(item({ kind: 'payment', id: 'r1' })))).toEqual({ paymentId: 'r1' });
    expect(matchBody({ ...choice(), accountCode: '5000', note: ' fee ' })).toEqual({
      accountCode: '5000',
      note: 'fee',
    });
  });

  it('knows the difference after the match, and the next line', () => {
    const totals = {
      openingMinor: 0,
      matchedMinor: 0,
      booksMinor: 0,
      statementMinor: 0,
      earlierMinor: 0,
      differenceMinor: 12_733,
    };
    expect(afterMatch(totals, line())).toBe(6733);
    const lines = [line({ id: 'a' }), line({ id: 'b', state: 'matched' }), line({ id: 'c' })];
    expect(nextUnmatched(lines, 'a')).toBe('c');
    expect(nextUnmatched(lines, 'c')).toBe('a');
    expect(nextUnmatched([line({ id: 'b', state: 'matched' })], 'b')).toBeUndefined();
  });

  it('shows the exact amount first, finds by name, and keeps what is chosen in sight', () => {
    const books = [
      item({ id: 'm', lineId: 'other' }),
      item(),
      kit,
      item({ id: 'e', tag: 'C-1', name: 'Lena Quist', amountMinor: 6000 }),
    ];
    const ids = (find: string, chosen: BookItem[], most = 20) =>
      booksShown(books, line(), { items: chosen }, { find, most }).shown.map(({ id }) => id);
    expect(ids('', [])).toEqual(['m', 'e', 'd415', 'k88']);
    expect(ids('quist', [])).toEqual(['m', 'e']);
    expect(ids('quist', [kit])).toEqual(['m', 'k88', 'e']);
    expect(booksShown(books, line(), { items: [] }, { find: '', most: 1 }).hidden).toBe(0);
  });
});

describe('wires', () => {
  it('join a matched line to its place, the opened one to what is chosen, and end the rest in a stub', () => {
    const lines = [line({ id: 'a', state: 'matched' }), line({ id: 'b' }), line({ id: 'c' })];
    const books = [item({ lineId: 'a' }), kit];
    const wires = wiresOf(lines, books, 'b', new Set(['k88']));
    expect(wires.map(({ kind, from, to }) => [kind, from, to])).toEqual([
      ['matched', 0, 0],
      ['chosen', 1, 1],
      ['none', 2, undefined],
    ]);
  });

  it('leave and arrive level with their rows', () => {
    const path = pathOf({ key: 'x', kind: 'matched', from: 0, to: 2 });
    expect(path.startsWith(`M4 ${ROW / 2}`)).toBe(true);
    expect(path.endsWith(` ${2.5 * ROW}`)).toBe(true);
  });
});
