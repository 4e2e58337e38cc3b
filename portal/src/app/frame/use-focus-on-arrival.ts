import { useEffect, useRef, type RefObject } from 'react';
import { useLocation } from 'react-router-dom';

/** After a page was opened from the rail or the bottom bar, the keyboard stands at its beginning. */
export function useFocusOnArrival(main: RefObject<HTMLElement | null>): void {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    const active = document.activeElement;
    if (!active || active === document.body || active.closest('[data-frame]'))
      main.current?.focus({ preventScroll: true });
  }, [pathname, main]);
}
