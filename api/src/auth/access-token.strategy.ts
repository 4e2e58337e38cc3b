import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import { Environment } from '../config/environment';
import { ACCESS_COOKIE, cookieOf } from './cookies';
import { SessionsService, type LiveSession } from './sessions.service';

export interface SignedInUser extends LiveSession {
  sessionId: string;
}

/** The token says which session; the database says whether it still runs and who it is. */
@Injectable()
export class AccessTokenStrategy extends PassportStrategy(Strategy, 'access-token') {
  constructor(
    environment: Environment,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: (request: Request) => cookieOf(request, ACCESS_COOKIE),
      secretOrKey: environment.JWT_SECRET,
      algorithms: ['HS256'],
    });
  }

  async validate(payload: { sid?: unknown }): Promise<SignedInUser | false> {
    if (typeof payload.sid !== 'string') return false;
    const live = await this.sessions.live(payload.sid);
    return live ? { ...live, sessionId: payload.sid } : false;
  }
}
