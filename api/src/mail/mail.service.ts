import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { ClubService } from '../club/club.service';
import { Mail } from './mail.entity';

export interface Letter {
  to: string;
  subject: string;
  /** The body in plain words, without greeting or signature of the club. */
  text: string;
}

@Injectable()
export class MailService {
  constructor(
    private readonly clock: Clock,
    private readonly club: ClubService,
  ) {}

  /** Puts letters into the outbox, inside the caller's transaction: no act without its mail, no mail without its act. */
  async queue(manager: EntityManager, letters: readonly Letter[]): Promise<void> {
    if (letters.length === 0) return;
    const now = this.clock.now();
    const { name } = await this.club.settings(manager);
    await manager.getRepository(Mail).insert(
      letters.map(({ to, subject, text }) => ({
        to,
        subject: subject.replaceAll(/[\r\n]+/g, ' '),
        text: `${text}\n\n${name}\n`,
        queuedAt: now,
        dueAt: now,
        tries: 0,
      })),
    );
  }
}
