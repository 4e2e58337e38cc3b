import { Injectable } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { requireBuilder, requireSight } from './build-access';
import { BuildRecordsService } from './build-records.service';
import { BuildStage } from './build-stage.entity';
import { worksheetDto, type PutWorksheetDto, type WorksheetDto } from './dto/worksheet.dto';
import { Worksheet } from './worksheet.entity';

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

  /** @throws DomainError `not-found` for a stage that is not of this build */
  async put(actor: Actor, buildId: string, stageId: string, body: PutWorksheetDto): Promise<WorksheetDto> {
    requireMember(actor);
    requireBuilder(actor, await this.records.find(buildId));
    if (!(await this.dataSource.getRepository(BuildStage).existsBy({ buildId, stageId })))
      throw notFound('stage');
    const worksheets = this.dataSource.getRepository(Worksheet);
    const { family, inputs, result } = body;
    const at = this.clock.now();
    return worksheetDto(
      await worksheets.save(
        worksheets.create({ buildId, stageId, family, inputs, result, at, takenBackAt: null }),
      ),
    );
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
