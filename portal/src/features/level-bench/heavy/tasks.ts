import { LevelsError } from '@ferrite-row/levels';
import { filterBuilds } from '../filters/builds';
import { workOut } from '../mixing/work-out';

/** Work too heavy for the thread that takes the typing. What goes in and comes out crosses over as a copy: plain data only. */
const TASKS = { filterBuilds, mixing: workOut };

export type TaskName = keyof typeof TASKS;

interface Shapes {
  inputs: { [N in TaskName]: Parameters<(typeof TASKS)[N]>[0] };
  results: { [N in TaskName]: ReturnType<(typeof TASKS)[N]> };
}

export type TaskInput<N extends TaskName> = Shapes['inputs'][N];
export type TaskResult<N extends TaskName> = Shapes['results'][N];

/** A result, words for the input they name, or what broke. */
export type Outcome<R> =
  { result: R } | { problem: Pick<LevelsError, 'input' | 'message'> } | { failure: string };

/** Does a task here and now. Errors do not cross threads whole, so they become plain data. */
export function perform<N extends TaskName>(task: N, input: TaskInput<N>): Outcome<TaskResult<N>> {
  const tasks: { [M in TaskName]: (input: TaskInput<M>) => TaskResult<M> } = TASKS;
  try {
    return { result: tasks[task](input) };
  } catch (error) {
    if (error instanceof LevelsError) return { problem: { input: error.input, message: error.message } };
    return { failure: String(error) };
  }
}
