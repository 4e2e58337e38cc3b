import { readDraft, type Draft } from '../../../lib/drafts';
import type { Build, BuildCheck, BuildStage } from '../api/builds';
import type { Entry } from './live-reading';
import { isInHand } from './stage';

/** What is typed for one check and not sent yet. */
export interface ReadingDraft {
  /** Only what was typed: it outranks whatever the form fills in by itself. */
  entry: Entry;
  /** Empty: whatever is offered first. */
  instrumentId: string;
}

/** Where on the device it is kept. */
export const readingPlace = (buildId: string, checkId: string): string => `reading:${buildId}:${checkId}`;

interface TypedLevel {
  stage: BuildStage;
  check: BuildCheck;
  draft: Draft<ReadingDraft>;
}

/** The level that was typed last and not sent, of all checks that measure a point of the chain. */
export function lastTypedLevel(build: Build, personId: string): TypedLevel | undefined {
  const typed = build.stages.filter(isInHand).flatMap((stage) =>
    stage.checks.flatMap((check) => {
      const draft = readDraft<ReadingDraft>(personId, readingPlace(build.id, check.id));
      return draft && check.levelPointId !== null ? [{ stage, check, draft }] : [];
    }),
  );
  return typed.sort((a, b) => b.draft.keptAt.localeCompare(a.draft.keptAt))[0];
}
