import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { ME_KEY, useSignOut } from '../api-client/session';

const UNTOUCHED_MS = 10 * 60_000;
/** Longer than the server's access token on such a tablet lives, so that asking who is signed in renews the session. */
const RENEW_MS = 3 * 60_000;
const TOUCHES = ['pointerdown', 'keydown', 'wheel', 'touchstart'] as const;

/**
 * On a shared bench tablet: signs out after ten minutes untouched, and tells the server of touches, which may be long
 * typing that asks it for nothing. Drafts stay for the person's return.
 */
export function useIdleSignOut(isShared: boolean): void {
  const { mutate } = useSignOut();
  const client = useQueryClient();
  useEffect(() => {
    if (!isShared) return undefined;
    let timer = setTimeout(() => mutate(), UNTOUCHED_MS);
    let toldAt = Date.now();
    const touched = () => {
      clearTimeout(timer);
      timer = setTimeout(() => mutate(), UNTOUCHED_MS);
      if (Date.now() - toldAt < RENEW_MS) return;
      toldAt = Date.now();
      void client.refetchQueries({ queryKey: ME_KEY });
    };
    TOUCHES.forEach((touch) => window.addEventListener(touch, touched, { passive: true }));
    return () => {
      clearTimeout(timer);
      TOUCHES.forEach((touch) => window.removeEventListener(touch, touched));
    };
  }, [client, isShared, mutate]);
}
