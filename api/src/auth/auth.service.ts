import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { Person } from '../people/person.entity';
import { authProblems } from './auth.errors';
import { accessLifeMs } from './auth.rules';
import type { SignInDto } from './dto/sign-in.dto';
import { Passwords } from './passwords';
import { SessionsService } from './sessions.service';
import { SignInTries } from './sign-in-tries';
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
    private readonly tries: SignInTries,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly jwt: JwtService,
  ) {}

  /** @throws DomainError `wrong-email-or-password` (401), `slow-down` (429) with `retryAfterSeconds` */
  async signIn({ email, password, sharedDevice = false }: SignInDto, address: string): Promise<SignedIn> {
    const takeBack = await this.tries.begin({ email, address });
    const person = await this.people.findOne({
      where: { email },
      select: { id: true, passwordHash: true, leftAt: true },
    });
    const isRight = await this.passwords.matches(person?.passwordHash, password);
    if (!person || !isRight || person.leftAt) {
      await this.tries.forgetOldOnes();
      throw authProblems['wrong-email-or-password'](
        'That email and password do not match. Your email is kept.',
      );
    }
    await takeBack();
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
}
