import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { ListPeopleQueryDto, PeoplePageDto } from './dto/list-people.dto';
import { PersonDto } from './dto/person.dto';
import { PeopleService } from './people.service';

@ApiTags('People')
@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleService) {}

  /** Everybody of the club, by name. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: ListPeopleQueryDto): Promise<PeoplePageDto> {
    return this.people.list(actor, query);
  }

  @Get(':personId')
  @Access('signed-in')
  show(@CurrentActor() actor: Actor, @Param('personId', ParseIdPipe) personId: string): Promise<PersonDto> {
    return this.people.show(actor, personId);
  }
}
