import { useSyncExternalStore } from 'react';

function onChange(tell: () => void): () => void {
  globalThis.addEventListener('online', tell);
  globalThis.addEventListener('offline', tell);
  return () => {
    globalThis.removeEventListener('online', tell);
    globalThis.removeEventListener('offline', tell);
  };
}

/** Whether the device believes it has a connection. It may be wrong, so a failed request still counts. */
export const useOnline = (): boolean => useSyncExternalStore(onChange, () => globalThis.navigator.onLine);
