import { Body, Controller, Get, HttpCode, Param, Post, Query, UploadedFile } from '@nestjs/common';
import { ApiBody, ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { TakesFile } from '../common/one-file';
import { PageQueryDto } from '../common/paging.dto';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { MatchLineDto } from './dto/match-line.dto';
import { StatementDetailDto, StatementDto, StatementLineDto, StatementsPageDto } from './dto/statement.dto';
import { ReconciliationService } from './reconciliation.service';
import type { UploadedStatement } from './statement-file';
import { StatementImportService } from './statement-import.service';

const LARGEST_BYTES = 1024 * 1024;

@ApiTags('Reconciliation')
@Controller()
export class ReconciliationController {
  constructor(
    private readonly reconciliation: ReconciliationService,
    private readonly imports: StatementImportService,
  ) {}

  /**
   * Imports a statement of the current account: CSV in UTF-8, a heading with date, description, amount and balance,
   * at most 1 MB. Taken whole or not at all; a line imported before is not counted again.
   */
  @Post('statements')
  @Access({ roles: ['treasurer'] })
  @ApiBody({
    schema: {
      type: 'object',
      required: ['file'],
      properties: { file: { type: 'string', format: 'binary' } },
    },
  })
  @TakesFile('file', { bytes: LARGEST_BYTES })
  import(
    @CurrentActor() actor: Actor,
    @UploadedFile() file: UploadedStatement | undefined,
  ): Promise<StatementDto> {
    return this.imports.import(actor, file);
  }

  /** Latest first. */
  @Get('reconciliation/statements')
  @Access({ roles: ['treasurer'] })
  list(@CurrentActor() actor: Actor, @Query() query: PageQueryDto): Promise<StatementsPageDto> {
    return this.reconciliation.list(actor, query);
  }

  @Get('reconciliation/statements/:statementId')
  @Access({ roles: ['treasurer'] })
  show(
    @CurrentActor() actor: Actor,
    @Param('statementId', ParseIdPipe) statementId: string,
  ): Promise<StatementDetailDto> {
    return this.reconciliation.show(actor, statementId);
  }

  /** Settles a line by hand: by invoices, by a payment written down before, or against an account. */
  @Post('reconciliation/lines/:lineId/match')
  @HttpCode(200)
  @Access({ roles: ['treasurer'] })
  match(
    @CurrentActor() actor: Actor,
    @Param('lineId', ParseIdPipe) lineId: string,
    @Body() choice: MatchLineDto,
  ): Promise<StatementLineDto> {
    return this.reconciliation.match(actor, lineId, choice);
  }

  @Post('reconciliation/lines/:lineId/take-back')
  @HttpCode(200)
  @Access({ roles: ['treasurer'] })
  takeBack(
    @CurrentActor() actor: Actor,
    @Param('lineId', ParseIdPipe) lineId: string,
  ): Promise<StatementLineDto> {
    return this.reconciliation.takeBack(actor, lineId);
  }
}
