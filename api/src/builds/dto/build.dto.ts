import { IsId } from '../../common/validators';
import type { Person } from '../../people/person.entity';
import { levelPointDto, LevelPointDto } from '../../plans/dto/plan-edition.dto';
import type { BuildRecord } from '../build-record';
import { currentOf } from '../stage-states.rules';
import { buildStageDto, BuildStageDto } from './build-stage.dto';
import { personRef, PersonRefDto } from './person-ref.dto';

/** Which plan to build; its newest edition is taken. */
export class StartBuildDto {
  @IsId()
  planId: string;
}

/** One member's transmitter with its stages, checks and readings. */
export class BuildDto {
  id: string;
  builder: PersonRefDto;
  planId: string;
  /** @example Larkmoor Twenty */
  planName: string;
  editionNumber: number;
  /** @example 7 */
  serial: number;
  /** @example 2026-01-15T19:00:00Z */
  startedAt: string;
  endedAt: string | null;
  /** When an organiser saw the licence. */
  licenceSeenAt: string | null;
  /** The stage its builder is on. */
  currentStageId: string | null;
  stages: BuildStageDto[];
  /** In signal order. */
  levelPoints: LevelPointDto[];
}

export function buildDto(record: BuildRecord, people: ReadonlyMap<string, Person>): BuildDto {
  const { build, edition } = record;
  const { id, planId, serial, startedAt, endedAt, licenceSeenAt } = build;
  const stages = edition.stages.map((stage) => buildStageDto(record, stage, people));
  return {
    ...{ id, planId, planName: edition.planName, editionNumber: edition.number, serial },
    builder: personRef(people, build.personId),
    startedAt: startedAt.toISOString(),
    endedAt: endedAt?.toISOString() ?? null,
    licenceSeenAt: licenceSeenAt?.toISOString() ?? null,
    currentStageId: currentOf(stages)?.id ?? null,
    stages,
    levelPoints: edition.levelPoints.map(levelPointDto),
  };
}
