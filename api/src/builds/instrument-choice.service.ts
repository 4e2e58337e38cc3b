import { Injectable } from '@nestjs/common';
import { DataSource, IsNull, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError, notFound } from '../common/common.errors';
import { figuresOf, Instrument } from '../instruments/instrument.entity';
import { InstrumentKind } from '../instruments/instrument-kind.entity';
import { InstrumentUseService, lower } from '../instruments/instrument-use.service';
import type { PlanCheck } from '../plans/plan-check.entity';
import { PlansService } from '../plans/plans.service';
import { requireSight } from './build-access';
import { findCheck } from './build-record';
import { BuildRecordsService } from './build-records.service';
import type { InstrumentChoiceDto } from './dto/evidence.dto';

/** Which instruments a check may be taken with, and why not with the others. */
@Injectable()
export class InstrumentChoiceService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly records: BuildRecordsService,
    private readonly use: InstrumentUseService,
    private readonly clock: Clock,
  ) {}

  /** Every instrument of the kind the check asks for, those that may be used first. */
  async list(actor: Actor, buildId: string, checkId: string): Promise<InstrumentChoiceDto[]> {
    requireMember(actor);
    const build = requireSight(actor, await this.records.find(buildId));
    const found = findCheck(await this.plans.content(build.editionId), checkId);
    if (!found) throw notFound('check');
    const { instrumentKindId } = found.check;
    if (instrumentKindId === null) return [];
    const instruments = await this.dataSource.getRepository(Instrument).find({
      where: { kindId: instrumentKindId, resource: { retiredAt: IsNull() } },
      relations: { resource: true, kind: true },
      order: { resource: { position: 'ASC', tag: 'ASC' } },
    });
    const ids = instruments.map(({ resourceId }) => resourceId);
    const { reasons } = await this.use.judge(
      this.dataSource.manager,
      build.personId,
      ids,
      after(this.clock.now()),
    );
    return instruments
      .map((instrument) => choiceDto(instrument, reasons.get(instrument.resourceId)?.[0]?.reason ?? null))
      .sort((one, other) => Number(one.reason !== null) - Number(other.reason !== null));
  }

  /** A level is nothing without what it was read on. @throws DomainError `invalid-input` on `instrumentId` */
  async askFor(manager: EntityManager, kindId: string): Promise<never> {
    const { name } = await manager.findOneByOrFail(InstrumentKind, { id: kindId });
    throw fieldError('instrumentId', `Choose the ${lower(name)} it was read on.`);
  }

  /**
   * The instrument a reading was taken with, fit on the day it was taken.
   *
   * @throws DomainError `invalid-input` on `instrumentId`, with the reason
   */
  async fitFor(
    manager: EntityManager,
    personId: string,
    check: PlanCheck,
    instrumentId: string,
    takenAt: Date,
  ): Promise<Instrument> {
    const instrument = await manager.findOne(Instrument, {
      where: { resourceId: instrumentId, resource: { retiredAt: IsNull() } },
      relations: { resource: true, kind: true },
    });
    if (!instrument) throw fieldError('instrumentId', 'There is no such instrument.');
    // By the row's own spelling of its id: the database takes any, the reasons are kept under one.
    const { resource, kind, resourceId } = instrument;
    const isOfKind = check.instrumentKindId === null || check.instrumentKindId === instrument.kindId;
    if (!isOfKind) throw fieldError('instrumentId', `${resource.tag} is of another kind: ${kind.name}.`);
    const { reasons } = await this.use.judge(manager, personId, [resourceId], after(takenAt));
    const against = reasons.get(resourceId)?.[0];
    if (against) throw fieldError('instrumentId', `${against.reason} ${against.remedy}`);
    return instrument;
  }
}

/** A reading is taken in one moment; its day is that moment's. */
function after(instant: Date): Date {
  return new Date(instant.getTime() + 1);
}

function choiceDto(instrument: Instrument, reason: string | null): InstrumentChoiceDto {
  const { resource, kind, calibrationDueOn, damageLevelDbm } = instrument;
  const { id, tag, name } = resource;
  return {
    id,
    tag,
    name,
    kind: kind.name,
    reason,
    calibrationDueOn,
    damageLevelDbm,
    figures: figuresOf(instrument),
  };
}
