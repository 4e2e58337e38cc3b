import { useState } from 'react';
import { useHeavy } from '../heavy/use-heavy';
import type { Bench } from '../inputs/use-bench';
import { useWorked, type Worked } from '../results/use-worked';
import type { INPUTS, MixingValues } from './inputs';
import { workOut, type Mixing } from './work-out';

/** Up to this order the products are worked out with every key; above it beside the page. */
const LIGHT_ORDER = 9;

/** Either done at once, or what is to be done. */
type AtOnce = { mixing: Mixing } | { toDo: MixingValues };

const atOnce = (values: MixingValues): AtOnce =>
  values.maxOrder > LIGHT_ORDER ? { toDo: values } : { mixing: workOut(values) };

/** What the inputs come to, drawn again with every key. The last good result stays while the next is on its way. */
export function useMixing(bench: Bench<typeof INPUTS>): Worked<Mixing> {
  const read = useWorked(bench, atOnce, 0);
  const toDo = read.result && 'toDo' in read.result ? read.result.toDo : undefined;
  const heavy = useHeavy('mixing', toDo, bench);
  const [last, setLast] = useState<Mixing>();
  const done = doneOf(read.result, heavy);
  if (done && done !== last) setLast(done);
  return {
    result: done ?? last,
    isStale: read.isStale || done === undefined,
    problems: toDo ? { ...heavy.problems, ...read.problems } : read.problems,
  };
}

function doneOf(read: AtOnce | undefined, heavy: Worked<Mixing>): Mixing | undefined {
  if (read && 'mixing' in read) return read.mixing;
  return read && !heavy.isStale ? heavy.result : undefined;
}
