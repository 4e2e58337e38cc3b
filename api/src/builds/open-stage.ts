import type { EntityManager } from 'typeorm';
import { notFound } from '../common/common.errors';
import type { EditionContent } from '../plans/plans.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import type { Stage } from '../plans/stage.entity';
import { findCheck, standingsOf } from './build-record';
import type { Build } from './build.entity';
import { BuildStageEvent } from './build-stage-event.entity';
import { BuildStage, type KeptStageState } from './build-stage.entity';
import { buildProblems } from './builds.errors';
import { isInBuildersHands, lockOf, openedAt } from './stage-states.rules';

/** A check of a build that somebody is about to write to. */
export interface HeldCheck {
  stage: Stage;
  check: PlanCheck;
  states: ReadonlyMap<string, KeptStageState>;
}

export async function statesIn(
  manager: EntityManager,
  buildId: string,
): Promise<ReadonlyMap<string, KeptStageState>> {
  const rows = await manager.find(BuildStage, { where: { buildId } });
  return new Map(rows.map(({ stageId, state }) => [stageId, state]));
}

/** @throws DomainError `not-found` when the build's edition has no such check */
export async function heldCheck(
  manager: EntityManager,
  build: Build,
  edition: EditionContent,
  checkId: string,
): Promise<HeldCheck> {
  const found = findCheck(edition, checkId);
  if (!found) throw notFound('check');
  return { ...found, states: await statesIn(manager, build.id) };
}

/** @throws DomainError `stage-locked` or `stage-out-of-hand` (409) */
export function requireOpen(build: Build, edition: EditionContent, { stage, states }: HeldCheck): void {
  const standings = standingsOf({ edition, states });
  const index = standings.findIndex(({ stageId }) => stageId === stage.id);
  const standing = standings[index];
  if (!standing) throw notFound('stage');
  const lock = lockOf(standing, standings.slice(0, index), build.licenceSeenAt !== null);
  if (lock) throw buildProblems['stage-locked'](`${stage.name} is locked. ${lock}`);
  if (isInBuildersHands(standing.state)) return;
  const where = standing.state === 'signed off' ? 'signed off' : 'with a mentor';
  const way = standing.state === 'signed off' ? '' : ' Take it back from the mentor to add to it.';
  throw buildProblems['stage-out-of-hand'](`${stage.name} is ${where}, so its record is closed.${way}`);
}

/** When a stage of a build opened. */
export async function openingOf(
  manager: EntityManager,
  build: Build,
  edition: EditionContent,
  stage: Stage,
): Promise<Date> {
  const events = await manager.find(BuildStageEvent, { where: { buildId: build.id }, order: { at: 'ASC' } });
  const before = edition.stages.filter(({ position }) => position < stage.position);
  const needsLicence = stage.cautions.includes('licence needed');
  return openedAt(
    { needsLicence },
    before.map(({ id }) => ({ stageId: id })),
    events,
    build,
  );
}

/** The first thing done on a stage puts it on the bench. One that was sent back stays so until it is sent again. */
export async function putOnTheBench(manager: EntityManager, build: Build, stage: Stage): Promise<void> {
  const notStarted = { buildId: build.id, stageId: stage.id, state: 'not started' } as const;
  await manager.update(BuildStage, notStarted, { state: 'on the bench' });
}
