import { useSyncExternalStore } from 'react';

/** Under this height of the visible part, the on-screen keyboard is up (the design's own figure). */
const SHORT = 560;

function subscribe(onChange: () => void): () => void {
  const { visualViewport } = globalThis;
  visualViewport?.addEventListener('resize', onChange);
  visualViewport?.addEventListener('scroll', onChange);
  return () => {
    visualViewport?.removeEventListener('resize', onChange);
    visualViewport?.removeEventListener('scroll', onChange);
  };
}

const heightNow = (): number => globalThis.visualViewport?.height ?? globalThis.innerHeight;

/** Pixels of the page hidden under the keyboard, or undefined while it is down. */
function hiddenBelow(): number | undefined {
  if (heightNow() >= SHORT) return undefined;
  const { visualViewport } = globalThis;
  const seen = visualViewport ? visualViewport.height + visualViewport.offsetTop : globalThis.innerHeight;
  return Math.max(0, Math.round(globalThis.innerHeight - seen));
}

export const useKeyboardUp = (): number | undefined =>
  useSyncExternalStore(subscribe, hiddenBelow, () => undefined);
