/** Choices this device remembers, such as Diagram or Table; never anything secret. */
export type PreferenceName =
  'level-view' | 'letter-keys' | 'shared-tablet' | 'instrument-view' | 'bench-view' | 'level-bench-view';

const keyOf = (name: PreferenceName): string => `ferrite-${name}`;
const listeners = new Set<() => void>();

export function readPreference(name: PreferenceName): string | null {
  try {
    return localStorage.getItem(keyOf(name));
  } catch {
    return null;
  }
}

export function keepPreference(name: PreferenceName, value: string): void {
  try {
    localStorage.setItem(keyOf(name), value);
  } catch {
    // The choice then holds only until the page is left.
  }
  listeners.forEach((tell) => tell());
}

/** @returns a function that stops the telling. */
export function onPreferenceChange(tell: () => void): () => void {
  listeners.add(tell);
  window.addEventListener('storage', tell);
  return () => {
    listeners.delete(tell);
    window.removeEventListener('storage', tell);
  };
}
