import type { EntityManager } from 'typeorm';
import type { EditionContent } from '../plans/plans.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import { derivedChecks } from './build-record';
import type { Build } from './build.entity';
import type { KeptStageState } from './build-stage.entity';
import { Reading } from './reading.entity';
import { judgeDerived, type JudgedReading } from './readings.rules';
import { isInBuildersHands } from './stage-states.rules';

/** What is written of a reading, however it came about. */
export function judgedColumns({ reading, inputs, verdict }: JudgedReading) {
  const { value, unit, uncertaintyUnit, standardUncertainty, expandedUncertainty } = reading;
  const { calculation, components } = reading;
  return {
    ...{ value, unit, uncertaintyUnit, standardUncertainty, expandedUncertainty, calculation, components },
    ...{ inputs, verdict },
    voltsPeakToPeak: reading.voltsPeakToPeak ?? null,
    watts: reading.watts ?? null,
  };
}

/**
 * Works out anew whatever is made of the check that has just been read: first what is carried over, then the gains made
 * of that. Where a stage is with a mentor or signed off its record is closed, and stays as the mentor sees it.
 */
export async function keepDerived(
  manager: EntityManager,
  build: Build,
  edition: EditionContent,
  states: ReadonlyMap<string, KeptStageState>,
  changedCheckId: string,
  keptAt: Date,
): Promise<void> {
  const changed = new Set([changedCheckId]);
  for (const { stage, check } of derivedChecks(edition)) {
    const isTouched = check.fromCheckIds.some((id) => changed.has(id));
    if (!isTouched || !isInBuildersHands(states.get(stage.id) ?? 'not started')) continue;
    if (await keepOne(manager, build, check, keptAt)) changed.add(check.id);
  }
}

async function keepOne(
  manager: EntityManager,
  build: Build,
  check: PlanCheck,
  keptAt: Date,
): Promise<boolean> {
  const inForce = await readingsInForce(manager, build.id, [...check.fromCheckIds, check.id]);
  const sources = check.fromCheckIds.map((id) => inForce.get(id)).filter((source) => source !== undefined);
  if (sources.length !== check.fromCheckIds.length) return false;
  const fromReadingIds = sources.map(({ id }) => id);
  if (inForce.get(check.id)?.fromReadingIds.join() === fromReadingIds.join()) return false;
  const judged = judgeDerived(check, sources);
  if (!judged) return false;
  const takenAt = new Date(Math.max(...sources.map((source) => source.takenAt.getTime())));
  await manager.insert(Reading, {
    ...judgedColumns(judged),
    ...{ buildId: build.id, stageId: check.stageId, checkId: check.id, byPersonId: build.personId },
    ...{ method: check.method ?? '', entry: {}, fromReadingIds, takenAt, keptAt },
  });
  return true;
}

async function readingsInForce(
  manager: EntityManager,
  buildId: string,
  checkIds: readonly string[],
): Promise<Map<string, Reading>> {
  const found = await manager
    .createQueryBuilder(Reading, 'reading')
    .distinctOn(['reading.check_id'])
    .where('reading.build_id = :buildId AND reading.check_id IN (:...checkIds)', { buildId, checkIds })
    .orderBy('reading.check_id')
    .addOrderBy('reading.taken_at', 'DESC')
    .addOrderBy('reading.sequence', 'DESC')
    .getMany();
  return new Map(found.map((reading) => [reading.checkId, reading]));
}
