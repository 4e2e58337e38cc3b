import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { DomainError } from '../common/domain-error';
import { Plan } from '../plans/plan.entity';
import { PlansService } from '../plans/plans.service';
import { requireSight } from './build-access';
import { BuildRecordsService } from './build-records.service';
import { Build } from './build.entity';
import { BuildStage } from './build-stage.entity';
import { buildProblems } from './builds.errors';
import { buildSummaryDto, type BuildSummaryDto } from './dto/build-summary.dto';
import { buildDto, type BuildDto, type StartBuildDto } from './dto/build.dto';

/** Somebody whose current stage is one of those asked for. */
export interface PersonOnStage {
  personId: string;
  name: string;
  email: string;
}

@Injectable()
export class BuildsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly records: BuildRecordsService,
    private readonly clock: Clock,
  ) {}

  /** The actor's own builds, the newest first. */
  async mine(actor: Actor): Promise<BuildDto[]> {
    requireMember(actor);
    const records = await this.records.read(await this.ownedBy(actor));
    const people = await this.records.peopleIn(records);
    return records.map((record) => buildDto(record, people));
  }

  /** How far the actor's own builds are, the newest first; what every page can afford to ask. */
  async mySummaries(actor: Actor): Promise<BuildSummaryDto[]> {
    requireMember(actor);
    return (await this.records.outlines(await this.ownedBy(actor))).map(buildSummaryDto);
  }

  async show(actor: Actor, buildId: string): Promise<BuildDto> {
    requireMember(actor);
    const build = requireSight(actor, await this.records.find(buildId));
    const record = await this.records.readOne(build);
    return buildDto(record, await this.records.peopleIn([record]));
  }

  /**
   * Begins a transmitter to the newest edition of a plan, with the next serial.
   *
   * @throws DomainError `invalid-input` for an unknown plan, `build-started-already` (409)
   */
  async start(actor: Actor, { planId }: StartBuildDto): Promise<BuildDto> {
    requireMember(actor);
    const edition = await this.plans.newestEdition(planId).catch((error: unknown) => {
      throw error instanceof DomainError ? fieldError('planId', 'There is no such plan.') : error;
    });
    const build = await translatingConstraints(
      () =>
        this.dataSource.transaction(async (manager) => {
          // Held, so that two members who start in the same moment get two serials.
          await manager.findOneOrFail(Plan, { where: { id: planId }, lock: { mode: 'for_no_key_update' } });
          const last = await manager.maximum(Build, 'serial', { planId });
          const serial = (last ?? 0) + 1;
          const { personId } = actor;
          const startedAt = this.clock.now();
          const started = { personId, planId, editionId: edition.id, serial, startedAt };
          const made = await manager.save(manager.create(Build, { ...started, ...NOT_YET }));
          const stages = edition.stages.map(({ id }) => ({ buildId: made.id, stageId: id }));
          await manager.insert(BuildStage, stages);
          return made;
        }),
      {
        build_one_live: () =>
          buildProblems['build-started-already'](`You have a ${edition.planName} under way already.`),
      },
    );
    return this.show(actor, build.id);
  }

  /** For other features: everybody who is on one of these stages now, each once. */
  async peopleOnStages(stageIds: readonly string[]): Promise<PersonOnStage[]> {
    if (stageIds.length === 0) return [];
    const builds = await this.dataSource
      .getRepository(Build)
      .createQueryBuilder('build')
      .innerJoinAndSelect('build.person', 'person', 'person.left_at IS NULL')
      .where('build.ended_at IS NULL')
      .andWhere('build.id IN (SELECT build_id FROM build_stage WHERE stage_id IN (:...stageIds))', {
        stageIds,
      })
      .orderBy('person.name')
      .addOrderBy('build.id')
      .getMany();
    const people = new Map<string, PersonOnStage>();
    for (const outline of await this.records.outlines(builds)) {
      const { currentStageId } = buildSummaryDto(outline);
      if (!currentStageId || !stageIds.includes(currentStageId)) continue;
      const { id: personId, name, email } = outline.build.person;
      people.set(personId, { personId, name, email });
    }
    return [...people.values()];
  }

  private ownedBy({ personId }: Actor): Promise<Build[]> {
    return this.dataSource
      .getRepository(Build)
      .find({ where: { personId }, order: { startedAt: 'DESC', id: 'ASC' } });
  }
}

const NOT_YET = { endedAt: null, licenceSeenAt: null, licenceSeenById: null };
