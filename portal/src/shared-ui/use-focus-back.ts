import { useEffect, type RefObject } from 'react';

/** On a button that is taken away while what it opened is there: `<Button {...FOCUS_BACK}>`. */
export const FOCUS_BACK = { 'data-focus-back': '' } as const;

/** Takes the focus, and gives it back at the end: to what had it, or to the button that stands in its place again. */
export function useFocusBack(root: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    const before = document.activeElement;
    root.current?.focus({ preventScroll: true });
    return () => {
      const isThere = before instanceof HTMLElement && before.isConnected && before !== document.body;
      const back = isThere ? before : document.querySelector<HTMLElement>('[data-focus-back]');
      back?.focus();
    };
  }, [root]);
}
