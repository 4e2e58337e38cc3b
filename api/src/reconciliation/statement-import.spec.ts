import type supertest from 'supertest';
import type { TestApp } from '../../test/app';
import { startDesk, type Desk } from '../../test/books';
import { invoice, payment } from '../../test/factories/dues.factory';
import { cookiesOf, person } from '../../test/factories/person.factory';
import { statementCsv } from '../../test/factories/statement.factory';
import type { Actor } from '../common/actor';

describe('importing a statement', () => {
  let desk: Desk;
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;

  beforeAll(async () => {
    desk = await startDesk();
    ({ test, ines, agent } = desk);
  });
  // Statements follow each other, so each test begins with empty books.
  beforeEach(() => desk.empty());
  afterAll(() => test.close());

  describe('an import', () => {
    it('matches the exact reference and amount by itself, with its reason, and pays the invoice', async () => {
      const raised = await invoice(test, ines);
      const text = `FPI T ARDLEY ${raised.referencePrinted} dues`;
      const { id, ...statement } = await desk.imported(statementCsv(100_000, ['2026-01-10', text, 2400]));
      expect(statement).toMatchObject({ lineCount: 1, matchedCount: 1, unmatchedMinor: 0, knownLines: 0 });
      const { lines, totals, books } = await desk.show(id);
      expect(lines).toMatchObject([
        {
          state: 'matched',
          match: { how: 'by itself' },
          reasons: [
            `Reference ${raised.referencePrinted} is that of ${raised.number}`,
            '24.00 is exactly what is open',
          ],
        },
      ]);
      expect(books[0]).toMatchObject({ tag: raised.number, amountMinor: 2400, lineId: lines[0]?.id });
      expect(totals).toMatchObject({ openingMinor: 100_000, matchedMinor: 2400, differenceMinor: 0 });
      const open = await agent.get('/api/invoices?state=open').expect(200);
      expect(open.body).toMatchObject({ items: [] });
    });

    it('takes the opening balance into the books once, and moves the current account by matched lines only', async () => {
      await desk.imported(statementCsv(100_000, ['2026-01-10', 'FPI SOMEBODY', 2400]));
      expect(await desk.ledger('1020')).toBe(100_000);
      expect(await desk.ledger('3000')).toBe(-100_000);
      const { id } = await desk.imported(statementCsv(102_400, ['2026-01-11', 'HALL', -3000]));
      expect(await desk.ledger('1020')).toBe(100_000);
      await desk.match((await desk.firstLine(id)).id, { accountCode: '5100', note: 'Hall' }).expect(200);
      expect(await desk.ledger('1020')).toBe(97_000);
      expect(await desk.ledger('5100')).toBe(3000);
    });

    it('matches a transfer written down before, and does not pay a second time', async () => {
      const raised = await invoice(test, ines);
      const told = await payment(test, ines, raised, { method: 'transfer' });
      const { id } = await desk.imported(statementCsv(0, ['2026-01-10', raised.reference, 2400]));
      expect((await desk.show(id)).lines).toMatchObject([
        { state: 'matched', match: { paymentId: told.id } },
      ]);
      const { body } = await agent.get('/api/payments').expect(200);
      expect(body).toMatchObject({ total: 1, items: [{ id: told.id, isBeingMatched: false }] });
      expect(await desk.ledger('1040')).toBe(0);
    });

    it('pays an invoice once when its reference comes twice in one file', async () => {
      const raised = await invoice(test, ines);
      const { id } = await desk.imported(
        statementCsv(0, ['2026-01-10', raised.reference, 2400], ['2026-01-10', raised.reference, 2400]),
      );
      expect((await desk.show(id)).lines.map(({ state }) => state)).toEqual(['matched', 'no match']);
      expect((await desk.show(id)).lines[1]?.reasons).toContain('It is paid already');
      expect((await desk.show(id)).totals.differenceMinor).toBe(2400);
    });

    it('shows a reference with wrong check digits and does not match it', async () => {
      const raised = await invoice(test, ines);
      const wrong = raised.reference.replace(
        /^RF(\d)(\d)/,
        (_all, one: string, two: string) => `RF${two}${one}`,
      );
      const { id } = await desk.imported(statementCsv(0, ['2026-01-10', wrong, 2400]));
      const line = await desk.firstLine(id);
      expect(line.state).toBe('no match');
      expect(line.reasons.join()).toMatch(/looks like a reference, but its check digits are wrong/);
    });

    it('does not count a line twice, whether the file comes again or overlaps the next', async () => {
      const first = statementCsv(0, ['2026-01-10', 'A', 100], ['2026-01-11', 'B', 200]);
      await desk.imported(first);
      const again = await desk.upload(first).expect(409);
      expect(again.body).toMatchObject({ type: '/problems/statement-imported-before' });
      const overlapping = statementCsv(100, ['2026-01-11', 'B', 200], ['2026-01-12', 'C', 300]);
      const next = await desk.imported(overlapping);
      expect(next).toMatchObject({ lineCount: 1, knownLines: 1, openingMinor: 300, closingMinor: 600 });
      const { body } = await agent.get('/api/reconciliation/statements').expect(200);
      expect(body).toMatchObject({ total: 2 });
    });

    it('counts two payments alike on one day as two', async () => {
      const statement = await desk.imported(
        statementCsv(
          0,
          ['2026-01-10', 'A', 100],
          ['2026-01-10', 'A', 100],
          ['2026-01-10', 'B', -100],
          ['2026-01-10', 'A', 100],
        ),
      );
      expect(statement.lineCount).toBe(4);
    });

    it('is refused when it leaves a gap to the last statement', async () => {
      await desk.imported(statementCsv(0, ['2026-01-10', 'A', 100]));
      const { body } = await desk.upload(statementCsv(500, ['2026-01-12', 'C', 300])).expect(409);
      expect(body).toMatchObject({ type: '/problems/statement-does-not-follow' });
    });

    it('is kept whole or not at all: a bad line is named, and nothing is kept', async () => {
      const csv = statementCsv(0, ['2026-01-10', 'A', 100], ['2026-01-11', 'B', 200]).replace(
        '2.00',
        '2.005',
      );
      const { body } = await desk.upload(csv, 'september.csv').expect(422);
      expect(body).toMatchObject({
        type: '/problems/statement-unreadable',
        line: 3,
        fileName: 'september.csv',
        detail: expect.stringMatching(/^september\.csv, line 3: .* Nothing was kept\.$/),
        errors: [{ pointer: '#/file' }],
      });
      const { body: list } = await agent.get('/api/reconciliation/statements').expect(200);
      expect(list).toMatchObject({ total: 0 });
      expect(await desk.ledger('1020')).toBe(0);
    });

    it('is done once when the same file is sent five times at once', async () => {
      const cookies = await cookiesOf(test, await person(test, { roles: ['member', 'treasurer'] }));
      const raised = await invoice(test, ines);
      const csv = statementCsv(0, ['2026-01-10', raised.reference, 2400]);
      const send = () => {
        const form = new FormData();
        form.set('file', new Blob([csv]), 'january.csv');
        return fetch(`${test.baseUrl}/api/statements`, {
          method: 'POST',
          headers: { cookie: cookies },
          body: form,
        });
      };
      const answers = await Promise.all(Array.from({ length: 5 }, send));
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409]);
      expect(await desk.ledger('1020')).toBe(2400);
    });

    it('is refused for a picture, another encoding, nothing at all, and more than a megabyte', async () => {
      const files: [bytes: Buffer, status: number][] = [
        [Buffer.from([0x89, 0x50, 0x4e, 0x47, 0, 1, 2, 255]), 415],
        [Buffer.from('date,description,amount,balance\n2026-01-10,Caf\xe9,1.00,1.00', 'latin1'), 415],
        [Buffer.from(''), 422],
        [Buffer.alloc(1024 * 1024 + 1, 'a'), 413],
      ];
      for (const [bytes, status] of files)
        await desk
          .upload(bytes, 'file.csv')
          .expect(status)
          .expect('content-type', /problem\+json/);
    });

    it('is refused without a file, under another name, with a field more, and as no form at all', async () => {
      const problem = /problem\+json/;
      await agent.post('/api/statements').expect(422).expect('content-type', problem);
      await agent.post('/api/statements').send({ file: 'x' }).expect(415).expect('content-type', problem);
      for (const type of ['multipart/mixed; boundary=x', 'multipart/related; boundary=x'])
        await agent
          .post('/api/statements')
          .set('content-type', type)
          .send('--x--\r\n')
          .expect(415)
          .expect('content-type', problem);
      await agent
        .post('/api/statements')
        .attach('statement', Buffer.from('x'), 'x.csv')
        .expect(400)
        .expect('content-type', problem);
      await agent
        .post('/api/statements')
        .field('more', 'x')
        .attach('file', Buffer.from('x'), 'x.csv')
        .expect(400);
      await agent
        .post('/api/statements')
        .set('content-type', 'multipart/form-data; boundary=x')
        .send('--x\r\nnonsense')
        .expect(400);
    });
  });

  /** How often the database is asked while an import of so many lines runs. */
  const asked = async (lines: number, text: (index: number) => string): Promise<number> => {
    await desk.empty();
    await invoice(test, ines);
    const csv = statementCsv(
      0,
      ...Array.from({ length: lines }, (_, index) => ['2026-01-10', text(index), 7] as const),
    );
    const quiet = test.dataSource.logger;
    let queries = 0;
    Object.assign(test.dataSource, { logger: { logQuery: () => (queries += 1) } });
    try {
      await desk.imported(csv);
    } finally {
      Object.assign(test.dataSource, { logger: quiet });
    }
    return queries;
  };

  it('asks the database as often for many lines as for few, where none of them matches', async () => {
    const nameless = (index: number): string => `CARD ${index}`;
    expect(await asked(300, nameless)).toBe(await asked(3, nameless));
    const strange = (index: number): string => `RF18 5390 0754 7034 NO ${index}`;
    expect(await asked(300, strange)).toBe(await asked(3, strange));
  });

  it('reads the books anew for a line whose invoice an earlier line has paid', async () => {
    const raised = await invoice(test, ines);
    const { id } = await desk.imported(
      statementCsv(0, ['2026-01-10', raised.reference, 2400], ['2026-01-11', raised.reference, 2400]),
    );
    const { lines } = await desk.show(id);
    expect(lines.map(({ state }) => state)).toEqual(['matched', 'no match']);
    expect(lines[1]?.reasons).toContain('It is paid already');
  });

  it('says how many open items it has no room for', async () => {
    await invoice(test, ines);
    // Only counted and listed here, so their entries are left out; the rules that ask for them have to be asleep.
    await test.dataSource.transaction(async (manager) => {
      await manager.query(`SET LOCAL session_replication_role = replica`);
      await manager.query(
        `INSERT INTO payment (receipt_number, person_id, method, amount_minor, received_on, entry_id, recorded_at)
         SELECT 'T-' || n, $1, 'transfer', 100, '2026-01-10', gen_random_uuid(), now() FROM generate_series(1, 603) n`,
        [ines.personId],
      );
    });
    const { id } = await desk.imported(statementCsv(0, ['2026-01-10', 'A', 100]));
    // 603 transfers and the invoice that is open, less the 200 that are shown.
    const { books, booksLeftOut } = await desk.show(id);
    expect([books.length, booksLeftOut]).toEqual([200, 404]);
  });
});
