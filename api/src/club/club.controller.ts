import { Body, Controller, Get, HttpCode, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ClubService } from './club.service';
import { ChooseRulesDto, ClubDto } from './dto/club.dto';
import { SetOpeningHoursDto } from './dto/opening-hours.dto';
import { OpeningHoursService } from './opening-hours.service';

@ApiTags('Club')
@Controller('club')
export class ClubController {
  constructor(
    private readonly club: ClubService,
    private readonly hours: OpeningHoursService,
  ) {}

  /** The club's name, zone, currency and opening hours. */
  @Get()
  @Access('public')
  front(): Promise<ClubDto> {
    return this.club.front();
  }

  /** Chooses by which rules the calculators judge what may be sent. */
  @Put('rules')
  @HttpCode(204)
  @Access({ roles: ['organiser'] })
  chooseRules(@CurrentActor() actor: Actor, @Body() body: ChooseRulesDto): Promise<void> {
    return this.club.chooseRules(actor, body);
  }

  /** Says when the workshop is open, the whole week at once. */
  @Put('opening-hours')
  @HttpCode(204)
  @Access({ roles: ['organiser'] })
  setOpeningHours(@CurrentActor() actor: Actor, @Body() body: SetOpeningHoursDto): Promise<void> {
    return this.hours.set(actor, body);
  }
}
