import { startTransition, useEffect, useState } from 'react';
import type { BenchInputs } from '../inputs/fields';
import type { TypedTexts } from '../inputs/read-values';
import { problemAt, type Worked } from '../results/use-worked';
import { ask } from './ask';
import { latestOnly } from './latest-only';
import type { Outcome, TaskInput, TaskName, TaskResult } from './tasks';

interface Done<N extends TaskName> {
  input: TaskInput<N>;
  outcome: Outcome<TaskResult<N>>;
  /** The last good one. */
  result: TaskResult<N> | undefined;
}

/**
 * What a heavy task makes of the latest input, worked out beside the page. While it is on its way, and when it cannot be
 * worked out, the last good result stays and is stale.
 *
 * @param task - the same on every render.
 * @param input - the same object until it changes, as `useWorked` gives it; undefined while there is none.
 * @param page - the page's inputs and their texts: a problem stands at the one it names.
 */
export function useHeavy<N extends TaskName>(
  task: N,
  input: TaskInput<N> | undefined,
  page: { inputs: BenchInputs; texts: TypedTexts },
): Worked<TaskResult<N>> {
  const [done, setDone] = useState<Done<N>>();
  const [want] = useState(() =>
    latestOnly(
      (wanted: TaskInput<N>) => ask(task, wanted),
      (worked, outcome) =>
        // In slices, so that a key pressed meanwhile comes first.
        startTransition(() =>
          setDone((before) => ({
            input: worked,
            outcome,
            result: 'result' in outcome ? outcome.result : before?.result,
          })),
        ),
    ),
  );
  useEffect(() => want(input), [want, input]);

  const outcome = done?.input === input ? done?.outcome : undefined;
  if (outcome && 'failure' in outcome) throw new Error(`${task}: ${outcome.failure}`);
  const problems: TypedTexts =
    outcome && 'problem' in outcome ? problemAt(page.inputs, page.texts, outcome.problem) : {};
  return { result: done?.result, isStale: !outcome || !('result' in outcome), problems };
}
