import { useEffect, useRef, type RefObject } from 'react';

/** Escape closes while the focus is in the drawer, or nowhere because the pressed button is gone. */
export function useEscape(root: RefObject<HTMLElement | null>, onClose: () => void): void {
  const close = useRef(onClose);
  useEffect(() => {
    close.current = onClose;
  });
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'Escape' || event.defaultPrevented) return;
      const { activeElement } = document;
      if (activeElement === document.body || root.current?.contains(activeElement)) close.current();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [root]);
}
