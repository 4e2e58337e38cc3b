import { checksOf, isDerived, type EditionContent } from '../plans/plans.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import type { Stage } from '../plans/stage.entity';
import type { Build } from './build.entity';
import type { BuildStageEvent } from './build-stage-event.entity';
import type { KeptStageState } from './build-stage.entity';
import type { CheckMark } from './check-mark.entity';
import { type CheckStanding } from './checks.rules';
import type { Photo } from './photo.entity';
import type { Reading } from './reading.entity';
import type { Standing } from './stage-states.rules';

/** A picture without its bytes. */
export type PhotoFacts = Omit<Photo, 'bytes'>;

/** How far a build is. */
export interface BuildOutline {
  build: Build;
  edition: EditionContent;
  states: ReadonlyMap<string, KeptStageState>;
}

/** Everything there is about one build, read at once. */
export interface BuildRecord extends BuildOutline {
  events: readonly BuildStageEvent[];
  /** The newest last, so that the one in force is the last of its check. */
  readings: readonly Reading[];
  /** Those not taken back. */
  marks: readonly CheckMark[];
  photos: readonly PhotoFacts[];
}

export function stateOf({ states }: Pick<BuildRecord, 'states'>, stageId: string): KeptStageState {
  return states.get(stageId) ?? 'not started';
}

/** The stages of a build as they stand to each other, in order. */
export function standingsOf(
  record: Pick<BuildRecord, 'edition' | 'states'>,
): (Standing & { stageId: string })[] {
  return record.edition.stages.map((stage) => ({
    ...{ stageId: stage.id, position: stage.position, name: stage.name },
    state: stateOf(record, stage.id),
    needsLicence: stage.cautions.includes('licence needed'),
  }));
}

export function readingsOf({ readings }: Pick<BuildRecord, 'readings'>, checkId: string): Reading[] {
  return readings.filter((reading) => reading.checkId === checkId);
}

export function checkStanding(record: BuildRecord, check: PlanCheck): CheckStanding {
  const { id, title, kind, isRequired } = check;
  return {
    ...{ id, title, kind, isRequired },
    verdict: readingsOf(record, id).at(-1)?.verdict,
    isMarked: record.marks.some(({ checkId }) => checkId === id),
    photos: record.photos.filter(({ checkId }) => checkId === id).length,
  };
}

export function standingsOfChecks(record: BuildRecord, stageId: string): CheckStanding[] {
  return checksOf(record.edition, stageId).map((check) => checkStanding(record, check));
}

/** The stage and check with this id, when the build's edition has it. */
export function findCheck(
  edition: EditionContent,
  checkId: string,
): { stage: Stage; check: PlanCheck } | undefined {
  for (const stage of edition.stages) {
    const check = checksOf(edition, stage.id).find(({ id }) => id === checkId);
    if (check) return { stage, check };
  }
  return undefined;
}

/** Checks that work themselves out, in the order in which they can. */
export function derivedChecks(edition: EditionContent): { stage: Stage; check: PlanCheck }[] {
  return edition.stages.flatMap((stage) =>
    checksOf(edition, stage.id)
      .filter(({ method }) => isDerived(method))
      .map((check) => ({ stage, check })),
  );
}
