import { useEffect, useRef } from 'react';
import { usePreference } from './use-preference';

const TYPING = 'input, textarea, select, [contenteditable="true"], [role="combobox"], [role="dialog"]';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest(TYPING) !== null;

/**
 * Single letters that act on a page: never inside a field or a dialog, never with Ctrl or Alt, and the person can turn
 * them off.
 *
 * @param keys - by lower-case letter: `{ j: next, k: previous }`.
 */
export function useLetterKeys(keys: Readonly<Record<string, () => void>>): void {
  const [choice] = usePreference('letter-keys', ['on', 'off']);
  const current = useRef(keys);
  useEffect(() => {
    current.current = keys;
  });
  useEffect(() => {
    if (choice === 'off') return undefined;
    const onKey = (event: KeyboardEvent) => {
      const isPlain = !event.ctrlKey && !event.metaKey && !event.altKey && !event.defaultPrevented;
      if (isPlain && !isTyping(event.target)) current.current[event.key.toLowerCase()]?.();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [choice]);
}
