import type { CheckKind } from '../plans/plan-check.entity';
import type { KeptVerdict } from './reading.entity';

/** A check and what there is to show for it. */
export interface CheckStanding {
  id: string;
  title: string;
  kind: CheckKind;
  isRequired: boolean;
  /** Of the reading in force. */
  verdict?: KeptVerdict;
  isMarked: boolean;
  photos: number;
}

/** Whether there is what the check asks for: a reading that passes, a picture, a tick. */
export function isSettled({ kind, verdict, isMarked, photos }: CheckStanding): boolean {
  switch (kind) {
    case 'measure':
      return verdict === 'pass';
    case 'photo':
      return photos > 0;
    case 'tick':
    case 'safety':
    case "mentor's eyes":
      return isMarked;
  }
}

/** A safety check counts whether the plan calls it required or not. */
export function counts({ kind, isRequired }: Pick<CheckStanding, 'kind' | 'isRequired'>): boolean {
  return isRequired || kind === 'safety';
}

/** What is missing before a builder may send the stage: everything but what a mentor has to see. */
export function missingToSend<T extends CheckStanding>(checks: readonly T[]): T[] {
  return missingToSignOff(checks).filter(({ kind }) => kind !== "mentor's eyes");
}

export function missingToSignOff<T extends CheckStanding>(checks: readonly T[]): T[] {
  return checks.filter((check) => counts(check) && !isSettled(check));
}
