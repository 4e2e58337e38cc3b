import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { LessThanOrEqual, Repository } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { tierDto, type AssignTierDto, type CreateTierDto, type TierDto } from './dto/tier.dto';
import { duesProblems } from './dues.errors';
import { PersonTier, Tier } from './tier.entity';

@Injectable()
export class TiersService {
  constructor(
    @InjectRepository(Tier) private readonly tiers: Repository<Tier>,
    @InjectRepository(PersonTier) private readonly personTiers: Repository<PersonTier>,
  ) {}

  /** A handful, so they are not paged. */
  async list(actor: Actor): Promise<TierDto[]> {
    requireRole(actor, 'treasurer');
    const tiers = await this.tiers.find({ order: { amountMinor: 'DESC', name: 'ASC' }, take: 100 });
    return tiers.map(tierDto);
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
}
