import { useEffect, useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import { usePreference } from '../../shared-ui/use-preference';
import { OWN_PAGES } from '../pages';

const WAIT_MS = 1500;
const TYPING = 'input, textarea, select, [contenteditable="true"], [role="combobox"], [role="dialog"]';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest(TYPING) !== null;

const pathOf = (letter: string): string | undefined =>
  OWN_PAGES.find((page) => 'letter' in page && page.letter === letter)?.path;

/** `G` then a letter leads to a page, `?` lists the keys; never while typing, and the person can turn it off. */
export function useFrameKeys(onList: () => void): void {
  const navigate = useNavigate();
  const [choice] = usePreference('letter-keys', ['on', 'off']);
  const pressedG = useRef(0);

  useEffect(() => {
    if (choice === 'off') return undefined;
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented || isTyping(event.target))
        return;
      const path = Date.now() - pressedG.current < WAIT_MS ? pathOf(event.key.toLowerCase()) : undefined;
      pressedG.current = event.key.toLowerCase() === 'g' ? Date.now() : 0;
      if (path) {
        event.preventDefault();
        event.stopImmediatePropagation();
        void navigate(path);
      }
      if (event.key === '?') onList();
    };
    // Captured, so that the letter after G never reaches a page's own single-letter keys.
    document.addEventListener('keydown', onKey, { capture: true });
    return () => document.removeEventListener('keydown', onKey, { capture: true });
  }, [choice, navigate, onList]);
}
