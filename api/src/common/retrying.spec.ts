import type { ArgumentsHost } from '@nestjs/common';
import type { DataSource } from 'typeorm';
import { startTestApp, type TestApp } from '../../test/app';
import { ProblemFilter } from './problem.filter';
import { retryingOnce } from './retrying';

const NAME = `hashtext('retrying')`;

describe('what somebody else holds', () => {
  let test: TestApp;
  let dataSource: DataSource;

  beforeAll(async () => {
    test = await startTestApp();
    ({ dataSource } = test);
  });
  afterAll(() => test.close());

  const holding = async () => {
    const holder = dataSource.createQueryRunner();
    await holder.startTransaction();
    await holder.query(`SELECT pg_advisory_xact_lock(${NAME})`);
    return async () => {
      await holder.rollbackTransaction();
      await holder.release();
    };
  };

  /** Asks for the lock as a use case does, with less patience. */
  const asking = (before: () => Promise<void>) => () =>
    dataSource.transaction(async (manager) => {
      await before();
      await manager.query(`SET LOCAL lock_timeout = '60ms'`);
      await manager.query(`SELECT pg_advisory_xact_lock(${NAME})`);
      return 'had';
    });

  it('is asked for once more when it was not let go in time', async () => {
    const letGo = await holding();
    let tries = 0;
    const before = async (): Promise<void> => {
      tries += 1;
      if (tries === 2) await letGo();
    };
    expect(await retryingOnce(asking(before))).toBe('had');
    expect(tries).toBe(2);
  });

  it('is a clear answer, and no fault of the server, when it is held on', async () => {
    const letGo = await holding();
    const error: unknown = await retryingOnce(asking(() => Promise.resolve())).catch((one: unknown) => one);
    await letGo();
    const sent = answerTo(error);
    expect(sent).toMatchObject({ status: 503, type: '/problems/busy' });
  });
});

/** What the filter of every route writes for an error. */
function answerTo(error: unknown): unknown {
  let body = '';
  const response = {
    headersSent: false,
    setHeader: () => response,
    status: () => response,
    type: () => response,
    send: (text: string) => {
      body = text;
    },
  };
  const http = { getRequest: () => ({ id: 'x' }), getResponse: () => response };
  new ProblemFilter().catch(error, { switchToHttp: () => http } as unknown as ArgumentsHost);
  return JSON.parse(body);
}
