import { ApiProperty } from '@nestjs/swagger';
import { CHECK_KINDS, type CheckKind, type PlanCheck } from '../plan-check.entity';
import type { LevelPoint } from '../level-point.entity';
import { CAUTIONS, type Caution, type Stage } from '../stage.entity';

export class LevelPointDto {
  id: string;
  stageId: string;
  /** @example Band-pass filter */
  name: string;
  /** @example TP8 */
  testPoint: string;
  plannedDbm: number;
  toleranceDb: number;
  /** What the stage can deliver or the next can take, dBm. */
  limitDbm: number | null;
}

/** A check as the plan asks for it. */
export class PlanCheckDto {
  id: string;
  /** Order on the checklist, from 1. */
  position: number;
  @ApiProperty({ enum: CHECK_KINDS })
  kind: CheckKind;
  /** @example Output level at TP9 */
  title: string;
  instruction: string;
  isRequired: boolean;
  /** For a measure: how it is taken; `gain` and `carried` work themselves out. */
  method: string | null;
  /** Unit of the value and of the window. */
  unit: string | null;
  windowLow: number | null;
  windowHigh: number | null;
  target: number | null;
  /** What the form starts with, in the fields' own units. */
  @ApiProperty({ type: 'object', additionalProperties: { type: 'number' } })
  defaults: Record<string, number>;
  /** For a value that works itself out: the checks it is made of. */
  fromCheckIds: string[];
  levelPointId: string | null;
  instrumentKindId: string | null;
}

export class PlanStageDto {
  id: string;
  position: number;
  /** @example Pre-driver */
  name: string;
  summary: string;
  @ApiProperty({ enum: CAUTIONS, isArray: true })
  cautions: Caution[];
  checks: PlanCheckDto[];
}

/** One published edition, whole. */
export class PlanEditionDto {
  id: string;
  planId: string;
  planName: string;
  number: number;
  /** @example 2026-01-15T12:00:00Z */
  publishedAt: string;
  stages: PlanStageDto[];
  /** In signal order. */
  levelPoints: LevelPointDto[];
}

export function levelPointDto(point: LevelPoint): LevelPointDto {
  const { id, stageId, name, testPoint, plannedDbm, toleranceDb, limitDbm } = point;
  return { id, stageId, name, testPoint, plannedDbm, toleranceDb, limitDbm };
}

export function planCheckDto(check: PlanCheck): PlanCheckDto {
  const { id, position, kind, title, instruction, isRequired, method, unit } = check;
  const { windowLow, windowHigh, target, defaults, fromCheckIds, levelPointId, instrumentKindId } = check;
  return {
    ...{ id, position, kind, title, instruction, isRequired, method, unit },
    ...{ windowLow, windowHigh, target, defaults, fromCheckIds, levelPointId, instrumentKindId },
  };
}

export function planStageDto(stage: Stage, checks: readonly PlanCheck[]): PlanStageDto {
  const { id, position, name, summary, cautions } = stage;
  return { id, position, name, summary, cautions, checks: checks.map(planCheckDto) };
}
