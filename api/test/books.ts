import type supertest from 'supertest';
import type { Actor } from '../src/common/actor';
import { ClubService, type ClubSettings } from '../src/club/club.service';
import { LedgerService } from '../src/ledger/ledger.service';
import type {
  StatementDetailDto,
  StatementDto,
  StatementLineDto,
} from '../src/reconciliation/dto/statement.dto';
import { startTestApp, TEST_NOW, type TestApp } from './app';
import { treasurer } from './factories/dues.factory';
import { someoneWith } from './factories/person.factory';

const LARKMOOR: ClubSettings = {
  name: 'Larkmoor Radio Builders',
  address: 'Millbeck Hall, Larkmoor',
  contactEmail: 'treasurer@larkmoor.example',
  timeZone: 'Europe/London',
  currency: 'GBP',
  ruleSet: 'IARU-R1',
  accountNumber: '00-41-17 3006 4417',
  accountName: 'Larkmoor Radio Builders',
};

/** Every table money is written in. */
const MONEY = [
  'entry',
  'posting',
  'invoice',
  'checkout',
  'payment',
  'payment_allocation',
  'payment_event',
  'bank_statement',
  'statement_line',
  'line_match',
];

/** A treasurer's desk: the API, somebody who acts through its services, and requests that carry a session. */
export interface Desk {
  test: TestApp;
  ines: Actor;
  agent: supertest.Agent;
  /** Whose session it is. */
  treasurerId: string;
  /** Closes every book, for tests that must not see the money of each other. */
  empty: () => Promise<void>;
  ledger: (account: string) => Promise<number>;
  upload: (csv: string | Buffer, name?: string) => supertest.Test;
  imported: (csv: string) => Promise<StatementDto>;
  show: (statementId: string) => Promise<StatementDetailDto>;
  firstLine: (statementId: string) => Promise<StatementLineDto>;
  match: (lineId: string, choice: object) => supertest.Test;
  takeBack: (lineId: string) => supertest.Test;
}

export async function startDesk(): Promise<Desk> {
  const test = await startTestApp();
  const ines = await treasurer(test);
  await test.app.get(ClubService).set(LARKMOOR);
  const { agent, person } = await someoneWith(test, 'treasurer');
  const upload: Desk['upload'] = (csv, name = 'january.csv') =>
    agent.post('/api/statements').attach('file', Buffer.from(csv), name);
  const show: Desk['show'] = async (id) =>
    (await agent.get(`/api/reconciliation/statements/${id}`).expect(200)).body as StatementDetailDto;
  return {
    test,
    ines,
    agent,
    treasurerId: person.id,
    upload,
    show,
    empty: () => emptyBooks(test),
    ledger: (account) => test.app.get(LedgerService).balance(account),
    imported: async (csv) => (await upload(csv).expect(201)).body as StatementDto,
    firstLine: async (id) => {
      const [line] = (await show(id)).lines;
      if (!line) throw new Error('no line');
      return line;
    },
    match: (lineId, choice) => agent.post(`/api/reconciliation/lines/${lineId}/match`).send(choice),
    takeBack: (lineId) => agent.post(`/api/reconciliation/lines/${lineId}/take-back`),
  };
}

/** The books are never emptied, so their triggers have to be asleep for it. */
async function emptyBooks(test: TestApp): Promise<void> {
  test.clock.set(TEST_NOW);
  await test.dataSource.transaction(async (manager) => {
    await manager.query(`SET LOCAL session_replication_role = replica`);
    await manager.query(`TRUNCATE ${MONEY.join(', ')}`);
  });
}
