import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, type EntityManager } from 'typeorm';
import { PeopleService } from '../people/people.service';
import type { Person } from '../people/person.entity';
import { PlansService } from '../plans/plans.service';
import type { BuildOutline, BuildRecord } from './build-record';
import { Build } from './build.entity';
import { BuildStage } from './build-stage.entity';
import { BuildStageEvent } from './build-stage-event.entity';
import { CheckMark } from './check-mark.entity';
import { Photo } from './photo.entity';
import { Reading } from './reading.entity';

/** Reads whole builds, in as many queries for one as for many. Checks no access: its callers do. */
@Injectable()
export class BuildRecordsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly people: PeopleService,
  ) {}

  async find(buildId: string, manager = this.dataSource.manager): Promise<Build | null> {
    return manager.findOneBy(Build, { id: buildId });
  }

  /**
   * The build, held until the transaction ends: whatever is written to one build is written in turn, so that no decision
   * is taken on what another request is about to change.
   */
  async hold(manager: EntityManager, buildId: string): Promise<Build | null> {
    return manager.findOne(Build, { where: { id: buildId }, lock: { mode: 'for_no_key_update' } });
  }

  async readOne(build: Build, manager = this.dataSource.manager): Promise<BuildRecord> {
    const [record] = await this.read([build], manager);
    if (!record) throw new Error('A build was read as none.');
    return record;
  }

  async read(builds: readonly Build[], manager = this.dataSource.manager): Promise<BuildRecord[]> {
    const buildId = In(builds.map(({ id }) => id));
    const stages = await manager.find(BuildStage, { where: { buildId } });
    const events = await manager.find(BuildStageEvent, { where: { buildId }, order: { position: 'ASC' } });
    const readings = await manager.find(Reading, {
      where: { buildId },
      order: { takenAt: 'ASC', sequence: 'ASC' },
    });
    const standing = { where: { buildId, takenBackAt: IsNull() }, order: { at: 'ASC', id: 'ASC' } } as const;
    const marks = await manager.find(CheckMark, standing);
    const photos = await manager.find(Photo, standing);
    const own = <T extends { buildId: string }>(rows: readonly T[], { id }: Build): T[] =>
      rows.filter((row) => row.buildId === id);
    const records: BuildRecord[] = [];
    for (const build of builds) {
      records.push({
        build,
        edition: await this.plans.content(build.editionId, manager),
        states: new Map(own(stages, build).map(({ stageId, state }) => [stageId, state])),
        events: own(events, build),
        readings: own(readings, build),
        marks: own(marks, build),
        photos: own(photos, build),
      });
    }
    return records;
  }

  /** How far these builds are: nothing of what is in them is read. */
  async outlines(builds: readonly Build[]): Promise<BuildOutline[]> {
    const stages = await this.dataSource
      .getRepository(BuildStage)
      .findBy({ buildId: In(builds.map(({ id }) => id)) });
    const outlines: BuildOutline[] = [];
    for (const build of builds) {
      const own = stages.filter(({ buildId }) => buildId === build.id);
      const states = new Map(own.map(({ stageId, state }) => [stageId, state]));
      outlines.push({ build, edition: await this.plans.content(build.editionId), states });
    }
    return outlines;
  }

  /** Everybody a record names. */
  async peopleIn(records: readonly BuildRecord[], manager?: EntityManager): Promise<Map<string, Person>> {
    const ids = records.flatMap(({ build, events, marks }) => [
      build.personId,
      ...[...events, ...marks].map(({ byPersonId }) => byPersonId),
    ]);
    return this.people.byIds(ids, manager);
  }
}
