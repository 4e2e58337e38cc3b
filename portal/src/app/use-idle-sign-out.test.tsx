import { act, fireEvent } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { useSession } from '../api-client/session';
import { renderPage, TAMSIN } from '../testing/render';
import { server } from '../testing/server';
import { useIdleSignOut } from './use-idle-sign-out';

const MINUTE = 60_000;
const AT_THE_TABLET = { ...TAMSIN, sharedDevice: true };

function Tablet({ isShared }: { isShared: boolean }) {
  useSession();
  useIdleSignOut(isShared);
  return null;
}

describe('a shared tablet', () => {
  let asked: string[];

  beforeEach(() => {
    asked = [];
    vi.useFakeTimers({ shouldAdvanceTime: true });
    server.use(
      http.get('*/api/auth/me', () => {
        asked.push('me');
        return HttpResponse.json(AT_THE_TABLET);
      }),
      http.post('*/api/auth/sign-out', () => {
        asked.push('sign-out');
        return new HttpResponse(null, { status: 204 });
      }),
    );
  });
  afterEach(() => {
    vi.useRealTimers();
  });

  const pass = (milliseconds: number) => act(() => vi.advanceTimersByTimeAsync(milliseconds));
  const typeFor = async (minutes: number) => {
    for (let passed = 0; passed < minutes; passed += 1) {
      await pass(MINUTE);
      fireEvent.keyDown(window, { key: 'a' });
    }
    await pass(1000);
  };

  it('tells the server every few minutes that somebody types, and signs nobody out', async () => {
    renderPage(<Tablet isShared />, { me: AT_THE_TABLET });
    await typeFor(12);
    await vi.waitFor(() => expect(asked).toEqual(['me', 'me', 'me', 'me']));
  });

  it('signs out after ten minutes untouched, and has not asked the server for anything', async () => {
    renderPage(<Tablet isShared />, { me: AT_THE_TABLET });
    await pass(10 * MINUTE + 1000);
    await vi.waitFor(() => expect(asked).toEqual(['sign-out']));
  });

  it('is the only device that does either', async () => {
    renderPage(<Tablet isShared={false} />);
    await typeFor(12);
    expect(asked).toEqual([]);
  });
});
