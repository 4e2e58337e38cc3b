import type { EntityManager } from 'typeorm';
import { checksOf, type EditionContent } from '../plans/plans.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import { derivedChecks, readingsOf, type BuildRecord } from './build-record';
import type { Build } from './build.entity';
import type { KeptStageState } from './build-stage.entity';
import { statesIn } from './open-stage';
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
 * of that. Where a stage is with a mentor or signed off its record is closed: it waits for {@link workOutAnew}.
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

/** What stood still while its stage was with a mentor, once the stage is in the builder's hands again. */
export async function workOutAnew(
  manager: EntityManager,
  { build, edition }: Pick<BuildRecord, 'build' | 'edition'>,
  keptAt: Date,
): Promise<void> {
  const states = await statesIn(manager, build.id);
  for (const { stage, check } of derivedChecks(edition)) {
    if (isInBuildersHands(states.get(stage.id) ?? 'not started'))
      await keepOne(manager, build, check, keptAt);
  }
}

/** Checks of a stage whose value was worked out of readings that others have taken the place of since. */
export function outOfDate(record: BuildRecord, stageId: string): PlanCheck[] {
  const isInForce = (check: string, id: string) => readingsOf(record, check).at(-1)?.id === id;
  return checksOf(record.edition, stageId).filter(({ id, fromCheckIds }) => {
    const made = readingsOf(record, id).at(-1);
    return made?.fromReadingIds.some((source, index) => !isInForce(fromCheckIds[index] ?? '', source));
  });
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
  // Another server, whose clock is ahead of this one's, may have kept the source.
  const keptNow = keptAt < takenAt ? takenAt : keptAt;
  await manager.insert(Reading, {
    ...judgedColumns(judged),
    ...{ buildId: build.id, stageId: check.stageId, checkId: check.id, byPersonId: build.personId },
    ...{ method: check.method ?? '', entry: {}, fromReadingIds, takenAt, keptAt: keptNow },
  });
  return true;
}

/** The newest reading of each check. */
export async function readingsInForce(
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
