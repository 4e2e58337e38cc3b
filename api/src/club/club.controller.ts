import { Body, Controller, Get, HttpCode, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ClubService } from './club.service';
import { ChooseRulesDto, ClubDto } from './dto/club.dto';

@ApiTags('Club')
@Controller('club')
export class ClubController {
  constructor(private readonly club: ClubService) {}

  /** The club's name, zone and currency. */
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
}
