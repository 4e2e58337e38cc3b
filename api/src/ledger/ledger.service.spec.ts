import { startTestApp, type TestApp } from '../../test/app';
import { treasurer } from '../../test/factories/dues.factory';
import { someoneWith } from '../../test/factories/person.factory';
import { constraintOf } from '../common/constraint';
import { Account, type AccountKind } from './account.entity';
import { LedgerService, type NewEntry } from './ledger.service';

/**
 * Source: a worked ledger of ten entries made apart from this code; entries and trial balance were checked with
 * hledger 1.25 (`balance --flat --empty` and `check`).
 */
const WORKED: [day: string, text: string, sides: [account: string, amountMinor: number][]][] = [
  [
    '2026-11-01',
    'Dues invoice 2026-042',
    [
      ['receivable', 4800],
      ['dues', -4800],
    ],
  ],
  [
    '2026-11-01',
    'Dues invoice 2026-043',
    [
      ['receivable', 4800],
      ['dues', -4800],
    ],
  ],
  [
    '2026-11-03',
    'Card payment for 2026-042',
    [
      ['processor', 4708],
      ['card fees', 92],
      ['receivable', -4800],
    ],
  ],
  [
    '2026-11-04',
    'Card payment for 2026-043',
    [
      ['processor', 4708],
      ['card fees', 92],
      ['receivable', -4800],
    ],
  ],
  [
    '2026-11-06',
    'Credit note for 2026-043',
    [
      ['dues', 4800],
      ['refunds due', -4800],
    ],
  ],
  [
    '2026-11-07',
    'Refund by card',
    [
      ['refunds due', 4800],
      ['processor', -4800],
    ],
  ],
  [
    '2026-11-10',
    'Payout',
    [
      ['in transit', 4616],
      ['processor', -4616],
    ],
  ],
  [
    '2026-11-12',
    'Bank receipt of payout',
    [
      ['bank', 4616],
      ['in transit', -4616],
    ],
  ],
  [
    '2026-11-15',
    'Key deposit',
    [
      ['bank', 2500],
      ['key deposits', -2500],
    ],
  ],
  [
    '2026-11-20',
    'Room hire',
    [
      ['room', 3000],
      ['bank', -3000],
    ],
  ],
];
const KINDS: Record<string, AccountKind> = {
  bank: 'asset',
  'in transit': 'asset',
  processor: 'asset',
  receivable: 'asset',
  'card fees': 'expense',
  room: 'expense',
  dues: 'income',
  'key deposits': 'liability',
  'refunds due': 'liability',
};
const WORKED_BALANCES = {
  bank: 4116,
  'in transit': 0,
  processor: 0,
  receivable: 0,
  'card fees': 184,
  room: 3000,
  dues: -4800,
  'key deposits': -2500,
  'refunds due': 0,
};

describe('the ledger', () => {
  let test: TestApp;
  let ledger: LedgerService;

  beforeAll(async () => {
    test = await startTestApp();
    ledger = test.app.get(LedgerService);
    const accounts = Object.entries(KINDS).map(([name, kind]) => ({
      code: `x ${name}`,
      name: `x ${name}`,
      kind,
    }));
    await test.dataSource.getRepository(Account).insert(accounts);
  });
  afterAll(() => test.close());

  const entryOf = (sides: [string, number][], overrides: Partial<NewEntry> = {}): NewEntry => ({
    occurredOn: '2026-11-01',
    description: 'A test',
    source: { kind: 'journal', id: null },
    sides: sides.map(([account, amountMinor]) => ({ accountCode: `x ${account}`, amountMinor })),
    madeById: null,
    ...overrides,
  });
  const record = (entry: NewEntry) => test.dataSource.transaction((manager) => ledger.record(manager, entry));
  const reverse = (id: string) => test.dataSource.transaction((manager) => ledger.reverse(manager, id, null));
  const ruleBrokenBy = async (work: Promise<unknown>) =>
    work.then(
      () => 'none',
      (error: unknown) => constraintOf(error),
    );

  it('comes to the trial balance of the worked ledger, account by account and in both totals', async () => {
    for (const [occurredOn, description, sides] of WORKED)
      await record(entryOf(sides, { occurredOn, description }));
    const balances = await ledger.balances();
    const worked = balances.filter(({ code }) => code.startsWith('x '));
    expect(Object.fromEntries(worked.map(({ name, balanceMinor }) => [name.slice(2), balanceMinor]))).toEqual(
      WORKED_BALANCES,
    );
    const { agent } = await someoneWith(test, 'treasurer');
    const { body } = await agent.get('/api/ledger/trial-balance?on=2026-11-30').expect(200);
    expect(body).toMatchObject({ asOn: '2026-11-30', debitMinor: 7300, creditMinor: 7300 });
  });

  it('counts only what happened up to the day that is asked about', async () => {
    expect(await ledger.balance('x bank', '2026-11-11')).toBe(0);
    expect(await ledger.balance('x bank', '2026-11-12')).toBe(4616);
  });

  it('tells what came in and what went out in a stretch of days', async () => {
    expect(await ledger.movement('x bank', '2026-11-01', '2026-11-30')).toEqual({
      inMinor: 7116,
      outMinor: -3000,
    });
  });

  it('takes an entry back by its mirror image, on the same day, and leaves both standing', async () => {
    const id = await record(
      entryOf(
        [
          ['bank', 100],
          ['room', -100],
        ],
        { occurredOn: '2026-12-01' },
      ),
    );
    expect(await ledger.balance('x bank', '2026-12-01')).toBe(4216);
    await reverse(id);
    expect(await ledger.balance('x bank', '2026-12-01')).toBe(4116);
    expect(await ledger.movement('x bank', '2026-12-01', '2026-12-01')).toEqual({ inMinor: 0, outMinor: 0 });
  });

  it('reverses an entry once, also when two try at the same moment', async () => {
    const id = await record(
      entryOf([
        ['bank', 100],
        ['room', -100],
      ]),
    );
    const tries = await Promise.allSettled([reverse(id), reverse(id), reverse(id)]);
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    await expect(reverse(id)).rejects.toMatchObject({ code: 'entry-reversed-before' });
  });

  describe('is guarded by the database itself', () => {
    const insertEntry = (postings: number, reverses: string | null = null) =>
      `WITH made AS (INSERT INTO entry (occurred_on, description, source_kind, posting_count, recorded_at, reverses_id)
         VALUES ('2026-11-01', 'By hand', 'journal', ${postings}, now(), ${reverses ? `'${reverses}'` : 'NULL'}) RETURNING id)
       INSERT INTO posting (entry_id, account_code, amount_minor) SELECT id, code, amount FROM made, `;
    const query = (sql: string) => test.dataSource.transaction((manager) => manager.query(sql));

    it('refuses an entry that does not sum to nothing', async () => {
      const sql = `${insertEntry(2)} (VALUES ('x bank', 100), ('x room', -99)) AS side (code, amount)`;
      expect(await ruleBrokenBy(query(sql))).toBe('entry_balances');
    });

    it('refuses an entry without its postings', async () => {
      const sql = `INSERT INTO entry (occurred_on, description, source_kind, posting_count, recorded_at)
                   VALUES ('2026-11-01', 'Bare', 'journal', 2, now())`;
      expect(await ruleBrokenBy(query(sql))).toBe('entry_balances');
    });

    it('refuses a balanced pair added to an entry afterwards', async () => {
      const id = await record(
        entryOf([
          ['bank', 5],
          ['room', -5],
        ]),
      );
      const sql = `INSERT INTO posting (entry_id, account_code, amount_minor)
                   VALUES ('${id}', 'x bank', 1), ('${id}', 'x room', -1)`;
      expect(await ruleBrokenBy(query(sql))).toBe('entry_balances');
    });

    it('refuses a reversal that is no mirror image', async () => {
      const id = await record(
        entryOf([
          ['bank', 5],
          ['room', -5],
        ]),
      );
      const sql = `${insertEntry(2, id)} (VALUES ('x bank', -4), ('x room', 4)) AS side (code, amount)`;
      expect(await ruleBrokenBy(query(sql))).toBe('entry_reverses_exactly');
    });

    it.each([
      ['a change of an entry', `UPDATE entry SET description = 'Another'`],
      ['a change of a posting', `UPDATE posting SET amount_minor = amount_minor * 2`],
      ['a deleted posting', `DELETE FROM posting`],
      ['a deleted entry', `DELETE FROM entry`],
      ['emptied books', `TRUNCATE posting`],
    ])('refuses %s', async (_what, sql) => {
      expect(await ruleBrokenBy(query(sql))).toBe('books_never_change');
    });

    it.each([
      [0, 'posting_amount_not_zero'],
      ['9007199254740992', 'posting_amount_exact'],
    ])('refuses a posting of %s', async (amount, rule) => {
      const sql = `${insertEntry(2)} (VALUES ('x bank', ${amount}), ('x room', -${amount})) AS side (code, amount)`;
      expect(await ruleBrokenBy(query(sql))).toBe(rule);
    });
  });

  it('is open to treasurers only', async () => {
    const { agent } = await someoneWith(test, 'organiser');
    await agent.get('/api/ledger/trial-balance').expect(403);
    const actor = { ...(await treasurer(test)), roles: ['member' as const] };
    await expect(ledger.trialBalance(actor)).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it('refuses a day that is none', async () => {
    const { agent } = await someoneWith(test, 'treasurer');
    await agent.get('/api/ledger/trial-balance?on=2026-13-01').expect(422);
    await agent.get('/api/ledger/trial-balance?upto=2026-12-01').expect(422);
  });
});
