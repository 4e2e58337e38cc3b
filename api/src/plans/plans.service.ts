import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, Not, type EntityManager } from 'typeorm';
import { requireMember, requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { skipOf } from '../common/paging.dto';
import { InstrumentKind } from '../instruments/instrument-kind.entity';
import { levelPointDto, planStageDto, type PlanEditionDto } from './dto/plan-edition.dto';
import type { ListPlansQueryDto, PlansPageDto } from './dto/plan.dto';
import { checksOf, type EditionContent } from './edition-content';
import { writeEdition } from './edition-writer';
import { LevelPoint } from './level-point.entity';
import type { PlanDescription } from './plan-description';
import { placedMeasures } from './plan-parts';
import { Plan } from './plan.entity';
import { PlanCheck } from './plan-check.entity';
import { PlanEdition } from './plan-edition.entity';
import { planProblems } from './plans.errors';
import { disagreementsOf, type Disagreement } from './plans.rules';
import { Stage } from './stage.entity';

export { checksOf, type EditionContent } from './edition-content';
export { isDerived } from './plan-description';

/** A number past PostgreSQL's integers is no edition, and must not reach it. */
const MOST_EDITIONS = 100_000;

@Injectable()
export class PlansService {
  /** Published editions never change, so each is read once by each server. */
  private readonly contents = new Map<string, EditionContent>();

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, query: ListPlansQueryDto): Promise<PlansPageDto> {
    requireMember(actor);
    const { page, perPage } = query;
    const [plans, total] = await this.dataSource
      .getRepository(Plan)
      .findAndCount({ order: { name: 'ASC', id: 'ASC' }, skip: skipOf(query), take: perPage });
    const editions = await this.dataSource.getRepository(PlanEdition).find({
      where: { planId: In(plans.map(({ id }) => id)), publishedAt: Not(IsNull()) },
      order: { number: 'ASC' },
    });
    const items = plans.map(({ id, name, summary }) => {
      const numbers = editions.filter(({ planId }) => planId === id).map(({ number }) => number);
      return { id, name, summary, editions: numbers };
    });
    return { items, total, page, perPage };
  }

  async show(actor: Actor, planId: string, number: number): Promise<PlanEditionDto> {
    requireMember(actor);
    if (!(number >= 1 && number <= MOST_EDITIONS)) throw notFound('edition of a plan');
    const edition = await this.dataSource
      .getRepository(PlanEdition)
      .findOneBy({ planId, number, publishedAt: Not(IsNull()) });
    if (!edition) throw notFound('edition of a plan');
    const content = await this.content(edition.id);
    return {
      ...{ id: content.id, planId, planName: content.planName, number },
      publishedAt: content.publishedAt.toISOString(),
      stages: content.stages.map((stage) => planStageDto(stage, checksOf(content, stage.id))),
      levelPoints: content.levelPoints.map(levelPointDto),
    };
  }

  /**
   * Publishes an edition, once its stages meet. From then on the database lets nobody change it.
   *
   * @returns id of the edition.
   * @throws DomainError `plan-does-not-meet` (422) with each disagreement; `edition-published-already` (409)
   */
  async publish(actor: Actor, plan: PlanDescription): Promise<string> {
    requireRole(actor, 'mentor');
    const kinds = await this.dataSource.getRepository(InstrumentKind).find();
    const kindIds = new Map(kinds.map(({ name, id }) => [name, id]));
    refuseDisagreements([...disagreementsOf(plan), ...unknownKinds(plan, kindIds)]);
    const taken = () =>
      planProblems['edition-published-already'](`${plan.name} has an edition ${plan.edition} already.`);
    return translatingConstraints(
      () =>
        this.dataSource.transaction(async (manager) => {
          const { name, summary } = plan;
          await manager
            .createQueryBuilder()
            .insert()
            .into(Plan)
            .values({ name, summary })
            .orIgnore()
            .execute();
          const { id } = await manager.findOneByOrFail(Plan, { name });
          return writeEdition(manager, id, plan, kindIds, this.clock.now());
        }),
      { plan_edition_number_once: taken },
    );
  }

  /** For other features: the newest published edition of the plan with this name, or with any. */
  async newestEdition(planId: string): Promise<EditionContent> {
    const edition = await this.dataSource
      .getRepository(PlanEdition)
      .findOne({ where: { planId, publishedAt: Not(IsNull()) }, order: { number: 'DESC' } });
    if (!edition) throw notFound('plan');
    return this.content(edition.id);
  }

  /**
   * For other features: everything in a published edition.
   *
   * @param manager - of the caller's transaction, which reads on the connection it has and waits for no other.
   */
  async content(editionId: string, manager?: EntityManager): Promise<EditionContent> {
    const known =
      this.contents.get(editionId) ?? (await this.readContent(editionId, manager ?? this.dataSource.manager));
    this.contents.set(editionId, known);
    return known;
  }

  private async readContent(editionId: string, manager: EntityManager): Promise<EditionContent> {
    const edition = await manager.findOne(PlanEdition, {
      where: { id: editionId, publishedAt: Not(IsNull()) },
      relations: { plan: true },
    });
    if (!edition?.publishedAt) throw notFound('edition of a plan');
    const { id, planId, number, publishedAt, plan } = edition;
    const inEdition = { stage: { editionId } };
    const stages = await manager.find(Stage, { where: { editionId }, order: { position: 'ASC' } });
    const levelPoints = await manager.find(LevelPoint, {
      where: inEdition,
      order: { stage: { position: 'ASC' }, position: 'ASC' },
    });
    const checks = await manager.find(PlanCheck, { where: inEdition, order: { position: 'ASC' } });
    const byStage = new Map(stages.map((stage) => [stage.id, checks.filter((c) => c.stageId === stage.id)]));
    return { id, planId, planName: plan.name, number, publishedAt, stages, checks: byStage, levelPoints };
  }
}

function unknownKinds(plan: PlanDescription, kindIds: ReadonlyMap<string, string>): Disagreement[] {
  return placedMeasures(plan).flatMap(({ path, title, measure: { instrumentKind } }) =>
    instrumentKind === undefined || kindIds.has(instrumentKind)
      ? []
      : [
          {
            path,
            detail: `${title} asks for a kind of instrument the club does not have: ${instrumentKind}.`,
          },
        ],
  );
}

function refuseDisagreements(found: readonly Disagreement[]): void {
  const [first] = found;
  if (!first) return;
  const errors = found.map(({ path, detail }) => ({ pointer: `#/${path.replaceAll('.', '/')}`, detail }));
  throw planProblems['plan-does-not-meet'](first.detail, { errors });
}
