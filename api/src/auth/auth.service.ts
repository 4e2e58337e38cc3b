import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { InjectRepository } from '@nestjs/typeorm';
import { LessThan, MoreThan, Repository } from 'typeorm';
import { Clock } from '../common/clock';
import { commonProblems } from '../common/common.errors';
import { Person } from '../people/person.entity';
import { authProblems } from './auth.errors';
import { accessLifeMs, FAILURES_KEPT_MS, waitBeforeNextTry } from './auth.rules';
import type { SignInDto } from './dto/sign-in.dto';
import { Passwords } from './passwords';
import { SessionsService } from './sessions.service';
import { SignInFailure } from './sign-in-failure.entity';
import { writeRefreshToken, type RefreshToken } from './tokens';

/** What goes into the two cookies. */
export interface SignedIn {
  sessionId: string;
  accessToken: string;
  refreshToken: string;
  isSharedDevice: boolean;
}

@Injectable()
export class AuthService {
  constructor(
    @InjectRepository(Person) private readonly people: Repository<Person>,
    @InjectRepository(SignInFailure) private readonly failures: Repository<SignInFailure>,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly jwt: JwtService,
    private readonly clock: Clock,
  ) {}

  /** @throws DomainError `wrong-email-or-password` (401), `slow-down` (429) with `retryAfterSeconds` */
  async signIn({ email, password, sharedDevice = false }: SignInDto, address: string): Promise<SignedIn> {
    await this.refuseHaste(email, address);
    const person = await this.people.findOne({
      where: { email },
      select: { id: true, passwordHash: true, leftAt: true },
    });
    const isRight = await this.passwords.matches(person?.passwordHash, password);
    if (!person || !isRight || person.leftAt) {
      await this.noteFailure(email, address);
      throw authProblems['wrong-email-or-password'](
        'That email and password do not match. Your email is kept.',
      );
    }
    const token = await this.sessions.start(person.id, sharedDevice);
    return this.cookiesFor(token, sharedDevice);
  }

  /** @throws DomainError `session-ended` (401) */
  async refresh(presented: RefreshToken | undefined): Promise<SignedIn> {
    if (!presented) throw authProblems['session-ended']('Sign in to go on.');
    const next = await this.sessions.refresh(presented);
    return this.cookiesFor(next, next.isSharedDevice);
  }

  /** Either cookie is proof enough to end the session; with neither there is nothing to end. */
  async signOut(presented: RefreshToken | undefined, accessToken: string | null): Promise<void> {
    if (presented) await this.sessions.endByToken(presented);
    const claims = await this.jwt.verifyAsync<{ sid?: unknown }>(accessToken ?? '').catch(() => undefined);
    if (typeof claims?.sid === 'string') await this.sessions.end(claims.sid);
  }

  private async cookiesFor(token: RefreshToken, isSharedDevice: boolean): Promise<SignedIn> {
    const expiresIn = accessLifeMs(isSharedDevice) / 1000;
    const accessToken = await this.jwt.signAsync({ sid: token.sessionId }, { expiresIn });
    return {
      sessionId: token.sessionId,
      accessToken,
      refreshToken: writeRefreshToken(token),
      isSharedDevice,
    };
  }

  private async refuseHaste(email: string, address: string): Promise<void> {
    const now = this.clock.now();
    const since = MoreThan(new Date(now.getTime() - FAILURES_KEPT_MS));
    const recent = await this.failures.find({
      where: { email, address, failedAt: since },
      order: { failedAt: 'DESC' },
      take: 50,
    });
    const waitMs = waitBeforeNextTry(
      recent.map((failure) => failure.failedAt),
      now,
    );
    if (waitMs === 0) return;
    const retryAfterSeconds = Math.ceil(waitMs / 1000);
    const detail = `Too many tries with that email. The next one can be made in ${retryAfterSeconds} s. Your email is kept.`;
    throw commonProblems['slow-down'](detail, { extra: { retryAfterSeconds } });
  }

  private async noteFailure(email: string, address: string): Promise<void> {
    const failedAt = this.clock.now();
    await this.failures.insert({ email, address, failedAt });
    await this.failures.delete({ failedAt: LessThan(new Date(failedAt.getTime() - FAILURES_KEPT_MS)) });
  }
}
