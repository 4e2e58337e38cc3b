import { Controller, Get, Param, ParseIntPipe, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe, unreadablePart } from '../common/parse-id.pipe';
import { PlanEditionDto } from './dto/plan-edition.dto';
import { ListPlansQueryDto, PlansPageDto } from './dto/plan.dto';
import { PlansService } from './plans.service';

const EDITION_NUMBER = new ParseIntPipe({
  exceptionFactory: () => unreadablePart('number', 'a whole number'),
});

@ApiTags('Plans')
@Controller('plans')
export class PlansController {
  constructor(private readonly plans: PlansService) {}

  /** The club's plans, by name. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: ListPlansQueryDto): Promise<PlansPageDto> {
    return this.plans.list(actor, query);
  }

  /** One published edition, whole; it never changes. */
  @Get(':planId/editions/:number')
  @Access('signed-in')
  show(
    @CurrentActor() actor: Actor,
    @Param('planId', ParseIdPipe) planId: string,
    @Param('number', EDITION_NUMBER) number: number,
  ): Promise<PlanEditionDto> {
    return this.plans.show(actor, planId, number);
  }
}
