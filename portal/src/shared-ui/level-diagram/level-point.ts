import type { Verdict } from '../states/state-words';

export interface MeasuredLevel {
  levelDbm: number;
  /** Expanded, 95 % (k = 2). */
  expandedUncertaintyDb: number;
  /** Its stage waits for the mentor: the dot is half filled. */
  isWithMentor?: boolean;
}

/** One column: a point of the plan's level chain, in signal order. */
export interface LevelPoint {
  id: string;
  stageNumber: number;
  name: string;
  planDbm: number;
  toleranceDb: number;
  /** The most this point may see; null where the plan sets none. */
  limitDbm?: number | null;
  measured?: MeasuredLevel | null;
  verdict?: Verdict | null;
}

/** The reading on its way: moves as the person types. */
export interface LevelBeingEntered {
  pointId: string;
  levelDbm: number;
  expandedUncertaintyDb: number;
  verdict?: Verdict | null;
}
