import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { PageQueryDto } from '../common/paging.dto';
import { GroupDto, GroupPageDto } from './dto/group.dto';
import { GroupsService } from './groups.service';

@ApiTags('Groups')
@Controller('groups')
export class GroupsController {
  constructor(private readonly groups: GroupsService) {}

  /** Every group of the club with its members. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: PageQueryDto): Promise<GroupPageDto> {
    return this.groups.list(actor, query);
  }

  @Get('mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<GroupDto[]> {
    return this.groups.mine(actor);
  }
}
