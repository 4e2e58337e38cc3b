import type {
  CheckDescription,
  LevelPointDescription,
  MeasureDescription,
  PlanDescription,
} from './plan-description';

/** A measured check with where it stands. */
export interface PlacedMeasure {
  key: string;
  title: string;
  /** `stages.8.checks.3`, a path into the description. */
  path: string;
  stage: number;
  /** Order in the whole plan. */
  order: number;
  measure: MeasureDescription;
}

/** A level point with where it stands. */
export interface PlacedPoint extends LevelPointDescription {
  path: string;
  stage: number;
  /** Order along the signal path, from 0. */
  order: number;
}

export function placedMeasures(plan: PlanDescription): PlacedMeasure[] {
  return placedChecks(plan).flatMap(({ check, path, stage }, order) =>
    check.measure ? [{ key: check.key, title: check.title, path, stage, order, measure: check.measure }] : [],
  );
}

export function placedChecks(
  plan: PlanDescription,
): { check: CheckDescription; path: string; stage: number }[] {
  return plan.stages.flatMap(({ checks }, stage) =>
    checks.map((check, index) => ({ check, stage, path: `stages.${stage}.checks.${index}` })),
  );
}

export function placedPoints(plan: PlanDescription): PlacedPoint[] {
  return plan.stages
    .flatMap(({ levelPoints = [] }, stage) =>
      levelPoints.map((point, index) => ({ ...point, stage, path: `stages.${stage}.levelPoints.${index}` })),
    )
    .map((point, order) => ({ ...point, order }));
}
