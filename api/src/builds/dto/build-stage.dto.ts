import { ApiProperty } from '@nestjs/swagger';
import type { Person } from '../../people/person.entity';
import { checksOf } from '../../plans/plans.service';
import { planCheckDto, PlanCheckDto } from '../../plans/dto/plan-edition.dto';
import type { PlanCheck } from '../../plans/plan-check.entity';
import { CAUTIONS, type Caution, type Stage } from '../../plans/stage.entity';
import {
  checkStanding,
  readingsOf,
  standingsOf,
  standingsOfChecks,
  stateOf,
  type BuildOutline,
  type BuildRecord,
} from '../build-record';
import { STAGE_EVENT_KINDS, type StageEventKind } from '../build-stage-event.entity';
import { isSettled, missingToSend, missingToSignOff } from '../checks.rules';
import { lockOf, STAGE_STATES, type StageState } from '../stage-states.rules';
import { markDto, MarkDto, photoDto, PhotoDto } from './evidence.dto';
import { personRef, PersonRefDto } from './person-ref.dto';
import { readingDto, ReadingDto } from './reading.dto';

/** A check with everything there is to show for it. */
export class BuildCheckDto extends PlanCheckDto {
  /** There is what the check asks for. */
  isSettled: boolean;
  /** The newest last; that one is in force, the others stay in the record. */
  readings: ReadingDto[];
  mark: MarkDto | null;
  photos: PhotoDto[];
}

/** Who moved the stage on, when, and with which word. */
export class StageEventDto {
  @ApiProperty({ enum: STAGE_EVENT_KINDS })
  kind: StageEventKind;
  by: PersonRefDto;
  /** @example 2026-01-15T21:48:00Z */
  at: string;
  note: string;
}

export class BuildStageDto {
  id: string;
  position: number;
  /** @example Pre-driver */
  name: string;
  summary: string;
  @ApiProperty({ enum: CAUTIONS, isArray: true })
  cautions: Caution[];
  @ApiProperty({ enum: STAGE_STATES })
  state: StageState;
  /** What opens a locked stage. */
  lockedBecause: string | null;
  /** Checks still to settle before it can be sent to a mentor. */
  missingToSend: number;
  /** Checks still to settle before it can be signed off. */
  missingToSignOff: number;
  settled: number;
  checks: BuildCheckDto[];
  /** Oldest first. */
  events: StageEventDto[];
}

type People = ReadonlyMap<string, Person>;

export function shownState(record: BuildOutline, stage: Stage): { state: StageState; lock: string | null } {
  const standings = standingsOf(record);
  const index = standings.findIndex(({ stageId }) => stageId === stage.id);
  const standing = standings[index];
  const isLicenceSeen = record.build.licenceSeenAt !== null;
  const lock = standing ? lockOf(standing, standings.slice(0, index), isLicenceSeen) : null;
  return { state: lock === null ? stateOf(record, stage.id) : 'locked', lock };
}

export function buildStageDto(record: BuildRecord, stage: Stage, people: People): BuildStageDto {
  const { id, position, name, summary, cautions } = stage;
  const { state, lock } = shownState(record, stage);
  const standings = standingsOfChecks(record, id);
  return {
    ...{ id, position, name, summary, cautions, state, lockedBecause: lock },
    missingToSend: missingToSend(standings).length,
    missingToSignOff: missingToSignOff(standings).length,
    settled: standings.filter(isSettled).length,
    checks: checksOf(record.edition, id).map((check) => buildCheckDto(record, check, people)),
    events: record.events
      .filter(({ stageId }) => stageId === id)
      .map(({ kind, byPersonId, at, note }) => ({
        ...{ kind, note, at: at.toISOString() },
        by: personRef(people, byPersonId),
      })),
  };
}

function buildCheckDto(record: BuildRecord, check: PlanCheck, people: People): BuildCheckDto {
  const readings = readingsOf(record, check.id);
  const mark = record.marks.find(({ checkId }) => checkId === check.id);
  return {
    ...planCheckDto(check),
    isSettled: isSettled(checkStanding(record, check)),
    readings: readings.map((reading) => readingDto(reading, readings.at(-1)?.id)),
    mark: mark ? markDto(mark, people) : null,
    photos: record.photos.filter(({ checkId }) => checkId === check.id).map(photoDto),
  };
}
