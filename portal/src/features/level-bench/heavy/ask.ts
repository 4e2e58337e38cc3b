import type { Outcome, TaskInput, TaskName, TaskResult } from './tasks';

/** What the worker is sent. */
export interface Order<N extends TaskName = TaskName> {
  id: number;
  task: N;
  input: TaskInput<N>;
}

interface Open {
  order: Order;
  settle: (outcome: Promise<Outcome<unknown>> | Outcome<unknown>) => void;
}

/** Orders the worker has not answered yet. */
const open = new Map<number, Open>();
let lastId = 0;
let worker: Worker | undefined;
let isWithoutWorker = typeof Worker === 'undefined';

/** In the page's own thread, after whatever is on its way; the code for it is only then fetched. */
async function here(order: Order): Promise<Outcome<unknown>> {
  const { perform } = await import('./tasks');
  await new Promise((resolve) => setTimeout(resolve));
  return perform(order.task, order.input);
}

/** A worker that did not start: what it was to do is done here, and so is all that follows. */
function doWithout(): void {
  isWithoutWorker = true;
  worker?.terminate();
  worker = undefined;
  for (const { order, settle } of open.values()) settle(here(order));
  open.clear();
}

function started(): Worker {
  const made = new Worker(new URL('./bench.worker.ts', import.meta.url), { type: 'module' });
  made.addEventListener('message', ({ data }: MessageEvent<{ id: number; outcome: Outcome<unknown> }>) => {
    open.get(data.id)?.settle(data.outcome);
    open.delete(data.id);
  });
  made.addEventListener('error', doWithout);
  return made;
}

/** Has a task done by the worker all pages share, or here where there is none. Never rejects. */
export function ask<N extends TaskName>(task: N, input: TaskInput<N>): Promise<Outcome<TaskResult<N>>> {
  const order: Order<N> = { id: (lastId += 1), task, input };
  const outcome = isWithoutWorker
    ? here(order)
    : new Promise<Outcome<unknown>>((settle) => {
        open.set(order.id, { order, settle });
        worker ??= started();
        worker.postMessage(order);
      });
  // An answer bears the id of its order, so it is that task's.
  return outcome as Promise<Outcome<TaskResult<N>>>;
}
