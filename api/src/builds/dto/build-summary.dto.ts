import { ApiProperty } from '@nestjs/swagger';
import type { BuildOutline } from '../build-record';
import { currentOf, STAGE_STATES, type StageState } from '../stage-states.rules';
import { shownState } from './build-stage.dto';

export class StageSummaryDto {
  id: string;
  position: number;
  /** @example Pre-driver */
  name: string;
  @ApiProperty({ enum: STAGE_STATES })
  state: StageState;
}

/** How far a build is, without what is in it. */
export class BuildSummaryDto {
  id: string;
  /** @example Larkmoor Twenty */
  planName: string;
  /** @example 7 */
  serial: number;
  endedAt: string | null;
  /** The stage its builder is on. */
  currentStageId: string | null;
  stages: StageSummaryDto[];
}

export function buildSummaryDto(outline: BuildOutline): BuildSummaryDto {
  const { build, edition } = outline;
  const { id, serial, endedAt } = build;
  const stages = edition.stages.map((stage) => ({
    ...{ id: stage.id, position: stage.position, name: stage.name },
    state: shownState(outline, stage).state,
  }));
  return {
    ...{ id, planName: edition.planName, serial, endedAt: endedAt?.toISOString() ?? null },
    currentStageId: currentOf(stages)?.id ?? null,
    stages,
  };
}
