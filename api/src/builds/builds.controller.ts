import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { BuildsService } from './builds.service';
import { BuildSummaryDto } from './dto/build-summary.dto';
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

  /** How far one's own builds are: the states of their stages, and nothing of what is in them. */
  @Get('mine/summary')
  @Access('signed-in')
  mySummaries(@CurrentActor() actor: Actor): Promise<BuildSummaryDto[]> {
    return this.builds.mySummaries(actor);
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
}
