import { Injectable } from '@nestjs/common';
import { In, Not, type EntityManager } from 'typeorm';
import { BookingsService } from '../bookings/bookings.service';
import { BuildNight } from './build-night.entity';
import { BuildNightBench } from './build-night-bench.entity';
import { BuildNightMentor } from './build-night-mentor.entity';
import { BuildNightPlace } from './build-night-place.entity';
import { BuildNightSeries } from './build-night-series.entity';
import { BuildNightStage } from './build-night-stage.entity';
import type { ChangedNight } from './change.rules';
import { nightName } from './night-words.rules';
import type { WantedNight } from './plan.rules';

/** What all nights of one planning have in common. */
export interface NightBasics {
  title: string;
  places: number;
  note: string;
  /** Of a series. */
  rule: string | null;
  stageIds: readonly string[];
  madeById: string;
  madeAt: Date;
}

/** Writes planned nights down: the night, its benches in the bench book, who is on duty, what it is about. */
@Injectable()
export class NightWriter {
  constructor(private readonly bookings: BookingsService) {}

  async write(
    manager: EntityManager,
    basics: NightBasics,
    wanted: readonly WantedNight[],
  ): Promise<BuildNight[]> {
    await this.lockMentors(manager, wanted);
    const seriesId = await this.writeSeries(manager, basics);
    const { title, places, note, madeById, madeAt } = basics;
    const numbered = wanted.map((night, index) => ({
      ...night,
      number: seriesId === null ? null : index + 1,
    }));
    const bookingIds = await this.reserve(manager, basics, numbered);
    const made = await manager.save(
      BuildNight,
      numbered.map(({ startsAt, endsAt, number, date }) => ({
        ...{ seriesId, number, title, places, note, madeById, madeAt, startsAt, endsAt },
        ...{ bookingId: bookingIds.get(date) ?? null, cancelledAt: null, cancelledReason: null },
      })),
    );
    await this.hangOn(manager, made, wanted, basics.stageIds);
    return made;
  }

  /** Makes a night, whose row is locked, what it is to be. */
  async rewrite(manager: EntityManager, night: BuildNight, after: ChangedNight, byId: string): Promise<void> {
    await this.lockMentors(manager, [after]);
    const bookingId = await this.rebook(manager, night, after, byId);
    const { title, places, note, startsAt, endsAt } = after;
    await manager.delete(BuildNightMentor, { nightId: night.id, personId: Not(In(after.mentorIds)) });
    await manager.update(BuildNight, { id: night.id }, { title, places, note, startsAt, endsAt, bookingId });
    await manager.delete(BuildNightBench, { nightId: night.id });
    await manager.delete(BuildNightStage, { nightId: night.id });
    // Whoever is on duty is expected anyway, and takes nobody's place.
    await manager.delete(BuildNightPlace, { nightId: night.id, personId: In(after.mentorIds) });
    const moved = { ...night, startsAt, endsAt };
    const staying = await manager.findBy(BuildNightMentor, { nightId: night.id });
    const added = after.mentorIds.filter((id) => !staying.some(({ personId }) => personId === id));
    await this.hangOn(manager, [moved], [{ ...after, mentorIds: added }], after.stageIds);
  }

  /** @returns the booking that holds the benches now, if there are any. */
  private async rebook(
    manager: EntityManager,
    { bookingId, number }: BuildNight,
    { startsAt, endsAt, benchIds, title, isHeldOtherwise }: ChangedNight,
    personId: string,
  ): Promise<string | null> {
    const name = nightName({ title, number });
    if (!isHeldOtherwise) {
      // The same benches at the same times: also those that were retired since stay with the night.
      if (bookingId) await this.bookings.renameForNight(manager, bookingId, name);
      return bookingId;
    }
    const held = { startsAt, endsAt, resourceIds: benchIds, title: name };
    if (benchIds.length === 0) {
      if (bookingId) await this.bookings.releaseForNight(manager, bookingId, personId);
      return null;
    }
    if (!bookingId) return this.bookings.reserveForNight(manager, { ...held, personId });
    await this.bookings.moveForNight(manager, bookingId, held);
    return bookingId;
  }

  /**
   * Queues up for the mentors, in the order of their ids, before any constraint is touched: two plans for the same
   * people then wait for each other and do not deadlock.
   */
  private async lockMentors(
    manager: EntityManager,
    wanted: readonly Pick<WantedNight, 'mentorIds'>[],
  ): Promise<void> {
    await manager.query(`SELECT 1 FROM person WHERE id = ANY ($1::uuid[]) ORDER BY id FOR NO KEY UPDATE`, [
      wanted.flatMap(({ mentorIds }) => mentorIds),
    ]);
  }

  private async writeSeries(
    manager: EntityManager,
    { rule, title, madeById, madeAt }: NightBasics,
  ): Promise<string | null> {
    if (rule === null) return null;
    const { id } = await manager.save(BuildNightSeries, { title, rule, madeById, madeAt });
    return id;
  }

  /** @returns the booking of each night that has benches, by its day. */
  private async reserve(
    manager: EntityManager,
    { title, madeById }: NightBasics,
    nights: readonly (WantedNight & { number: number | null })[],
  ): Promise<Map<string, string>> {
    const atBenches = nights.filter(({ benchIds }) => benchIds.length > 0);
    if (atBenches.length === 0) return new Map();
    const ids = await this.bookings.reserveForNights(
      manager,
      atBenches.map(({ startsAt, endsAt, benchIds, number }) => ({
        ...{ startsAt, endsAt, resourceIds: benchIds },
        ...{ personId: madeById, title: nightName({ title, number }) },
      })),
    );
    return new Map(atBenches.map(({ date }, index) => [date, ids[index] ?? '']));
  }

  private async hangOn(
    manager: EntityManager,
    made: readonly BuildNight[],
    wanted: readonly WantedNight[],
    stageIds: readonly string[],
  ): Promise<void> {
    const each = <T>(row: (night: BuildNight, plan: WantedNight) => T[]): T[] =>
      made.flatMap((night, index) => row(night, wanted[index] as WantedNight));
    await manager.insert(
      BuildNightMentor,
      each(({ id: nightId, startsAt, endsAt }, { mentorIds }) =>
        mentorIds.map((personId) => ({ nightId, personId, startsAt, endsAt, releasedAt: null })),
      ),
    );
    await manager.insert(
      BuildNightBench,
      each(({ id: nightId }, { benchIds }) => benchIds.map((resourceId) => ({ nightId, resourceId }))),
    );
    await manager.insert(
      BuildNightStage,
      each(({ id: nightId }) => stageIds.map((stageId) => ({ nightId, stageId }))),
    );
  }
}
