import { expect, it } from 'vitest';
import { lastOnly } from './last-only';

it('gives the same object while the same is asked, and a new one after that', () => {
  const doubled = lastOnly(({ n }: { n: number }) => ({ twice: 2 * n }));
  const first = doubled({ n: 2 });
  expect(first).toEqual({ twice: 4 });
  expect(doubled({ n: 2 })).toBe(first);
  expect(doubled({ n: 3 })).toEqual({ twice: 6 });
});
