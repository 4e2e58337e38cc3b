import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { LevelPoint } from './level-point.entity';
import type { CheckDescription, PlanDescription, StageDescription } from './plan-description';
import { PlanCheck } from './plan-check.entity';
import { PlanEdition } from './plan-edition.entity';
import { Stage } from './stage.entity';

/**
 * Writes an edition's stages, points and checks and then publishes it; in that order, since a published one is fixed.
 *
 * @param kindIds - instrument kinds by name.
 */
export async function writeEdition(
  manager: EntityManager,
  planId: string,
  plan: PlanDescription,
  kindIds: ReadonlyMap<string, string>,
  publishedAt: Date,
): Promise<string> {
  const editionId = randomUUID();
  await manager.insert(PlanEdition, { id: editionId, planId, number: plan.edition, publishedAt: null });
  const checkIds = new Map(plan.stages.flatMap(({ checks }) => checks).map(({ key }) => [key, randomUUID()]));
  const stages = plan.stages.map((stage, index) => stageRows(stage, index, editionId, checkIds, kindIds));
  await manager.insert(
    Stage,
    stages.map(({ stage }) => stage),
  );
  await manager.insert(
    LevelPoint,
    stages.flatMap(({ points }) => points),
  );
  await manager.insert(
    PlanCheck,
    stages.flatMap(({ checks }) => checks),
  );
  await manager.update(PlanEdition, { id: editionId }, { publishedAt });
  return editionId;
}

function stageRows(
  { name, summary, cautions = [], levelPoints = [], checks }: StageDescription,
  index: number,
  editionId: string,
  checkIds: ReadonlyMap<string, string>,
  kindIds: ReadonlyMap<string, string>,
) {
  const stageId = randomUUID();
  const points = levelPoints.map(({ limitDbm = null, ...point }, position) => ({
    ...point,
    limitDbm,
    id: randomUUID(),
    stageId,
    position: position + 1,
  }));
  const pointIds = new Map(points.map(({ testPoint, id }) => [testPoint, id]));
  return {
    stage: { id: stageId, editionId, position: index + 1, name, summary, cautions: [...cautions] },
    points,
    checks: checks.map((check, position) => ({
      ...checkRow(check, checkIds, pointIds, kindIds),
      stageId,
      position: position + 1,
    })),
  };
}

function checkRow(
  { key, kind, title, instruction = '', isRequired = true, measure }: CheckDescription,
  checkIds: ReadonlyMap<string, string>,
  pointIds: ReadonlyMap<string, string>,
  kindIds: ReadonlyMap<string, string>,
) {
  const {
    method,
    unit,
    window,
    target,
    defaults = {},
    from = [],
    levelPoint,
    instrumentKind,
  } = measure ?? {};
  return {
    ...{ id: checkIds.get(key), kind, title, instruction, isRequired },
    method: method ?? null,
    unit: unit ?? null,
    windowLow: window?.low ?? null,
    windowHigh: window?.high ?? null,
    target: target ?? null,
    defaults,
    fromCheckIds: from.flatMap((source) => checkIds.get(source) ?? []),
    levelPointId: pointIds.get(levelPoint ?? '') ?? null,
    instrumentKindId: kindIds.get(instrumentKind ?? '') ?? null,
  };
}
