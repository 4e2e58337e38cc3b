import { Injectable } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { ClubService } from '../club/club.service';
import { PeopleService } from '../people/people.service';
import { CreditService } from './credit.service';
import type { MyDuesDto } from './dto/my-dues.dto';
import { tierDto } from './dto/tier.dto';
import { PaymentsRepository } from './payments.repository';
import { TiersService } from './tiers.service';

/** A person's payments are few; somebody with more than these has the statement printed. */
const MOST = 200;

@Injectable()
export class MyDuesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly payments: PaymentsRepository,
    private readonly credit: CreditService,
    private readonly tiers: TiersService,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async mine(actor: Actor): Promise<MyDuesDto> {
    requireMember(actor);
    const { personId } = actor;
    const settings = await this.club.settings();
    const tier = await this.tiers.tierOf(personId, clubDay(this.clock.now(), settings.timeZone));
    const [treasurer] = await this.people.holding('treasurer');
    return {
      tier: tier ? tierDto(tier) : null,
      currency: settings.currency,
      creditMinor: await this.credit.of(this.dataSource.manager, personId),
      payments: await this.payments.find({ personId, takenBackAt: IsNull() }, { skip: 0, take: MOST }),
      bank: { accountName: settings.accountName, accountNumber: settings.accountNumber },
      treasurerName: treasurer?.name ?? '',
      contactEmail: settings.contactEmail,
    };
  }
}
