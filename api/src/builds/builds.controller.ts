import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { BuildsService } from './builds.service';
import { BuildDto, StartBuildDto } from './dto/build.dto';

@ApiTags('Builds')
@Controller('builds')
export class BuildsController {
  constructor(private readonly builds: BuildsService) {}

  /** One's own builds with everything in them, the newest first. */
  @Get('mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<BuildDto[]> {
    return this.builds.mine(actor);
  }

  /** Begins a build to the newest edition of a plan. */
  @Post()
  @Access('signed-in')
  start(@CurrentActor() actor: Actor, @Body() body: StartBuildDto): Promise<BuildDto> {
    return this.builds.start(actor, body);
  }

  /** A build, for its builder and for mentors. */
  @Get(':buildId')
  @Access('signed-in')
  show(@CurrentActor() actor: Actor, @Param('buildId', ParseIdPipe) buildId: string): Promise<BuildDto> {
    return this.builds.show(actor, buildId);
  }

  /** Says that the builder's licence was seen, which opens the last stage. */
  @Post(':buildId/licence')
  @HttpCode(204)
  @Access({ roles: ['organiser'] })
  seeLicence(@CurrentActor() actor: Actor, @Param('buildId', ParseIdPipe) buildId: string): Promise<void> {
    return this.builds.seeLicence(actor, buildId);
  }
}
