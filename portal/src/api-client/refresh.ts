const REFRESHED_AT = 'ferrite-refreshed-at';
let inFlight: Promise<boolean> | undefined;

function lastRefresh(): number {
  try {
    return Number(localStorage.getItem(REFRESHED_AT) ?? 0);
  } catch {
    return 0;
  }
}

function noteRefresh(): void {
  try {
    localStorage.setItem(REFRESHED_AT, String(Date.now()));
  } catch {
    // Without storage each tab refreshes for itself; the server lets that pass.
  }
}

async function refreshNow(since: number): Promise<boolean> {
  if (lastRefresh() > since) return true; // another tab did it while this one waited for the lock
  const answer = await globalThis.fetch('/api/auth/refresh', { method: 'POST', credentials: 'same-origin' });
  if (answer.ok) noteRefresh();
  return answer.ok;
}

async function alone(work: () => Promise<boolean>): Promise<boolean> {
  return 'locks' in navigator ? await navigator.locks.request('ferrite-refresh', work) : work();
}

/**
 * Renews the sign-in, once for all requests of this tab and, where the browser has locks, for all tabs.
 *
 * @param since - epoch milliseconds when the refused request was sent.
 * @returns false when the sign-in has run out or the server cannot be reached.
 */
export function refreshOnce(since: number): Promise<boolean> {
  inFlight ??= alone(() => refreshNow(since))
    .catch(() => false)
    .finally(() => {
      inFlight = undefined;
    });
  return inFlight;
}
