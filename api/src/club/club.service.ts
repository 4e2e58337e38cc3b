import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository, type EntityManager } from 'typeorm';
import { requireRole, ROLES, type Actor } from '../common/actor';
import { Environment } from '../config/environment';
import { Club } from './club.entity';
import { OpeningHoursService } from './opening-hours.service';
import type { ChooseRulesDto, ClubDto, DemoAccountDto } from './dto/club.dto';

export type ClubSettings = Omit<Club, 'id'>;

@Injectable()
export class ClubService {
  constructor(
    @InjectRepository(Club) private readonly clubs: Repository<Club>,
    private readonly hours: OpeningHoursService,
    private readonly environment: Environment,
  ) {}

  /** Open to everybody: the name over the door. */
  async front(): Promise<ClubDto> {
    const { name, address, contactEmail, timeZone, currency, ruleSet } = await this.settings();
    const [openingHours, demoAccounts] = [await this.hours.week(), this.demoAccounts()];
    return { name, address, contactEmail, timeZone, currency, ruleSet, openingHours, demoAccounts };
  }

  /** An organiser chooses by which rules the calculators judge. */
  async chooseRules(actor: Actor, { ruleSet }: ChooseRulesDto): Promise<void> {
    requireRole(actor, 'organiser');
    await this.clubs.update({ id: 1 }, { ruleSet });
  }

  /** For other features. The migration writes the row, so it is always there. */
  async settings(manager?: EntityManager): Promise<ClubSettings> {
    return (manager?.getRepository(Club) ?? this.clubs).findOneByOrFail({ id: 1 });
  }

  /** For first set-up and seeds. */
  async set(settings: ClubSettings): Promise<void> {
    await this.clubs.update({ id: 1 }, settings);
  }

  private demoAccounts(): DemoAccountDto[] {
    if (this.environment.FERRITE_DEMO !== '1') return [];
    const second = { email: 'member2@larkmoor.example', role: 'member' };
    return [...ROLES.map((role) => ({ email: `${role}@larkmoor.example`, role })), second];
  }
}
