import { Injectable } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { requireBuilder, requireSight } from './build-access';
import { BuildRecordsService } from './build-records.service';
import { BuildStage } from './build-stage.entity';
import { buildProblems } from './builds.errors';
import { worksheetDto, type PutWorksheetDto, type WorksheetDto } from './dto/worksheet.dto';
import { Worksheet } from './worksheet.entity';

/** On one stage; a mentor reads them all. */
const MOST_WORKSHEETS = 12;

/** Calculations put on a build: by its builder, for its builder and the mentors to read. */
@Injectable()
export class WorksheetsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly records: BuildRecordsService,
    private readonly clock: Clock,
  ) {}

  /** The newest first. */
  async list(actor: Actor, buildId: string): Promise<WorksheetDto[]> {
    requireMember(actor);
    requireSight(actor, await this.records.find(buildId));
    const found = await this.dataSource
      .getRepository(Worksheet)
      .find({ where: { buildId, takenBackAt: IsNull() }, order: { at: 'DESC', id: 'ASC' } });
    return found.map(worksheetDto);
  }

  /** @throws DomainError `not-found` for a stage that is not of this build, `worksheets-enough` (409) */
  async put(actor: Actor, buildId: string, stageId: string, body: PutWorksheetDto): Promise<WorksheetDto> {
    requireMember(actor);
    const { family, inputs, result } = body;
    return this.dataSource.transaction(async (manager) => {
      requireBuilder(actor, await this.records.hold(manager, buildId));
      if (!(await manager.existsBy(BuildStage, { buildId, stageId }))) throw notFound('stage');
      if ((await manager.countBy(Worksheet, { buildId, stageId, takenBackAt: IsNull() })) >= MOST_WORKSHEETS)
        throw buildProblems['worksheets-enough'](
          `This stage has ${MOST_WORKSHEETS} calculations, which is as many as it takes. Take one of them back on the stage's page first. Nothing was kept.`,
        );
      const at = this.clock.now();
      const put = manager.create(Worksheet, {
        buildId,
        stageId,
        family,
        inputs,
        result,
        at,
        takenBackAt: null,
      });
      return worksheetDto(await manager.save(put));
    });
  }

  /** It leaves the page and stays in the record. */
  async takeBack(actor: Actor, buildId: string, worksheetId: string): Promise<void> {
    requireMember(actor);
    requireBuilder(actor, await this.records.find(buildId));
    const { affected } = await this.dataSource
      .getRepository(Worksheet)
      .update({ id: worksheetId, buildId, takenBackAt: IsNull() }, { takenBackAt: this.clock.now() });
    if (!affected) throw notFound('worksheet');
  }
}
