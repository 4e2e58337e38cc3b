import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { ClubService } from '../club/club.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { Environment } from '../config/environment';
import { MailService } from '../mail/mail.service';
import { PeopleService } from '../people/people.service';
import type { BuildNight } from './build-night.entity';
import { BuildNightsRepository } from './build-nights.repository';
import { nightProblems } from './build-nights.errors';
import { onDutyLetter, type Hall, type LetterText } from './night-letters.rules';

/** Mentors who are newly on duty on a night. */
interface NewDuty {
  night: BuildNight;
  mentorIds: readonly string[];
}

/** What every change to a night needs: the night itself, kept from others meanwhile, and letters to people. */
@Injectable()
export class NightDesk {
  constructor(
    private readonly nights: BuildNightsRepository,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly mail: MailService,
    private readonly environment: Environment,
    private readonly clock: Clock,
  ) {}

  /**
   * Locks a night that can still be changed.
   * @throws DomainError `not-found`, `night-cancelled` or `night-over`
   */
  async open(manager: EntityManager, nightId: string): Promise<BuildNight> {
    const night = await this.nights.lock(manager, nightId);
    if (!night) throw notFound('build night');
    if (night.cancelledAt) throw nightProblems['night-cancelled']('This build night was cancelled.');
    if (night.endsAt <= this.clock.now()) throw nightProblems['night-over']('This build night is over.');
    return night;
  }

  async hall(manager: EntityManager): Promise<Hall> {
    const { timeZone, address } = await this.club.settings(manager);
    return { zone: timeZone, address, link: `${this.environment.PUBLIC_URL}/build-nights` };
  }

  /** Puts one letter to each of these people into the outbox. */
  async write(manager: EntityManager, personIds: readonly string[], letter: LetterText): Promise<void> {
    const people = await this.people.byIds(personIds, manager);
    await this.mail.queue(
      manager,
      [...people.values()]
        .filter(({ leftAt }) => leftAt === null)
        .map(({ email }) => ({ to: email, ...letter })),
    );
  }

  /** A mentor whom somebody else put on duty hears of it, in one letter for all their nights. */
  async tellMentors(manager: EntityManager, actor: Actor, duties: readonly NewDuty[]): Promise<void> {
    const hall = await this.hall(manager);
    const others = new Set(duties.flatMap(({ mentorIds }) => mentorIds));
    others.delete(actor.personId);
    for (const personId of others) {
      const theirs = duties.filter(({ mentorIds }) => mentorIds.includes(personId)).map(({ night }) => night);
      await this.write(manager, [personId], onDutyLetter(theirs, actor.name, hall));
    }
  }
}
