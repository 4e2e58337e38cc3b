import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { BuildNightsService } from './build-nights.service';
import { BuildNightDetailDto, BuildNightsDto } from './dto/build-night.dto';
import { CancelNightDto, ChangeNightDto } from './dto/change-night.dto';
import { ListNightsQueryDto } from './dto/list-nights.dto';
import { PlanNightsDto, PreviewNightsDto } from './dto/plan-nights.dto';
import { NightsPreviewDto, ScheduledNightsDto } from './dto/planned-nights.dto';
import { NightChangesService } from './night-changes.service';
import { PlacesService } from './places.service';
import { PlanningService } from './planning.service';

@ApiTags('Build nights')
@Controller('build-nights')
export class BuildNightsController {
  constructor(
    private readonly nights: BuildNightsService,
    private readonly planning: PlanningService,
    private readonly changes: NightChangesService,
    private readonly places: PlacesService,
  ) {}

  /** The nights of a stretch of time, at most 100 days, earliest first; cancelled ones among them. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: ListNightsQueryDto): Promise<BuildNightsDto> {
    return this.nights.list(actor, query);
  }

  /**
   * Schedules one night or a series, whole or not at all. When a bench or a mentor is taken on any date, nothing is
   * made and the answer is 409 `night-clash` with `clashes`: each date, the reasons, and what would make it clear.
   * Send it again with those dates in `skip`, or with other benches or mentors for them in `instead`.
   */
  @Post()
  @Access({ roles: ['mentor'] })
  schedule(@CurrentActor() actor: Actor, @Body() body: PlanNightsDto): Promise<ScheduledNightsDto> {
    return this.planning.schedule(actor, body);
  }

  /** What scheduling this would meet, date by date. Nothing is kept. */
  @Post('preview')
  @HttpCode(200)
  @Access({ roles: ['mentor'] })
  preview(@CurrentActor() actor: Actor, @Body() body: PreviewNightsDto): Promise<NightsPreviewDto> {
    return this.planning.preview(actor, body);
  }

  /** One night with the names of who is coming and who waits. */
  @Get(':id')
  @Access('signed-in')
  show(@CurrentActor() actor: Actor, @Param('id', ParseIdPipe) id: string): Promise<BuildNightDetailDto> {
    return this.nights.show(actor, id);
  }

  /** Changes one night; what is left out stays. Other times are told to everybody who is coming or waiting. */
  @Patch(':id')
  @Access({ roles: ['mentor'] })
  change(
    @CurrentActor() actor: Actor,
    @Param('id', ParseIdPipe) id: string,
    @Body() body: ChangeNightDto,
  ): Promise<BuildNightDetailDto> {
    return this.changes.change(actor, id, body);
  }

  /** Cancels one night with a word, which goes to everybody who was coming, waiting or on duty. */
  @Post(':id/cancel')
  @HttpCode(200)
  @Access({ roles: ['mentor'] })
  cancel(
    @CurrentActor() actor: Actor,
    @Param('id', ParseIdPipe) id: string,
    @Body() body: CancelNightDto,
  ): Promise<BuildNightDetailDto> {
    return this.changes.cancel(actor, id, body);
  }

  /** Says that the caller is coming: a place, or the end of the waiting list when the night is full. */
  @Post(':id/coming')
  @HttpCode(200)
  @Access('signed-in')
  come(@CurrentActor() actor: Actor, @Param('id', ParseIdPipe) id: string): Promise<BuildNightDetailDto> {
    return this.places.come(actor, id);
  }

  /** Says that the caller is not coming after all; the first in the waiting list moves up. */
  @Delete(':id/coming')
  @HttpCode(200)
  @Access('signed-in')
  stayAway(@CurrentActor() actor: Actor, @Param('id', ParseIdPipe) id: string): Promise<BuildNightDetailDto> {
    return this.places.stayAway(actor, id);
  }
}
