import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { PutWorksheetDto, WorksheetDto } from './dto/worksheet.dto';
import { WorksheetsService } from './worksheets.service';

@ApiTags('Builds')
@Controller('builds/:buildId')
export class WorksheetsController {
  constructor(private readonly worksheets: WorksheetsService) {}

  /** Calculations put on this build. */
  @Get('worksheets')
  @Access('signed-in')
  list(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
  ): Promise<WorksheetDto[]> {
    return this.worksheets.list(actor, buildId);
  }

  /** Puts a calculation of the level bench on a stage. */
  @Post('stages/:stageId/worksheets')
  @Access('signed-in')
  put(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('stageId', ParseIdPipe) stageId: string,
    @Body() body: PutWorksheetDto,
  ): Promise<WorksheetDto> {
    return this.worksheets.put(actor, buildId, stageId, body);
  }

  @Delete('worksheets/:worksheetId')
  @HttpCode(204)
  @Access('signed-in')
  takeBack(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('worksheetId', ParseIdPipe) worksheetId: string,
  ): Promise<void> {
    return this.worksheets.takeBack(actor, buildId, worksheetId);
  }
}
