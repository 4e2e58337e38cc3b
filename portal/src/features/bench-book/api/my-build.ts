import type { components } from '../../../api-client/schema';

type Build = components['schemas']['BuildDto'];

export interface OpenCheck {
  checkId: string;
  /** `Stage 9 Pre-driver, Output level` */
  words: string;
}

const OPEN = new Set<Build['stages'][number]['state']>(['on the bench', 'sent back']);

/** What the person may be working on: the unsettled checks of stages on the bench, and the one they came from. */
export function openChecks(builds: readonly Build[], askedCheckId: string): OpenCheck[] {
  return builds.flatMap(({ stages }) =>
    stages.flatMap(({ position, name, state, checks }) =>
      checks
        .filter(({ id, isSettled }) => id === askedCheckId || (OPEN.has(state) && !isSettled))
        .map(({ id, title }) => ({ checkId: id, words: `Stage ${position} ${name}, ${title}` })),
    ),
  );
}
