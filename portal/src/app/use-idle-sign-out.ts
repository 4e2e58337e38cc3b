import { useEffect } from 'react';
import { useSignOut } from '../api-client/session';

const UNTOUCHED_MS = 10 * 60_000;
const TOUCHES = ['pointerdown', 'keydown', 'wheel', 'touchstart'] as const;

/** On a shared bench tablet: signs out after ten minutes untouched. Drafts stay for the person's return. */
export function useIdleSignOut(isShared: boolean): void {
  const { mutate } = useSignOut();
  useEffect(() => {
    if (!isShared) return undefined;
    let timer = setTimeout(() => mutate(), UNTOUCHED_MS);
    const touched = () => {
      clearTimeout(timer);
      timer = setTimeout(() => mutate(), UNTOUCHED_MS);
    };
    TOUCHES.forEach((touch) => window.addEventListener(touch, touched, { passive: true }));
    return () => {
      clearTimeout(timer);
      TOUCHES.forEach((touch) => window.removeEventListener(touch, touched));
    };
  }, [isShared, mutate]);
}
