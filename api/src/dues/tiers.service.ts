import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { LessThanOrEqual, Repository } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import type { PageQueryDto } from '../common/paging.dto';
import { ClubService } from '../club/club.service';
import { PeopleService } from '../people/people.service';
import {
  tierDto,
  type AssignTierDto,
  type CreateTierDto,
  type PeopleOnTiersPageDto,
  type TierDto,
} from './dto/tier.dto';
import { duesProblems } from './dues.errors';
import { PersonTier, Tier } from './tier.entity';

interface Assignment {
  personId: string;
  tierId: string;
  tierName: string;
  fromOn: string;
  isComing: boolean;
}

@Injectable()
export class TiersService {
  constructor(
    @InjectRepository(Tier) private readonly tiers: Repository<Tier>,
    @InjectRepository(PersonTier) private readonly personTiers: Repository<PersonTier>,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** A handful, so they are not paged. */
  async list(actor: Actor): Promise<TierDto[]> {
    requireRole(actor, 'treasurer');
    const tiers = await this.tiers.find({ order: { amountMinor: 'DESC', name: 'ASC' }, take: 100 });
    return tiers.map(tierDto);
  }

  /** Everybody of the club by name, with the tier of today and the next change. */
  async listPeople(actor: Actor, query: PageQueryDto): Promise<PeopleOnTiersPageDto> {
    requireRole(actor, 'treasurer');
    const { items, ...page } = await this.people.list(actor, query);
    const assignments = await this.around(items.map(({ id }) => id));
    const of = (id: string, isComing: boolean): Assignment | undefined =>
      assignments.find((one) => one.personId === id && one.isComing === isComing);
    return {
      ...page,
      items: items.map(({ id: personId, name: personName }) => {
        const { tierId = null, tierName = null } = of(personId, false) ?? {};
        const coming = of(personId, true);
        return {
          personId,
          personName,
          tierId,
          tierName,
          coming: coming ? { tierName: coming.tierName, fromOn: coming.fromOn } : null,
        };
      }),
    };
  }

  /** @throws DomainError `tier-name-taken` (409) */
  async create(actor: Actor, tier: CreateTierDto): Promise<TierDto> {
    requireRole(actor, 'treasurer');
    return translatingConstraints(async () => tierDto(await this.tiers.save({ ...tier })), {
      tier_name_once: () => duesProblems['tier-name-taken'](`There is a tier called ${tier.name}.`),
    });
  }

  /** Sets a person's tier from a day on; the same day again replaces it. */
  async assign(actor: Actor, { personId, tierId, fromOn }: AssignTierDto): Promise<void> {
    requireRole(actor, 'treasurer');
    await translatingConstraints(
      () => this.personTiers.upsert({ personId, tierId, fromOn }, ['personId', 'fromOn']),
      {
        person_tier_is_person: () => fieldError('personId', 'There is no such person.'),
        person_tier_exists: () => fieldError('tierId', 'There is no such tier.'),
      },
    );
  }

  /** For this feature: the tier a person is in on a day, if any was set. */
  async tierOf(personId: string, on: string): Promise<Tier | undefined> {
    const latest = await this.personTiers.findOne({
      where: { personId, fromOn: LessThanOrEqual(on) },
      order: { fromOn: 'DESC' },
      relations: { tier: true },
    });
    return latest?.tier;
  }

  /** Of each person the tier of today and the first one after it. */
  private async around(personIds: string[]): Promise<Assignment[]> {
    const { timeZone } = await this.club.settings();
    return this.personTiers.query<Assignment[]>(
      `SELECT DISTINCT ON (p.person_id, p.from_on > $2) p.person_id AS "personId", t.id AS "tierId",
              t.name AS "tierName", p.from_on::text AS "fromOn", p.from_on > $2 AS "isComing"
         FROM person_tier p JOIN tier t ON t.id = p.tier_id
        WHERE p.person_id = ANY ($1)
        ORDER BY p.person_id, p.from_on > $2, abs(p.from_on - $2::date)`,
      [personIds, clubDay(this.clock.now(), timeZone)],
    );
  }
}
