import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { LicenceDto } from './dto/licence.dto';
import { LicencesService } from './licences.service';

@ApiTags('Builds')
@Controller()
export class LicencesController {
  constructor(private readonly licences: LicencesService) {}

  /** Builds under way, and whose licence was seen. */
  @Get('licences')
  @Access({ roles: ['organiser'] })
  list(@CurrentActor() actor: Actor): Promise<LicenceDto[]> {
    return this.licences.list(actor);
  }

  /** Says that the builder's licence was seen, which opens the last stage. */
  @Post('builds/:buildId/licence')
  @HttpCode(204)
  @Access({ roles: ['organiser'] })
  see(@CurrentActor() actor: Actor, @Param('buildId', ParseIdPipe) buildId: string): Promise<void> {
    return this.licences.see(actor, buildId);
  }
}
