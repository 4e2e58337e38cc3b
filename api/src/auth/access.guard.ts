import { Injectable, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { ACCESS_RULE, type AccessRule, type SignedInRequest } from '../common/access';
import { requireRole } from '../common/actor';
import { commonProblems, notAllowed } from '../common/common.errors';
import type { SignedInUser } from './access-token.strategy';

/** Stands before every route. A route that declares no rule lets nobody in. */
@Injectable()
export class AccessGuard extends AuthGuard('access-token') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const rule = this.reflector.get<AccessRule | undefined>(ACCESS_RULE, context.getHandler());
    if (rule === undefined) throw notAllowed('This address has no access rule, so it is closed.');
    if (rule === 'public') return true;
    await super.canActivate(context);
    const request = context.switchToHttp().getRequest<SignedInRequest & { user: SignedInUser }>();
    request.actor = request.user.actor;
    request.sessionId = request.user.sessionId;
    if (rule !== 'signed-in') requireRole(request.user.actor, ...rule.roles);
    return true;
  }

  override handleRequest<TUser>(error: unknown, user: TUser | false): TUser {
    if (error instanceof Error) throw error;
    if (!user) throw commonProblems['not-signed-in']('Sign in to go on.');
    return user;
  }
}
