import { candidatesIn, findByReference, totals, type Books } from './reconciliation.rules';

const D421 = { id: 'd421', number: 'D-0421', reference: 'RF43LRBD0421', personId: 'tamsin', openMinor: 2400 };
const K88 = {
  id: 'k88',
  number: 'K-0088',
  reference: 'RF18539007547034',
  personId: 'marek',
  openMinor: 3600,
};
const D415 = { id: 'd415', number: 'D-0415', reference: 'RF712348231', personId: 'marek', openMinor: 2400 };
const books = (overrides: Partial<Books> = {}): Books => ({
  invoices: [D421, K88, D415],
  transfers: [],
  ...overrides,
});
const find = (description: string, amountMinor: number, more?: Partial<Books>) =>
  findByReference({ description, amountMinor }, books(more), 'GBP');

describe('references in a bank’s text', () => {
  it.each([
    ['RF43LRBD0421', [['RF43LRBD0421']]],
    ['FPI T ARDLEY rf43 lrbd 0421', [['RF43LRBD0421', 'RF43LRBD', 'RF43']]],
    ['RF43  LRBD0421 DUES', [['RF43LRBD0421DUES', 'RF43LRBD0421', 'RF43']]],
    ['REF:RF43LRBD0421/DUES', [['RF43LRBD0421']]],
    ['RF71 2348231 RF43LRBD0421', [['RF712348231', 'RF71'], ['RF43LRBD0421']]],
    ['SERF40 HALL', []],
    ['RF LOAD 50 OHM', []],
  ])('reads “%s”', (text, candidates) => {
    expect(candidatesIn(text)).toEqual(candidates);
  });
});

describe('matching by reference', () => {
  it('matches the exact reference and the exact amount, with or without the spaces', () => {
    for (const text of ['RF43LRBD0421', 'FPI T Ardley RF43 LRBD 0421 dues'])
      expect(find(text, 2400)).toEqual({
        kind: 'invoices',
        invoices: [D421],
        reasons: ['Reference RF43 LRBD 0421 is that of D-0421', '24.00 is exactly what is open'],
      });
  });

  it('matches two references on one line when their sum came', () => {
    expect(find('RF712348231 RF18 5390 0754 7034', 6000)).toMatchObject({
      kind: 'invoices',
      invoices: [D415, K88],
      reasons: [
        'Reference RF71 2348 231 is that of D-0415',
        'Reference RF18 5390 0754 7034 is that of K-0088',
        '24.00 + 36.00 = 60.00 is exactly what is open',
      ],
    });
  });

  it('matches a transfer that was written down before instead of paying a second time', () => {
    const transfer = { id: 'r1', receiptNumber: 'R-0377', amountMinor: 2400, invoiceIds: ['d421'] };
    const paid = { invoices: [{ ...D421, openMinor: 0 }], transfers: [transfer] };
    expect(find('RF43LRBD0421', 2400, paid)).toMatchObject({ kind: 'transfer', transfer });
    expect(find('RF43LRBD0421', 2300, paid)).toMatchObject({ kind: 'none' });
  });

  it.each([
    ['no reference', 'FPI M Ostrow', 2400, ['There is no reference on the line.']],
    [
      'another amount',
      'RF43LRBD0421',
      2000,
      ['Reference RF43 LRBD 0421 is that of D-0421', '24.00 is open and 20.00 came'],
    ],
    [
      'money out',
      'RF43LRBD0421',
      -2400,
      ['Reference RF43 LRBD 0421 is that of D-0421', '24.00 is open and −24.00 came'],
    ],
    ['a reference of nobody here', 'RF90A1', 2400, ['Reference RF90 A1 is none of the club’s']],
    // Source: worked example "a bad check digit must be shown, not silently matched", made apart from this code.
    [
      'wrong check digits',
      'RF17539007547034',
      3600,
      ['RF17 5390 0754 7034 looks like a reference, but its check digits are wrong'],
    ],
    [
      'two people',
      'RF43LRBD0421 RF712348231',
      4800,
      [
        'Reference RF43 LRBD 0421 is that of D-0421',
        'Reference RF71 2348 231 is that of D-0415',
        'They are invoices of different people',
      ],
    ],
  ])('leaves the line to a person and says why: %s', (_what, text, amount, reasons) => {
    expect(find(text, amount)).toEqual({ kind: 'none', reasons });
  });

  it('does not pay an invoice that is paid already', () => {
    expect(find('RF43LRBD0421', 2400, { invoices: [{ ...D421, openMinor: 0 }] })).toEqual({
      kind: 'none',
      reasons: ['Reference RF43 LRBD 0421 is that of D-0421', 'It is paid already'],
    });
  });
});

describe('the running difference', () => {
  it('is what the statement says less what the books say', () => {
    const statement = { openingMinor: 341_286, closingMinor: 323_308 };
    const lines = [
      { amountMinor: -30_711, isMatched: true },
      { amountMinor: 12_733, isMatched: false },
    ];
    expect(totals(statement, lines, 310_575, 0)).toEqual({
      openingMinor: 341_286,
      matchedMinor: -30_711,
      booksMinor: 310_575,
      statementMinor: 323_308,
      earlierMinor: 0,
      differenceMinor: 12_733,
    });
  });
});
