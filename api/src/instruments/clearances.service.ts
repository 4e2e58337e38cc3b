import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, Repository, type EntityManager } from 'typeorm';
import { InjectRepository } from '@nestjs/typeorm';
import { ClubService } from '../club/club.service';
import { requireMember, requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { fieldError, notFound } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { skipOf } from '../common/paging.dto';
import { clubDay } from '../common/club-day';
import { PeopleService } from '../people/people.service';
import { Clearance } from './clearance.entity';
import {
  clearanceDto,
  type ClearanceDto,
  type ClearancePageDto,
  type GrantClearanceDto,
  type ListClearancesQueryDto,
} from './dto/clearance.dto';
import { InstrumentKind } from './instrument-kind.entity';
import { instrumentProblems } from './instruments.errors';

const NAMED = { person: true, kind: true, grantedBy: true } as const;

@Injectable()
export class ClearancesService {
  constructor(
    @InjectRepository(Clearance) private readonly clearances: Repository<Clearance>,
    private readonly dataSource: DataSource,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, query: ListClearancesQueryDto): Promise<ClearancePageDto> {
    requireRole(actor, 'steward', 'mentor');
    const { page, perPage, personId, kindId } = query;
    const [found, total] = await this.clearances.findAndCount({
      where: { endedAt: IsNull(), ...(personId && { personId }), ...(kindId && { kindId }) },
      relations: NAMED,
      order: { kind: { name: 'ASC' }, person: { name: 'ASC' }, id: 'ASC' },
      skip: skipOf(query),
      take: perPage,
    });
    const today = await this.today();
    return { items: found.map((clearance) => clearanceDto(clearance, today)), total, page, perPage };
  }

  async mine(actor: Actor): Promise<ClearanceDto[]> {
    requireMember(actor);
    const found = await this.clearances.find({
      where: { endedAt: IsNull(), personId: actor.personId },
      relations: NAMED,
      order: { kind: { name: 'ASC' }, id: 'ASC' },
    });
    const today = await this.today();
    return found.map((clearance) => clearanceDto(clearance, today));
  }

  /** Clears somebody on a kind of instrument; where they were cleared already, from now on these terms hold. */
  async grant(actor: Actor, { personId, kindId, until }: GrantClearanceDto): Promise<ClearanceDto> {
    requireRole(actor, 'steward');
    const today = await this.today();
    if (until !== undefined && until < today) throw fieldError('until', 'The last day is today or later.');
    const person = (await this.people.byIds([personId])).get(personId);
    if (!person || person.leftAt) throw fieldError('personId', 'There is no such member.');
    const id = await translatingConstraints(
      () =>
        this.dataSource.transaction((manager) =>
          this.replace(manager, actor, { personId, kindId, until }, today),
        ),
      {
        clearance_once: () =>
          instrumentProblems['clearance-in-hand']('Another steward gave it in the same moment. Look again.'),
      },
    );
    return this.shown(id, today);
  }

  /** Takes a clearance back. Taking it back twice changes nothing more. */
  async end(actor: Actor, clearanceId: string): Promise<void> {
    requireRole(actor, 'steward');
    const known = await this.clearances.existsBy({ id: clearanceId });
    if (!known) throw notFound('clearance');
    await this.close(this.dataSource.manager, actor, { id: clearanceId });
  }

  /** For the rules: a person's clearances that were not taken back, by kind. Their days are still to be judged. */
  async heldBy(
    personId: string,
    kindIds: readonly string[],
    manager?: EntityManager,
  ): Promise<Map<string, Clearance>> {
    const held = await (manager?.getRepository(Clearance) ?? this.clearances).findBy({
      personId,
      kindId: In([...kindIds]),
      endedAt: IsNull(),
    });
    return new Map(held.map((clearance) => [clearance.kindId, clearance]));
  }

  async countHolders(kindId: string): Promise<number> {
    return this.clearances
      .createQueryBuilder('clearance')
      .innerJoin('clearance.person', 'person', 'person.left_at IS NULL')
      .where('clearance.kind_id = :kindId AND clearance.ended_at IS NULL', { kindId })
      .andWhere('(clearance.until IS NULL OR clearance.until >= :today)', { today: await this.today() })
      .getCount();
  }

  private async replace(
    manager: EntityManager,
    actor: Actor,
    { personId, kindId, until }: GrantClearanceDto,
    today: string,
  ): Promise<string> {
    const kind = await manager.getRepository(InstrumentKind).findOneBy({ id: kindId });
    if (!kind) throw fieldError('kindId', 'There is no such kind of instrument.');
    if (!kind.needsClearance) throw fieldError('kindId', `Nobody needs a clearance for this: ${kind.name}.`);
    await this.close(manager, actor, { personId, kindId });
    const granted = { personId, kindId, grantedById: actor.personId, grantedOn: today, until: until ?? null };
    const { id } = await manager
      .getRepository(Clearance)
      .save({ ...granted, endedAt: null, endedById: null });
    return id;
  }

  private async close(
    manager: EntityManager,
    actor: Actor,
    which: { id: string } | { personId: string; kindId: string },
  ): Promise<void> {
    const ended = { endedAt: this.clock.now(), endedById: actor.personId };
    await manager.getRepository(Clearance).update({ ...which, endedAt: IsNull() }, ended);
  }

  private async shown(id: string, today: string): Promise<ClearanceDto> {
    return clearanceDto(await this.clearances.findOneOrFail({ where: { id }, relations: NAMED }), today);
  }

  private async today(): Promise<string> {
    return clubDay(this.clock.now(), (await this.club.settings()).timeZone);
  }
}
