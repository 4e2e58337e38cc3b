import { Injectable } from '@nestjs/common';
import {
  DataSource,
  In,
  IsNull,
  LessThan,
  MoreThan,
  type EntityManager,
  type FindOptionsWhere,
} from 'typeorm';
import type { Span } from '../bookings/bookings.service';
import { Resource } from '../instruments/resource.entity';
import { Stage } from '../plans/stage.entity';
import { BuildNight } from './build-night.entity';
import { BuildNightBench } from './build-night-bench.entity';
import { BuildNightMentor } from './build-night-mentor.entity';
import { BuildNightPlace } from './build-night-place.entity';
import { BuildNightStage } from './build-night-stage.entity';
import type { Duty } from './clash.rules';

/** A night with everything that hangs on it. */
export interface NightRecord {
  night: BuildNight;
  /** How many nights its series has; 0 for a night on its own. */
  seriesTotal: number;
  benches: BuildNightBench[];
  mentors: BuildNightMentor[];
  stages: BuildNightStage[];
  places: BuildNightPlace[];
}

@Injectable()
export class BuildNightsRepository {
  constructor(private readonly dataSource: DataSource) {}

  between(from: Date, to: Date): Promise<NightRecord[]> {
    return this.records({ endsAt: MoreThan(from), startsAt: LessThan(to) });
  }

  byIds(ids: readonly string[]): Promise<NightRecord[]> {
    return this.records({ id: In([...ids]) });
  }

  async byId(id: string, manager?: EntityManager): Promise<NightRecord | undefined> {
    const [record] = await this.records({ id }, manager);
    return record;
  }

  /** Benches that can be had, in the order of the page. */
  benches(): Promise<Resource[]> {
    return this.dataSource
      .getRepository(Resource)
      .find({ where: { kind: 'bench', retiredAt: IsNull() }, order: { position: 'ASC', tag: 'ASC' } });
  }

  stages(ids: readonly string[], manager: EntityManager = this.dataSource.manager): Promise<Stage[]> {
    return manager
      .getRepository(Stage)
      .find({ where: { id: In([...ids]) }, order: { position: 'ASC', id: 'ASC' } });
  }

  /** Who is on duty during any of the spans, on a night other than these. */
  duties(spans: readonly Span[], exceptNightIds: readonly string[] = []): Promise<Duty[]> {
    return this.dataSource.query<Duty[]>(FIND_DUTIES, [
      spans.map(({ startsAt }) => startsAt),
      spans.map(({ endsAt }) => endsAt),
      exceptNightIds,
    ]);
  }

  /** The night's row, which nobody else can change until the transaction ends. */
  async lock(manager: EntityManager, id: string): Promise<BuildNight | null> {
    return manager.findOne(BuildNight, { where: { id }, lock: { mode: 'for_no_key_update' } });
  }

  private async records(
    where: FindOptionsWhere<BuildNight>,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<NightRecord[]> {
    const nights = await manager.find(BuildNight, {
      where,
      relations: { series: true },
      order: { startsAt: 'ASC', id: 'ASC' },
    });
    const hangingOn = { where: { nightId: In(nights.map(({ id }) => id)) } };
    // One after the other: inside a transaction they share its one connection.
    const benches = await manager.find(BuildNightBench, {
      ...hangingOn,
      relations: { resource: true },
      order: { resource: { position: 'ASC', tag: 'ASC' } },
    });
    const mentors = await manager.find(BuildNightMentor, {
      ...hangingOn,
      relations: { person: true },
      order: { person: { name: 'ASC' } },
    });
    const stages = await manager.find(BuildNightStage, {
      ...hangingOn,
      relations: { stage: true },
      order: { stage: { position: 'ASC' } },
    });
    const places = await manager.find(BuildNightPlace, {
      ...hangingOn,
      relations: { person: true },
      order: { turn: 'ASC' },
    });
    const totals = await this.seriesTotals(manager, nights);
    const of = <T extends { nightId: string }>(rows: T[], night: BuildNight): T[] =>
      rows.filter((row) => row.nightId === night.id);
    return nights.map((night) => ({
      night,
      seriesTotal: totals.get(night.seriesId ?? '') ?? 0,
      benches: of(benches, night),
      mentors: of(mentors, night),
      stages: of(stages, night),
      places: of(places, night),
    }));
  }

  private async seriesTotals(
    manager: EntityManager,
    nights: readonly BuildNight[],
  ): Promise<Map<string, number>> {
    const ids = [...new Set(nights.map(({ seriesId }) => seriesId))].filter((id) => id !== null);
    const rows = await manager.query<{ seriesId: string; total: number }[]>(
      `SELECT series_id AS "seriesId", count(*)::integer AS total FROM build_night
       WHERE series_id = ANY ($1::uuid[]) GROUP BY series_id`,
      [ids],
    );
    return new Map(rows.map(({ seriesId, total }) => [seriesId, total]));
  }
}

const FIND_DUTIES = `
  SELECT (wanted.ordinal - 1)::integer AS "spanIndex", person.id AS "personId", person.name AS "personName",
         night.title, night.starts_at AS "startsAt", night.ends_at AS "endsAt"
  FROM unnest($1::timestamptz[], $2::timestamptz[]) WITH ORDINALITY AS wanted(starts_at, ends_at, ordinal)
  JOIN build_night_mentor duty
    ON duty.released_at IS NULL
   AND tstzrange(duty.starts_at, duty.ends_at) && tstzrange(wanted.starts_at, wanted.ends_at)
  JOIN build_night night ON night.id = duty.night_id
  JOIN person ON person.id = duty.person_id
  WHERE night.id <> ALL ($3::uuid[])
  ORDER BY wanted.ordinal, night.starts_at, person.name`;
