import { afterEach, describe, expect, it, vi } from 'vitest';
import { newId } from './new-id';

describe('a new id', () => {
  afterEach(() => vi.unstubAllGlobals());

  it('is made where the browser offers no randomUUID, as on plain http', () => {
    vi.stubGlobal('crypto', { getRandomValues: crypto.getRandomValues.bind(crypto) });
    // The form of version 4, variant 1: RFC 9562, 4.1 and 5.4.
    expect(newId()).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
  });

  it('is another one each time', () => {
    expect(new Set(Array.from({ length: 1000 }, newId)).size).toBe(1000);
  });
});
