import { LevelsError } from '@ferrite-row/levels';
import { startTransition, useEffect, useMemo, useState } from 'react';
import { isShown, type BenchInputs, type BenchValues } from '../inputs/fields';
import { readValues, type TypedTexts } from '../inputs/read-values';
import type { Bench } from '../inputs/use-bench';

const SETTLE_MS = 80;

/** Name under which a problem stands that belongs to no field of the page. */
export const ELSEWHERE = '';

export interface Worked<R> {
  /** The last that could be worked out. */
  result: R | undefined;
  /** What is typed now cannot be worked out; `result` is from before. */
  isStale: boolean;
  /** Words for the field of that name, to show once it was left. */
  problems: TypedTexts;
}

/** A value once it has rested for 80 ms. What follows from it is drawn in slices, and gives way to the next key. */
export function useSettled<T>(value: T, ms = SETTLE_MS): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => startTransition(() => setSettled(value)), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return settled;
}

/**
 * Where the words of a problem stand: at the input it names, or over the page when that input is not on it and they
 * would be read by nobody.
 */
export const problemAt = (
  inputs: BenchInputs,
  texts: TypedTexts,
  { input, message }: Pick<LevelsError, 'input' | 'message'>,
): TypedTexts => {
  const isOnPage = input in inputs && isShown(inputs, input, texts);
  return { [isOnPage ? input : ELSEWHERE]: message };
};

type Attempt<R> = { result: R } | { problems: TypedTexts };

function attempt<F extends BenchInputs, R>(
  inputs: F,
  texts: TypedTexts,
  work: (values: BenchValues<F>) => R,
): Attempt<R> {
  const read = readValues(inputs, texts);
  if (!read.isComplete) return { problems: read.problems };
  try {
    return { result: work(read.values) };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return { problems: problemAt(inputs, texts, error) };
  }
}

/**
 * What the inputs come to, as they are typed. Half-typed input keeps the last good result.
 * @param work - a constant function; what it throws of the levels package stands at the input it names.
 * @param restMs - how long the hand must rest; 0 for a page light enough to be drawn with every key.
 */
export function useWorked<F extends BenchInputs, R>(
  { inputs, texts }: Pick<Bench<F>, 'inputs' | 'texts'>,
  work: (values: BenchValues<F>) => R,
  restMs = SETTLE_MS,
): Worked<R> {
  const settled = useSettled(JSON.stringify(texts), restMs);
  const now = useMemo(
    () => attempt(inputs, JSON.parse(settled) as TypedTexts, work),
    [inputs, settled, work],
  );
  const [last, setLast] = useState<R>();
  if ('result' in now && now.result !== last) setLast(() => now.result);
  if ('result' in now) return { result: now.result, isStale: false, problems: {} };
  return { result: last, isStale: true, problems: now.problems };
}
