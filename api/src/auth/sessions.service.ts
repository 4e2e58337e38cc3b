import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, IsNull, type EntityManager } from 'typeorm';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { Environment } from '../config/environment';
import { authProblems } from './auth.errors';
import { refreshDecision, sessionExpiry } from './auth.rules';
import { Session } from './session.entity';
import { hashOf, newSecret, successorOf, type RefreshToken } from './tokens';

export interface LiveSession {
  actor: Actor;
  email: string;
  isSharedDevice: boolean;
}

const runOut = (): Error =>
  authProblems['session-ended']('Your sign-in has run out. Sign in again to go on.');

@Injectable()
export class SessionsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly environment: Environment,
    private readonly clock: Clock,
  ) {}

  async start(personId: string, isSharedDevice: boolean): Promise<RefreshToken> {
    const now = this.clock.now();
    const secret = newSecret();
    const sessions = this.dataSource.getRepository(Session);
    const session = await sessions.save(
      sessions.create({
        personId,
        isSharedDevice,
        tokenHash: hashOf(secret),
        previousTokenHash: null,
        rotatedAt: now,
        startedAt: now,
        expiresAt: sessionExpiry(now, isSharedDevice),
        endedAt: null,
      }),
    );
    return { sessionId: session.id, secret };
  }

  /** The person behind a session that still runs, with the roles they hold this moment. */
  async live(sessionId: string): Promise<LiveSession | undefined> {
    const session = await this.dataSource.getRepository(Session).findOne({
      where: { id: sessionId, endedAt: IsNull() },
      relations: { person: true },
    });
    if (!session || session.expiresAt <= this.clock.now() || session.person.leftAt) return undefined;
    const { id: personId, name, roles, email } = session.person;
    return { actor: { personId, name, roles }, email, isSharedDevice: session.isSharedDevice };
  }

  /** @throws DomainError `session-ended` (401) */
  async liveOrRefuse(sessionId: string): Promise<LiveSession> {
    const live = await this.live(sessionId);
    if (!live) throw runOut();
    return live;
  }

  /**
   * Exchanges a refresh token for the next one. A token that was exchanged before ends the session, because two
   * devices hold it.
   *
   * @throws DomainError `session-ended` (401)
   */
  async refresh(presented: RefreshToken): Promise<RefreshToken & { isSharedDevice: boolean }> {
    const secret = successorOf(presented, this.environment.JWT_SECRET);
    const hashes = { presentedHash: hashOf(presented.secret), successorHash: hashOf(secret) };
    const session = await this.dataSource.transaction((manager) =>
      this.exchange(manager, presented.sessionId, hashes),
    );
    if (!session) throw runOut();
    return { sessionId: session.id, secret, isSharedDevice: session.isSharedDevice };
  }

  /** @returns undefined when the session has ended, or ends by this. */
  private async exchange(
    manager: EntityManager,
    id: string,
    hashes: { presentedHash: string; successorHash: string },
  ): Promise<Session | undefined> {
    const sessions = manager.getRepository(Session);
    const where = { id, endedAt: IsNull() };
    const session = await sessions.findOne({ where, lock: { mode: 'pessimistic_write' } });
    const now = this.clock.now();
    if (!session || session.expiresAt <= now) return undefined;
    const decision = refreshDecision(session, hashes, now);
    if (decision === 'end') {
      await sessions.update({ id }, { endedAt: now });
      return undefined;
    }
    if (decision === 'rotate') {
      const { presentedHash: previousTokenHash, successorHash: tokenHash } = hashes;
      const expiresAt = sessionExpiry(now, session.isSharedDevice);
      await sessions.update({ id }, { tokenHash, previousTokenHash, rotatedAt: now, expiresAt });
    }
    return session;
  }

  /** Ends the session a refresh token belongs to; a token that is not that session's ends nothing. */
  async endByToken({ sessionId, secret }: RefreshToken): Promise<void> {
    const session = await this.dataSource.getRepository(Session).findOneBy({ id: sessionId });
    const presentedHash = hashOf(secret);
    if (session?.tokenHash === presentedHash || session?.previousTokenHash === presentedHash)
      await this.end(sessionId);
  }

  async end(sessionId: string): Promise<void> {
    await this.dataSource
      .getRepository(Session)
      .update({ id: sessionId, endedAt: IsNull() }, { endedAt: this.clock.now() });
  }
}
