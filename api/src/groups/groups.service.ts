import { Injectable } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { skipOf, type PageQueryDto } from '../common/paging.dto';
import { BuildGroup, BuildGroupMember } from './build-group.entity';
import { groupDto, type GroupDto, type GroupPageDto } from './dto/group.dto';

export interface NewGroup {
  name: string;
  about: string;
  memberIds: readonly string[];
}

@Injectable()
export class GroupsService {
  constructor(private readonly dataSource: DataSource) {}

  async list(actor: Actor, query: PageQueryDto): Promise<GroupPageDto> {
    requireMember(actor);
    const { page, perPage } = query;
    const [groups, total] = await this.dataSource.getRepository(BuildGroup).findAndCount({
      order: { name: 'ASC', id: 'ASC' },
      skip: skipOf(query),
      take: perPage,
    });
    return { items: await this.withMembers(groups, actor), total, page, perPage };
  }

  async mine(actor: Actor): Promise<GroupDto[]> {
    requireMember(actor);
    const groups = await this.dataSource
      .getRepository(BuildGroup)
      .createQueryBuilder('one')
      .innerJoin(BuildGroupMember, 'member', 'member.group_id = one.id AND member.person_id = :personId', {
        personId: actor.personId,
      })
      .orderBy('one.name')
      .getMany();
    return this.withMembers(groups, actor);
  }

  /** For other features: is this person in the group? Also false for a group that is not there. */
  async isMember(manager: EntityManager, groupId: string, personId: string): Promise<boolean> {
    return manager.getRepository(BuildGroupMember).existsBy({ groupId, personId });
  }

  /** For first set-up and seeds. */
  async form({ name, about, memberIds }: NewGroup): Promise<BuildGroup> {
    return this.dataSource.transaction(async (manager) => {
      const group = await manager.getRepository(BuildGroup).save({ name, about });
      const members = memberIds.map((personId) => ({ groupId: group.id, personId }));
      await manager.getRepository(BuildGroupMember).insert(members);
      return group;
    });
  }

  private async withMembers(groups: BuildGroup[], actor: Actor): Promise<GroupDto[]> {
    const rows = await this.dataSource.getRepository(BuildGroupMember).find({
      where: { groupId: In(groups.map(({ id }) => id)) },
      relations: { person: true },
      order: { person: { name: 'ASC', id: 'ASC' } },
    });
    const membersOf = (groupId: string) =>
      rows
        .filter((row) => row.groupId === groupId)
        .map(({ personId, person }) => ({ personId, name: person.name }));
    return groups.map((group) => groupDto(group, membersOf(group.id), actor.personId));
  }
}
