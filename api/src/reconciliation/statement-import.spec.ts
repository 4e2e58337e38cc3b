import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { invoice, payment, treasurer } from '../../test/factories/dues.factory';
import { cookiesOf, person, someoneWith } from '../../test/factories/person.factory';
import { statementCsv } from '../../test/factories/statement.factory';
import type { Actor } from '../common/actor';
import { LedgerService } from '../ledger/ledger.service';
import type { StatementDetailDto, StatementDto, StatementLineDto } from './dto/statement.dto';

describe('importing a statement', () => {
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;
  let cookies: string;

  // A database of its own for each test: statements follow each other, so they cannot be told apart in one.
  beforeEach(async () => {
    test = await startTestApp();
    test.clock.set(TEST_NOW);
    ines = await treasurer(test);
    ({ agent } = await someoneWith(test, 'treasurer'));
  });
  afterEach(() => test.close());

  const upload = (csv: string | Buffer, name = 'january.csv') =>
    agent.post('/api/statements').attach('file', Buffer.from(csv), name);
  const imported = async (csv: string): Promise<StatementDto> =>
    (await upload(csv).expect(201)).body as StatementDto;
  const show = async (id: string): Promise<StatementDetailDto> =>
    (await agent.get(`/api/reconciliation/statements/${id}`).expect(200)).body as StatementDetailDto;
  const match = (lineId: string, choice: object) =>
    agent.post(`/api/reconciliation/lines/${lineId}/match`).send(choice);
  const ledger = (account: string) => test.app.get(LedgerService).balance(account);
  const firstLine = async (id: string): Promise<StatementLineDto> => {
    const [line] = (await show(id)).lines;
    if (!line) throw new Error('no line');
    return line;
  };

  describe('an import', () => {
    it('matches the exact reference and amount by itself, with its reason, and pays the invoice', async () => {
      const raised = await invoice(test, ines);
      const text = `FPI T ARDLEY ${raised.referencePrinted} dues`;
      const { id, ...statement } = await imported(statementCsv(100_000, ['2026-01-10', text, 2400]));
      expect(statement).toMatchObject({ lineCount: 1, matchedCount: 1, unmatchedMinor: 0, knownLines: 0 });
      const { lines, totals, books } = await show(id);
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
      await imported(statementCsv(100_000, ['2026-01-10', 'FPI SOMEBODY', 2400]));
      expect(await ledger('1020')).toBe(100_000);
      expect(await ledger('3000')).toBe(-100_000);
      const { id } = await imported(statementCsv(102_400, ['2026-01-11', 'HALL', -3000]));
      expect(await ledger('1020')).toBe(100_000);
      await match((await firstLine(id)).id, { accountCode: '5100', note: 'Hall' }).expect(200);
      expect(await ledger('1020')).toBe(97_000);
      expect(await ledger('5100')).toBe(3000);
    });

    it('matches a transfer written down before, and does not pay a second time', async () => {
      const raised = await invoice(test, ines);
      const told = await payment(test, ines, raised, { method: 'transfer' });
      const { id } = await imported(statementCsv(0, ['2026-01-10', raised.reference, 2400]));
      expect((await show(id)).lines).toMatchObject([{ state: 'matched', match: { paymentId: told.id } }]);
      const { body } = await agent.get('/api/payments').expect(200);
      expect(body).toMatchObject({ total: 1, items: [{ id: told.id, isBeingMatched: false }] });
      expect(await ledger('1040')).toBe(0);
    });

    it('pays an invoice once when its reference comes twice in one file', async () => {
      const raised = await invoice(test, ines);
      const { id } = await imported(
        statementCsv(0, ['2026-01-10', raised.reference, 2400], ['2026-01-10', raised.reference, 2400]),
      );
      expect((await show(id)).lines.map(({ state }) => state)).toEqual(['matched', 'no match']);
      expect((await show(id)).lines[1]?.reasons).toContain('It is paid already');
      expect((await show(id)).totals.differenceMinor).toBe(2400);
    });

    it('shows a reference with wrong check digits and does not match it', async () => {
      const raised = await invoice(test, ines);
      const wrong = raised.reference.replace(
        /^RF(\d)(\d)/,
        (_all, one: string, two: string) => `RF${two}${one}`,
      );
      const { id } = await imported(statementCsv(0, ['2026-01-10', wrong, 2400]));
      const line = await firstLine(id);
      expect(line.state).toBe('no match');
      expect(line.reasons.join()).toMatch(/looks like a reference, but its check digits are wrong/);
    });

    it('does not count a line twice, whether the file comes again or overlaps the next', async () => {
      const first = statementCsv(0, ['2026-01-10', 'A', 100], ['2026-01-11', 'B', 200]);
      await imported(first);
      const again = await upload(first).expect(409);
      expect(again.body).toMatchObject({ type: '/problems/statement-imported-before' });
      const overlapping = statementCsv(100, ['2026-01-11', 'B', 200], ['2026-01-12', 'C', 300]);
      const next = await imported(overlapping);
      expect(next).toMatchObject({ lineCount: 1, knownLines: 1, openingMinor: 300, closingMinor: 600 });
      const { body } = await agent.get('/api/reconciliation/statements').expect(200);
      expect(body).toMatchObject({ total: 2 });
    });

    it('counts two payments alike on one day as two', async () => {
      const statement = await imported(
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
      await imported(statementCsv(0, ['2026-01-10', 'A', 100]));
      const { body } = await upload(statementCsv(500, ['2026-01-12', 'C', 300])).expect(409);
      expect(body).toMatchObject({ type: '/problems/statement-does-not-follow' });
    });

    it('is kept whole or not at all: a bad line is named, and nothing is kept', async () => {
      const csv = statementCsv(0, ['2026-01-10', 'A', 100], ['2026-01-11', 'B', 200]).replace(
        '2.00',
        '2.005',
      );
      const { body } = await upload(csv, 'september.csv').expect(422);
      expect(body).toMatchObject({
        type: '/problems/statement-unreadable',
        line: 3,
        fileName: 'september.csv',
        detail: expect.stringMatching(/^september\.csv, line 3: .* Nothing was kept\.$/),
        errors: [{ pointer: '#/file' }],
      });
      const { body: list } = await agent.get('/api/reconciliation/statements').expect(200);
      expect(list).toMatchObject({ total: 0 });
      expect(await ledger('1020')).toBe(0);
    });

    it('is done once when the same file is sent five times at once', async () => {
      cookies = await cookiesOf(test, await person(test, { roles: ['member', 'treasurer'] }));
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
      expect(await ledger('1020')).toBe(2400);
    });

    it('is refused for a picture, another encoding, nothing at all, and more than a megabyte', async () => {
      const files: [bytes: Buffer, status: number][] = [
        [Buffer.from([0x89, 0x50, 0x4e, 0x47, 0, 1, 2, 255]), 415],
        [Buffer.from('date,description,amount,balance\n2026-01-10,Caf\xe9,1.00,1.00', 'latin1'), 415],
        [Buffer.from(''), 422],
        [Buffer.alloc(1024 * 1024 + 1, 'a'), 413],
      ];
      for (const [bytes, status] of files)
        await upload(bytes, 'file.csv')
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
});
