import type { LevelPoint } from './level-point.entity';
import type { PlanCheck } from './plan-check.entity';
import type { Stage } from './stage.entity';

/** A published edition with everything in it, in order. It never changes, so it may be kept in memory. */
export interface EditionContent {
  id: string;
  planId: string;
  planName: string;
  number: number;
  publishedAt: Date;
  stages: readonly Stage[];
  /** By stage. */
  checks: ReadonlyMap<string, readonly PlanCheck[]>;
  /** In signal order. */
  levelPoints: readonly LevelPoint[];
}

export function checksOf(edition: EditionContent, stageId: string): readonly PlanCheck[] {
  return edition.checks.get(stageId) ?? [];
}
