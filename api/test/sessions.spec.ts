import type supertest from 'supertest';
import { PASSWORD, person } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const SECOND = 1000;
const MINUTE = 60 * SECOND;

/** Access tokens run by the machine's own clock, so it is moved with the club's; its timers go on by themselves. */
const TIMERS = [
  ...(['hrtime', 'nextTick', 'performance', 'queueMicrotask', 'setImmediate', 'clearImmediate'] as const),
  ...(['setInterval', 'clearInterval', 'setTimeout', 'clearTimeout'] as const),
];

describe('a session', () => {
  let test: TestApp;

  beforeAll(async () => {
    jest.useFakeTimers({ now: TEST_NOW, doNotFake: [...TIMERS] });
    test = await startTestApp();
  });
  afterAll(async () => {
    await test.close();
    jest.useRealTimers();
  });

  const pass = (milliseconds: number): void => {
    test.clock.advance(milliseconds);
    jest.setSystemTime(test.clock.now());
  };

  const signedIn = async (sharedDevice = false): Promise<supertest.Agent> => {
    const { email } = await person(test);
    const agent = test.http();
    await agent.post('/api/auth/sign-in').send({ email, password: PASSWORD, sharedDevice }).expect(200);
    return agent;
  };

  /** As the portal asks: it renews the sign-in when it is refused, and never before. */
  const ask = async (agent: supertest.Agent): Promise<number> => {
    const { status } = await agent.get('/api/auth/me');
    if (status !== 401) return status;
    const renewed = await agent.post('/api/auth/refresh');
    return renewed.status === 204 ? (await agent.get('/api/auth/me')).status : status;
  };

  describe('on a shared tablet', () => {
    it('goes on as long as somebody touches it', async () => {
      const agent = await signedIn(true);
      for (let minutes = 0; minutes < 30; minutes += 3) {
        pass(3 * MINUTE);
        expect(await ask(agent)).toBe(200);
      }
    });

    it('runs out after ten minutes untouched', async () => {
      const agent = await signedIn(true);
      pass(3 * MINUTE);
      expect(await ask(agent)).toBe(200);
      pass(10 * MINUTE);
      expect(await ask(agent)).toBe(401);
    });
  });

  describe('whose refresh token is sent twice', () => {
    const refreshWith = (cookie: string) => test.http().post('/api/auth/refresh').set('Cookie', cookie);
    const refreshCookie = (response: supertest.Response): string => {
      const cookies = response.headers['set-cookie'] as unknown as string[] | undefined;
      return cookies?.find((cookie) => cookie.startsWith('fr_refresh='))?.split(';')[0] ?? '';
    };
    const firstToken = async (): Promise<string> => {
      const { email } = await person(test);
      const body = { email, password: PASSWORD };
      return refreshCookie(await test.http().post('/api/auth/sign-in').send(body).expect(200));
    };

    it.each(['first', 'second'])('lives on with the answer that comes last, the %s one', async (last) => {
      const token = await firstToken();
      const answers = await Promise.all([refreshWith(token), refreshWith(token)]);
      expect(answers.map(({ status }) => status)).toEqual([204, 204]);
      let kept = refreshCookie(answers[last === 'first' ? 0 : 1]);
      for (const wait of [MINUTE + SECOND, 31 * MINUTE]) {
        pass(wait);
        kept = refreshCookie(await refreshWith(kept).expect(204));
      }
    });

    it('lives on when the first answer was lost on the way', async () => {
      const token = await firstToken();
      await refreshWith(token).expect(204);
      pass(30 * SECOND);
      const kept = refreshCookie(await refreshWith(token).expect(204));
      pass(MINUTE + SECOND);
      await refreshWith(kept).expect(204);
    });

    it('ends when the token had been exchanged a while before: it was copied', async () => {
      const token = await firstToken();
      const kept = refreshCookie(await refreshWith(token).expect(204));
      pass(MINUTE + SECOND);
      await refreshWith(token).expect(401);
      await refreshWith(kept).expect(401);
    });

    it('ends when its successor had been used already, however short a while before', async () => {
      const token = await firstToken();
      const kept = refreshCookie(await refreshWith(token).expect(204));
      const next = refreshCookie(await refreshWith(kept).expect(204));
      await refreshWith(token).expect(401);
      await refreshWith(next).expect(401);
    });
  });
});
