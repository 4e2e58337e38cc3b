import { http, HttpResponse } from 'msw';
import { server } from '../testing/server';
import { api, unwrap } from './client';
import { ProblemError } from './problem-error';
import { applyProblemToForm } from './problem-to-form';

const problem = (status: number, body: Record<string, unknown>) =>
  new HttpResponse(JSON.stringify({ status, ...body }), {
    status,
    headers: { 'content-type': 'application/problem+json' },
  });

const me = () => unwrap(api.GET('/api/auth/me'));
const refused = async (call: Promise<unknown>): Promise<ProblemError> => {
  const error: unknown = await call.then(() => undefined).catch((reason: unknown) => reason);
  if (error instanceof ProblemError) return error;
  throw new Error('expected a ProblemError');
};

describe('an answer that is not a success', () => {
  it('becomes a ProblemError with its type, words and fields', async () => {
    server.use(
      http.get('*/api/auth/me', () =>
        problem(422, {
          type: '/problems/invalid-input',
          title: 'Something in the form needs another look',
          detail: 'The end is before the start.',
          errors: [{ pointer: '#/endsAt', detail: 'Ends before it starts' }],
          nearest: ['2026-10-17T14:00:00Z'],
        }),
      ),
    );
    const error = await refused(me());
    expect(error.is('invalid-input')).toBe(true);
    expect(error).toMatchObject({
      status: 422,
      detail: 'The end is before the start.',
      message: error.detail,
    });
    expect(error.errors).toEqual([{ pointer: '#/endsAt', detail: 'Ends before it starts' }]);
    expect(error.body.nearest).toEqual(['2026-10-17T14:00:00Z']);
  });

  it('has words even when the body is no problem document', async () => {
    server.use(http.get('*/api/auth/me', () => new HttpResponse('<html>', { status: 502 })));
    const error = await refused(me());
    expect(error).toMatchObject({ status: 502, title: 'It did not work' });
    expect(error.detail).toContain('502');
  });

  it('says No connection when there is no answer', async () => {
    server.use(http.get('*/api/auth/me', () => HttpResponse.error()));
    expect(await refused(me())).toMatchObject({ status: 0, title: 'No connection' });
  });
});

describe('an expired sign-in', () => {
  it('is renewed once for all requests at once, and each is sent again with its body', async () => {
    let refreshes = 0;
    let isFresh = false;
    const names: unknown[] = [];
    server.use(
      http.post('*/api/auth/refresh', () => {
        refreshes += 1;
        isFresh = true;
        return new HttpResponse(null, { status: 204 });
      }),
      http.post('*/api/echo', async ({ request }) => {
        if (!isFresh) return problem(401, { type: '/problems/not-signed-in', title: 'Not signed in' });
        names.push(await request.json());
        return new HttpResponse(null, { status: 204 });
      }),
    );
    const echo = api.POST as unknown as (path: string, init: object) => Promise<{ response: Response }>;
    await Promise.all([1, 2, 3].map((n) => unwrap(echo('/api/echo', { body: { n } }))));
    expect(refreshes).toBe(1);
    expect(names).toEqual(expect.arrayContaining([{ n: 1 }, { n: 2 }, { n: 3 }]));
  });

  it('that cannot be renewed is refused with 401', async () => {
    server.use(
      http.get('*/api/auth/me', () =>
        problem(401, { type: '/problems/not-signed-in', title: 'Not signed in' }),
      ),
      http.post('*/api/auth/refresh', () => problem(401, { type: '/problems/session-ended', title: 'Over' })),
    );
    expect(await refused(me())).toMatchObject({ status: 401 });
  });

  it('is not renewed for a wrong password', async () => {
    server.use(
      http.post('*/api/auth/sign-in', () =>
        problem(401, { type: '/problems/wrong-email-or-password', title: 'No match' }),
      ),
    );
    const call = unwrap(api.POST('/api/auth/sign-in', { body: { email: 'a@b.example', password: 'x' } }));
    expect((await refused(call)).is('wrong-email-or-password')).toBe(true);
  });
});

describe('field errors', () => {
  const error = new ProblemError({
    type: '/problems/invalid-input',
    title: 't',
    status: 422,
    detail: 'd',
    errors: [
      { pointer: '#/items/0/startsAt', detail: 'In the past' },
      { pointer: '#/hidden', detail: 'Unknown' },
    ],
  });

  it('go to the fields of the form, the first one in focus', () => {
    const setError = vi.fn();
    applyProblemToForm<{ items: { startsAt: string }[] }>(setError, error, ['items.0.startsAt']);
    expect(setError.mock.calls).toEqual([
      ['items.0.startsAt', { type: 'server', message: 'In the past' }, { shouldFocus: true }],
    ]);
  });

  it('that have no field are left to an alert', () => {
    expect(applyProblemToForm<{ items: { startsAt: string }[] }>(vi.fn(), error, ['items.0.startsAt'])).toBe(
      false,
    );
    expect(applyProblemToForm(vi.fn(), new Error('other'), [])).toBe(false);
  });
});
