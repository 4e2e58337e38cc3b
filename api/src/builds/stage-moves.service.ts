import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, type EntityManager } from 'typeorm';
import { requireMember, requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { checksOf } from '../plans/plans.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import type { Stage } from '../plans/stage.entity';
import { requireBuilder, requireOtherMentor } from './build-access';
import { standingsOf, standingsOfChecks, type BuildRecord } from './build-record';
import { BuildRecordsService } from './build-records.service';
import type { Build } from './build.entity';
import { BuildStageEvent, type StageEventKind } from './build-stage-event.entity';
import type { KeptStageState } from './build-stage.entity';
import { buildProblems } from './builds.errors';
import { missingToSend, missingToSignOff, type CheckStanding } from './checks.rules';
import { outOfDate, workOutAnew } from './derived-readings';
import { buildStageDto, type BuildStageDto } from './dto/build-stage.dto';
import type { SendBackDto, StageNoteDto } from './dto/stage-moves.dto';
import { takeMarksBack } from './take-back';
import { isInBuildersHands, lockOf, signOffWaitOf, waitOf } from './stage-states.rules';

interface HeldStage {
  record: BuildRecord;
  stage: Stage;
  state: KeptStageState;
  /** Why it cannot be worked on, sent, or signed off as things stand before it. */
  waits: { lock: string | null; toSend: string | null; toSignOff: string | null };
}

@Injectable()
export class StageMovesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly records: BuildRecordsService,
    private readonly clock: Clock,
  ) {}

  /** Sends a stage to a mentor. @throws DomainError `stage-locked`, `stage-out-of-hand`, `checks-missing`, `readings-out-of-date` (409) */
  async submit(actor: Actor, buildId: string, stageId: string, body: StageNoteDto): Promise<BuildStageDto> {
    requireMember(actor);
    return this.move(actor, buildId, stageId, requireBuilder, 'sent', body.note, (held) => {
      const { stage, state, waits, record } = held;
      if (waits.lock) throw buildProblems['stage-locked'](`${stage.name} is locked. ${waits.lock}`);
      if (!isInBuildersHands(state))
        throw buildProblems['stage-out-of-hand'](`${stage.name} was sent already, or is signed off.`);
      refuseMissing(stage, missingToSend(standingsOfChecks(record, stage.id)));
      refuseOutOfDate(stage, outOfDate(record, stage.id));
      if (waits.toSend)
        throw buildProblems['stage-locked'](`${stage.name} cannot be sent yet. ${waits.toSend}`);
    });
  }

  /** Takes a stage back that no mentor has decided on. @throws DomainError `stage-not-with-mentor` (409) */
  async withdraw(actor: Actor, buildId: string, stageId: string): Promise<BuildStageDto> {
    requireMember(actor);
    return this.move(actor, buildId, stageId, requireBuilder, 'withdrawn', '', requireWithMentor);
  }

  /** Signs a stage off, which fixes its record. @throws DomainError `stage-not-with-mentor`, `checks-missing`, `readings-out-of-date`, `stage-locked` (409), `own-stage` (403) */
  async signOff(actor: Actor, buildId: string, stageId: string, body: StageNoteDto): Promise<BuildStageDto> {
    requireRole(actor, 'mentor');
    return this.move(actor, buildId, stageId, requireOtherMentor, 'signed off', body.note, (held) => {
      requireWithMentor(held);
      const { stage, record, waits } = held;
      refuseMissing(stage, missingToSignOff(standingsOfChecks(record, stage.id)));
      refuseOutOfDate(stage, outOfDate(record, stage.id));
      if (waits.toSignOff)
        throw buildProblems['stage-locked'](`${stage.name} cannot be signed off yet. ${waits.toSignOff}`);
    });
  }

  /** Sends a stage back with a word. @throws DomainError `stage-not-with-mentor` (409), `own-stage` (403) */
  async sendBack(actor: Actor, buildId: string, stageId: string, body: SendBackDto): Promise<BuildStageDto> {
    requireRole(actor, 'mentor');
    return this.move(actor, buildId, stageId, requireOtherMentor, 'sent back', body.note, requireWithMentor);
  }

  private async move(
    actor: Actor,
    buildId: string,
    stageId: string,
    requireAccess: (actor: Actor, build: Build | null) => Build,
    kind: StageEventKind,
    note: string | undefined,
    refuse: (held: HeldStage) => void,
  ): Promise<BuildStageDto> {
    return this.dataSource.transaction(async (manager) => {
      const build = requireAccess(actor, await this.records.hold(manager, buildId));
      const held = heldStage(await this.records.readOne(build, manager), stageId);
      refuse(held);
      const at = this.clock.now();
      const isReopened = kind === 'sent back' || kind === 'withdrawn';
      if (isReopened) await forgetWhatWasSeen(manager, held, at);
      const position = held.record.events.filter((event) => event.stageId === stageId).length + 1;
      const by = { byPersonId: actor.personId, at, note: note ?? '' };
      await manager.insert(BuildStageEvent, { buildId, stageId, position, kind, ...by });
      if (isReopened) await workOutAnew(manager, held.record, at);
      const moved = await this.records.readOne(build, manager);
      return buildStageDto(moved, held.stage, await this.records.peopleIn([moved], manager));
    });
  }
}

function heldStage(record: BuildRecord, stageId: string): HeldStage {
  const standings = standingsOf(record);
  const index = standings.findIndex((standing) => standing.stageId === stageId);
  const [standing, stage] = [standings[index], record.edition.stages[index]];
  if (!standing || !stage) throw notFound('stage');
  const before = standings.slice(0, index);
  const isLicenceSeen = record.build.licenceSeenAt !== null;
  const waits = {
    lock: lockOf(standing, before, isLicenceSeen),
    toSend: waitOf(standing, before, isLicenceSeen),
    toSignOff: signOffWaitOf(before),
  };
  return { record, stage, state: standing.state, waits };
}

function requireWithMentor({ stage, state }: HeldStage): void {
  if (state === 'with mentor') return;
  const now = state === 'signed off' ? 'It is signed off.' : `It is ${state}.`;
  throw buildProblems['stage-not-with-mentor'](`${stage.name} is not with a mentor. ${now}`);
}

function refuseMissing(stage: Stage, missing: readonly CheckStanding[]): void {
  if (missing.length === 0) return;
  const named = missing.map(({ title }) => title).join(', ');
  const detail = `${stage.name} has ${missing.length} of its checks left: ${named}.`;
  const extra = { missing: missing.map(({ id, title }) => ({ checkId: id, title })) };
  throw buildProblems['checks-missing'](detail, { extra });
}

function refuseOutOfDate(stage: Stage, checks: readonly PlanCheck[]): void {
  if (checks.length === 0) return;
  const named = checks.map(({ title }) => title).join(', ');
  throw buildProblems['readings-out-of-date'](
    `${named} of ${stage.name} was worked out of readings that were taken again since. ` +
      'It is worked out anew when the stage is sent back or taken back from the mentor.',
  );
}

/** A mentor looks again at a stage that went back: what was seen then does not hold for what comes. */
async function forgetWhatWasSeen(
  manager: EntityManager,
  { record, stage }: HeldStage,
  takenBackAt: Date,
): Promise<void> {
  const seen = checksOf(record.edition, stage.id).filter(({ kind }) => kind === "mentor's eyes");
  const standing = { buildId: record.build.id, checkId: In(seen.map(({ id }) => id)), takenBackAt: IsNull() };
  await takeMarksBack(manager, standing, takenBackAt);
}
