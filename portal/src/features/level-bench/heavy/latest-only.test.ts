import { describe, expect, it } from 'vitest';
import { latestOnly } from './latest-only';

/** Work that ends when told to. */
function byHand() {
  const begun: { input: string; end: () => void }[] = [];
  const work = (input: string) =>
    new Promise<string>((resolve) => begun.push({ input, end: () => resolve(input.toUpperCase()) }));
  return { begun, work };
}

const rested = () => new Promise((resolve) => setTimeout(resolve));

describe('work of which only the latest counts', () => {
  it('drops what came in between and tells only the last', async () => {
    const { begun, work } = byHand();
    const told: string[] = [];
    const want = latestOnly(work, (_input, result) => told.push(result));
    ['a', 'b', 'c'].forEach(want);
    begun[0].end();
    await rested();
    begun[1].end();
    await rested();
    expect(begun.map(({ input }) => input)).toEqual(['a', 'c']);
    expect(told).toEqual(['C']);
  });

  it('begins again after a rest', async () => {
    const { begun, work } = byHand();
    const told: string[] = [];
    const want = latestOnly(work, (_input, result) => told.push(result));
    want('a');
    begun[0].end();
    await rested();
    want('b');
    begun[1].end();
    await rested();
    expect(told).toEqual(['A', 'B']);
  });
});
