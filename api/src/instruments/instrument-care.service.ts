import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { ClubService } from '../club/club.service';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError, notFound } from '../common/common.errors';
import { clubDay, addDays } from '../common/club-day';
import type { ChangeCalibrationDto, ChangeConditionDto } from './dto/change-instrument.dto';
import { InstrumentChange } from './instrument-change.entity';
import { Instrument } from './instrument.entity';
import { Resource } from './resource.entity';

/** Longer than any calibration holds; a later day is a slip of the keyboard. */
const LONGEST_CALIBRATION_DAYS = 3660;

type Change = Pick<InstrumentChange, 'changed' | 'before' | 'after' | 'note'>;

/** What stewards do to instruments; each act leaves a line in the instrument's history. */
@Injectable()
export class InstrumentCareService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async changeCondition(
    actor: Actor,
    instrumentId: string,
    { condition, note }: ChangeConditionDto,
  ): Promise<void> {
    requireRole(actor, 'steward');
    await this.dataSource.transaction(async (manager) => {
      const instrument = await this.locked(manager, instrumentId);
      // A note on a ready instrument is what to mind; what had been wrong stays in the history only.
      await manager
        .getRepository(Instrument)
        .update({ resourceId: instrumentId }, { condition, conditionNote: note });
      const { condition: before } = instrument;
      await this.record(manager, actor, instrumentId, {
        changed: 'condition',
        before,
        after: condition,
        note,
      });
    });
  }

  async changeCalibration(
    actor: Actor,
    instrumentId: string,
    { dueOn, note }: ChangeCalibrationDto,
  ): Promise<void> {
    requireRole(actor, 'steward');
    const today = clubDay(this.clock.now(), (await this.club.settings()).timeZone);
    if (dueOn < today || dueOn > addDays(today, LONGEST_CALIBRATION_DAYS))
      throw fieldError('dueOn', 'The last good day lies between today and ten years from now.');
    await this.dataSource.transaction(async (manager) => {
      const { calibrationDueOn: before } = await this.locked(manager, instrumentId);
      await manager
        .getRepository(Instrument)
        .update({ resourceId: instrumentId }, { calibrationDueOn: dueOn });
      await this.record(manager, actor, instrumentId, { changed: 'calibration', before, after: dueOn, note });
    });
  }

  /** Takes the lock that bookings take, so that no booking slips in between the look and the change. */
  private async locked(manager: EntityManager, instrumentId: string): Promise<Instrument> {
    await manager
      .getRepository(Resource)
      .findOne({ where: { id: instrumentId }, lock: { mode: 'for_no_key_update' } });
    const instrument = await manager.getRepository(Instrument).findOneBy({ resourceId: instrumentId });
    if (!instrument) throw notFound('instrument');
    return instrument;
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    instrumentId: string,
    change: Change,
  ): Promise<void> {
    const who = { changedById: actor.personId, changedAt: this.clock.now() };
    await manager.getRepository(InstrumentChange).insert({ ...change, ...who, instrumentId });
  }
}
