import { aged, ageOf, daysLate, initialsOf, spread, stateOf } from './dues.rules';

const invoice = (overrides = {}) => ({ amountMinor: 2400, paidMinor: 0, dueOn: '2026-10-31', ...overrides });

describe('the state of an invoice', () => {
  it.each([
    ['open before its day', {}, '2026-10-15', 'open', 0],
    ['open on its day', {}, '2026-10-31', 'open', 0],
    ['late the day after', {}, '2026-11-01', 'late', 1],
    ['late by weeks, across the change of the clocks', { dueOn: '2026-10-20' }, '2026-11-12', 'late', 23],
    ['part paid', { paidMinor: 1200 }, '2026-10-15', 'part paid', 0],
    ['late although part paid', { paidMinor: 1200 }, '2026-11-01', 'late', 1],
    ['paid, however long ago it was due', { paidMinor: 2400 }, '2027-11-01', 'paid', 0],
  ])('is %s', (_what, overrides, today, state, late) => {
    expect(stateOf(invoice(overrides), today)).toBe(state);
    expect(daysLate(invoice(overrides), today)).toBe(late);
  });
});

describe('spreading a payment', () => {
  const open = [
    { id: 'a', openMinor: 2400 },
    { id: 'b', openMinor: 3600 },
  ];

  it.each([
    ['fills the first before the second', 3000, [2400, 600], 0],
    ['pays both exactly', 6000, [2400, 3600], 0],
    ['leaves over what nothing asks for', 6500, [2400, 3600], 500],
    ['pays a part of the first', 1, [1], 0],
  ])('%s', (_what, amount, shares, left) => {
    const spreadOut = spread(amount, open);
    expect(spreadOut.shares.map(({ amountMinor }) => amountMinor)).toEqual(shares);
    expect(spreadOut.leftMinor).toBe(left);
  });

  it('gives nothing to what is paid already', () => {
    expect(spread(100, [{ id: 'a', openMinor: 0 }])).toEqual({ shares: [], leftMinor: 100 });
  });
});

describe('aged dues', () => {
  it.each([
    [0, 'not yet due'],
    [1, '1 to 30 days late'],
    [30, '1 to 30 days late'],
    [31, '31 to 60'],
    [60, '31 to 60'],
    [61, '61 to 90'],
    [90, '61 to 90'],
    [91, 'over 90'],
  ])('puts %i days late under “%s”', (days, age) => {
    expect(ageOf(days)).toBe(age);
  });

  it('names every band, counts what is left to pay, and leaves out what is paid', () => {
    const bands = aged(
      [invoice(), invoice({ paidMinor: 400, dueOn: '2026-10-01' }), invoice({ paidMinor: 2400 })],
      '2026-10-15',
    );
    expect(bands).toHaveLength(5);
    expect(bands[0]).toEqual({ age: 'not yet due', count: 1, openMinor: 2400 });
    expect(bands[1]).toEqual({ age: '1 to 30 days late', count: 1, openMinor: 2000 });
    expect(bands[4]).toEqual({ age: 'over 90', count: 0, openMinor: 0 });
  });
});

describe('small words', () => {
  it.each([
    ['Larkmoor Radio Builders', 'LRB'],
    ['The club', 'TC'],
    ['Écho & sons', 'ES'],
    ['', ''],
    ['a b c d e f g h', 'ABCDEF'],
  ])('takes from “%s” the letters “%s”', (name, letters) => {
    expect(initialsOf(name)).toBe(letters);
  });
});
