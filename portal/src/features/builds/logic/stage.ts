import type { LevelPoint } from '../../../shared-ui/level-diagram/level-point';
import type { Build, BuildCheck, BuildStage, Reading } from '../api/builds';

export const readingInForce = ({ readings }: Pick<BuildCheck, 'readings'>): Reading | undefined =>
  readings.at(-1);

/** The readings in force that a check is worked out from, in its order. */
export const sourcesOf = (
  { fromCheckIds }: Pick<BuildCheck, 'fromCheckIds'>,
  { checks }: Pick<BuildStage, 'checks'>,
): (Reading | undefined)[] =>
  fromCheckIds.map((sourceId) =>
    readingInForce(checks.find(({ id }) => id === sourceId) ?? { readings: [] }),
  );

const DERIVED = ['gain', 'carried'];

/** Gains and levels carried over need no hand; nor does what a mentor has to see. */
export const isTyped = ({ kind, method }: Pick<BuildCheck, 'kind' | 'method'>): boolean =>
  kind !== "mentor's eyes" && !DERIVED.includes(method ?? '');

/** Whether evidence can be added to a stage now. */
export const isInHand = ({ state }: Pick<BuildStage, 'state'>): boolean =>
  state === 'not started' || state === 'on the bench' || state === 'sent back';

/** The check to go on with: the first one of one's own that is not settled. */
export const nextCheck = ({ checks }: Pick<BuildStage, 'checks'>): BuildCheck | undefined =>
  checks.find((check) => isTyped(check) && !check.isSettled);

export const findStage = (build: Build, stageId: string | null): BuildStage | undefined =>
  build.stages.find(({ id }) => id === stageId);

/** What is still missing, in words: the titles of the checks before a mentor can look. */
export const missingTitles = ({ checks }: BuildStage): string[] =>
  checks
    .filter(
      ({ isSettled, isRequired, kind }) =>
        !isSettled && (isRequired || kind === 'safety') && kind !== "mentor's eyes",
    )
    .map(({ title }) => title);

/** The check that measures a point. */
const checkOfPoint = (
  build: Build,
  pointId: string,
): { stage: BuildStage; check: BuildCheck } | undefined => {
  for (const stage of build.stages) {
    const check = stage.checks.find(({ levelPointId }) => levelPointId === pointId);
    if (check) return { stage, check };
  }
  return undefined;
};

/** The build's chain of levels as the diagram draws it. */
export function levelPointsOf(build: Build): LevelPoint[] {
  return build.levelPoints.map(({ id, stageId, name, plannedDbm, toleranceDb, limitDbm }) => {
    const found = checkOfPoint(build, id);
    const reading = found && readingInForce(found.check);
    const stage = findStage(build, stageId);
    return {
      ...{ id, name, toleranceDb, limitDbm },
      stageNumber: stage?.position ?? 0,
      planDbm: plannedDbm,
      measured: reading
        ? {
            levelDbm: reading.value,
            expandedUncertaintyDb: reading.expandedUncertainty,
            isWithMentor: stage?.state === 'with mentor',
          }
        : null,
      verdict: reading?.verdict ?? null,
    };
  });
}

/** Where the reading of a check is typed. */
export const checkPath = (buildId: string, stageId: string, checkId?: string): string =>
  `/build/${buildId}/stages/${stageId}${checkId ? `?check=${checkId}` : ''}`;
