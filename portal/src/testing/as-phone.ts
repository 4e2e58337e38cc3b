import { vi } from 'vitest';

/** Every narrow-screen query matches from now on; `vi.unstubAllGlobals()` ends it. */
export function asPhone(): void {
  vi.stubGlobal('matchMedia', (media: string) => ({
    ...{ matches: media.includes('max-width'), media },
    ...{ addEventListener: () => undefined, removeEventListener: () => undefined },
    // MUI's colour schemes still ask the old way.
    ...{ addListener: () => undefined, removeListener: () => undefined },
  }));
}
