import { Body, Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { PageQueryDto } from '../common/paging.dto';
import { MyDuesDto } from './dto/my-dues.dto';
import { AssignTierDto, CreateTierDto, PeopleOnTiersPageDto, TierDto } from './dto/tier.dto';
import { TreasurySummaryDto } from './dto/treasury.dto';
import { MyDuesService } from './my-dues.service';
import { TiersService } from './tiers.service';
import { TreasuryService } from './treasury.service';

@ApiTags('Dues')
@Controller()
export class DuesController {
  constructor(
    private readonly myDues: MyDuesService,
    private readonly tiers: TiersService,
    private readonly treasury: TreasuryService,
  ) {}

  /** The signed-in person's tier, payments and credit, and where to send a transfer. */
  @Get('dues/mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<MyDuesDto> {
    return this.myDues.mine(actor);
  }

  @Get('tiers')
  @Access({ roles: ['treasurer'] })
  list(@CurrentActor() actor: Actor): Promise<TierDto[]> {
    return this.tiers.list(actor);
  }

  @Post('tiers')
  @Access({ roles: ['treasurer'] })
  create(@CurrentActor() actor: Actor, @Body() tier: CreateTierDto): Promise<TierDto> {
    return this.tiers.create(actor, tier);
  }

  /** Who is on which tier, by name. */
  @Get('tiers/people')
  @Access({ roles: ['treasurer'] })
  people(@CurrentActor() actor: Actor, @Query() query: PageQueryDto): Promise<PeopleOnTiersPageDto> {
    return this.tiers.listPeople(actor, query);
  }

  /** Sets a person's tier from a day on. */
  @Post('tiers/assignments')
  @HttpCode(204)
  @Access({ roles: ['treasurer'] })
  assign(@CurrentActor() actor: Actor, @Body() assignment: AssignTierDto): Promise<void> {
    return this.tiers.assign(actor, assignment);
  }

  /** The four figures, the aged dues, and what the card service said that nobody acted on. */
  @Get('treasury/summary')
  @Access({ roles: ['treasurer'] })
  summary(@CurrentActor() actor: Actor): Promise<TreasurySummaryDto> {
    return this.treasury.summary(actor);
  }
}
