import { useEffect, type RefObject } from 'react';

/** How far the foot of the page is taken by a bar; read by the toasts. */
export const TOAST_LIFT = '--fr-toast-lift';

/** Keeps toasts above a bar that stands at the foot of the page, however high it grows. */
export function useToastsAbove(bar: RefObject<HTMLElement | null>, isOn = true): void {
  useEffect(() => {
    const { current } = bar;
    if (!current || !isOn) return;
    const { style } = document.documentElement;
    const lift = () => style.setProperty(TOAST_LIFT, `${current.offsetHeight}px`);
    lift();
    // Not there in every test's browser; a bar that never changes its height needs none.
    const watch = typeof ResizeObserver === 'undefined' ? undefined : new ResizeObserver(lift);
    watch?.observe(current);
    return () => {
      watch?.disconnect();
      style.removeProperty(TOAST_LIFT);
    };
  }, [bar, isOn]);
}
