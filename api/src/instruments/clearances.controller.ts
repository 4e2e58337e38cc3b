import { Body, Controller, Delete, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { ClearancesService } from './clearances.service';
import {
  ClearanceDto,
  ClearancePageDto,
  GrantClearanceDto,
  ListClearancesQueryDto,
} from './dto/clearance.dto';

@ApiTags('Instruments')
@Controller('clearances')
export class ClearancesController {
  constructor(private readonly clearances: ClearancesService) {}

  /** Who is cleared on what. */
  @Get()
  @Access({ roles: ['steward', 'mentor'] })
  list(@CurrentActor() actor: Actor, @Query() query: ListClearancesQueryDto): Promise<ClearancePageDto> {
    return this.clearances.list(actor, query);
  }

  @Get('mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<ClearanceDto[]> {
    return this.clearances.mine(actor);
  }

  /** Clears somebody on a kind of instrument, or renews what they have. */
  @Post()
  @Access({ roles: ['steward'] })
  grant(@CurrentActor() actor: Actor, @Body() body: GrantClearanceDto): Promise<ClearanceDto> {
    return this.clearances.grant(actor, body);
  }

  @Delete(':clearanceId')
  @Access({ roles: ['steward'] })
  @HttpCode(204)
  end(@CurrentActor() actor: Actor, @Param('clearanceId', ParseIdPipe) clearanceId: string): Promise<void> {
    return this.clearances.end(actor, clearanceId);
  }
}
