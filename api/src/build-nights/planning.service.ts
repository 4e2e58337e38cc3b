import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { BuildsService } from '../builds/builds.service';
import { ClubService } from '../club/club.service';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { retryingOnce } from '../common/retrying';
import type { BuildNight } from './build-night.entity';
import { BuildNightsRepository } from './build-nights.repository';
import type { PlanNightsDto, PreviewNightsDto } from './dto/plan-nights.dto';
import type { NightsPreviewDto, ScheduledNightsDto } from './dto/planned-nights.dto';
import { NightCheck } from './night-check';
import { NightDesk } from './night-desk';
import { scheduledLetter } from './night-letters.rules';
import { buildNightDto } from './night-view';
import { NightWriter } from './night-writer';
import { wantedNights, type WantedNight } from './plan.rules';

/** Planning nights: what would clash, and writing them down. */
@Injectable()
export class PlanningService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly nights: BuildNightsRepository,
    private readonly looking: NightCheck,
    private readonly writer: NightWriter,
    private readonly desk: NightDesk,
    private readonly builds: BuildsService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** Each date with its verdict, while the plan is being typed. Nothing is kept. */
  async preview(actor: Actor, plan: PreviewNightsDto): Promise<NightsPreviewDto> {
    requireRole(actor, 'mentor');
    const { timeZone } = await this.club.settings();
    const wanted = wantedNights(plan, timeZone, this.clock.now(), [actor.personId]);
    const [nights, people] = await Promise.all([
      this.looking.check(wanted, timeZone),
      this.peopleToTell(actor, plan.stageIds ?? []),
    ]);
    return { nights, toTell: people.length };
  }

  /** One night or a series, whole or not at all. */
  async schedule(actor: Actor, plan: PlanNightsDto): Promise<ScheduledNightsDto> {
    requireRole(actor, 'mentor');
    const { timeZone } = await this.club.settings();
    const all = wantedNights(plan, timeZone, this.clock.now(), [actor.personId]);
    const wanted = all.filter(({ isLeftOut }) => !isLeftOut);
    if (wanted.length === 0) throw fieldError('skip', 'No night is left to schedule.');
    await this.looking.refuseUnknown({
      benchIds: wanted.flatMap(({ benchIds }) => benchIds),
      mentorIds: wanted.flatMap(({ mentorIds }) => mentorIds),
      stageIds: plan.stageIds ?? [],
    });
    await this.looking.refuseClashes(wanted, timeZone);
    const lostRace = () => this.looking.lostRace(wanted, timeZone);
    const people = plan.tellByMail ? await this.peopleToTell(actor, plan.stageIds ?? []) : [];
    const work = () =>
      this.dataSource.transaction((manager) => this.write(manager, actor, plan, wanted, people));
    const made = await translatingConstraints(() => retryingOnce(work), {
      booking_no_overlap: lostRace,
      build_night_mentor_on_one_duty: lostRace,
    });
    const records = await this.nights.byIds(made.map(({ id }) => id));
    return { nights: records.map((record) => buildNightDto(record, actor.personId)), told: people.length };
  }

  private async write(
    manager: EntityManager,
    actor: Actor,
    { title, places, note = '', repeat, stageIds = [] }: PlanNightsDto,
    wanted: readonly WantedNight[],
    people: readonly string[],
  ): Promise<BuildNight[]> {
    const basics = { title, places, note, stageIds, rule: repeat?.rule ?? null };
    const by = { madeById: actor.personId, madeAt: this.clock.now() };
    const made = await this.writer.write(manager, { ...basics, ...by }, wanted);
    await this.desk.tellMentors(
      manager,
      actor,
      made.map((night, index) => ({ night, mentorIds: wanted[index]?.mentorIds ?? [] })),
    );
    const stages = await this.nights.stages(stageIds, manager);
    const focus = stages.map(({ position, name }) => `${position} ${name}`);
    const letter = scheduledLetter(made, focus, await this.desk.hall(manager));
    await this.desk.write(manager, people, letter);
    return made;
  }

  /** Everybody whose build is on one of the stages now, but for whoever plans. */
  private async peopleToTell(actor: Actor, stageIds: readonly string[]): Promise<string[]> {
    if (stageIds.length === 0) return [];
    const people = await this.builds.peopleOnStages(stageIds);
    return people.map(({ personId }) => personId).filter((id) => id !== actor.personId);
  }
}
