import { Injectable } from '@nestjs/common';
import { DataSource, IsNull, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError } from '../common/common.errors';
import { PeopleService } from '../people/people.service';
import { PlansService } from '../plans/plans.service';
import { requireBuilder, requireOtherMentor, requireSight } from './build-access';
import { BuildRecordsService } from './build-records.service';
import type { Build } from './build.entity';
import { buildProblems } from './builds.errors';
import { CheckMark } from './check-mark.entity';
import { markDto, type MarkDto } from './dto/evidence.dto';
import { takeMarksBack } from './take-back';
import { heldCheck, putOnTheBench, requireOpen, type HeldCheck } from './open-stage';

@Injectable()
export class MarksService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly records: BuildRecordsService,
    private readonly people: PeopleService,
    private readonly clock: Clock,
  ) {}

  /**
   * Ticks a check, acknowledges a safety check by name, or, for a mentor, says that it was seen. Marking what is marked
   * changes nothing.
   *
   * @throws DomainError `stage-locked`, `stage-out-of-hand` or `stage-not-with-mentor` (409)
   */
  async mark(actor: Actor, buildId: string, checkId: string): Promise<MarkDto> {
    requireMember(actor);
    return this.dataSource.transaction(async (manager) => {
      const { build, held } = await this.holdMarkable(manager, actor, buildId, checkId);
      const standing = { buildId, checkId, takenBackAt: IsNull() };
      const known = await manager.findOneBy(CheckMark, standing);
      const mark =
        known ??
        (await manager.save(
          manager.create(CheckMark, {
            ...{ buildId, checkId, stageId: held.stage.id, byPersonId: actor.personId },
            ...{ at: this.clock.now(), takenBackAt: null },
          }),
        ));
      if (held.check.kind !== "mentor's eyes") await putOnTheBench(manager, build, held.stage);
      return markDto(mark, await this.people.byIds([mark.byPersonId], manager));
    });
  }

  /** Takes a mark back; that it was made stays in the record. */
  async takeBack(actor: Actor, buildId: string, checkId: string): Promise<void> {
    requireMember(actor);
    await this.dataSource.transaction(async (manager) => {
      await this.holdMarkable(manager, actor, buildId, checkId);
      const standing = { buildId, checkId, takenBackAt: IsNull() };
      await takeMarksBack(manager, standing, this.clock.now());
    });
  }

  /** The check, once it is sure that the actor may mark it now. */
  private async holdMarkable(
    manager: EntityManager,
    actor: Actor,
    buildId: string,
    checkId: string,
  ): Promise<{ build: Build; held: HeldCheck }> {
    const build = requireSight(actor, await this.records.hold(manager, buildId));
    const edition = await this.plans.content(build.editionId, manager);
    const held = await heldCheck(manager, build, edition, checkId);
    const { check, stage, states } = held;
    if (check.kind === 'measure' || check.kind === 'photo')
      throw fieldError('checkId', `${check.title} is not ticked: it asks for a ${check.kind}.`);
    if (check.kind === "mentor's eyes") {
      requireOtherMentor(actor, build);
      if (states.get(stage.id) !== 'with mentor')
        throw buildProblems['stage-not-with-mentor'](`${stage.name} is not with a mentor.`);
    } else {
      requireBuilder(actor, build);
      requireOpen(build, edition, held);
    }
    return { build, held };
  }
}
