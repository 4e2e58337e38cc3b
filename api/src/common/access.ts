import {
  createParamDecorator,
  SetMetadata,
  type CustomDecorator,
  type ExecutionContext,
} from '@nestjs/common';
import type { Request } from 'express';
import type { Actor, Role } from './actor';

/** Who may call a route: anybody, anybody signed in, or the holders of one of the named roles. */
export type AccessRule = 'public' | 'signed-in' | { roles: [Role, ...Role[]] };

export const ACCESS_RULE = 'ferrite-row:access';

/** Declares who may call the handler. A handler without it answers nobody, and a test fails. */
export const Access = (rule: AccessRule): CustomDecorator => SetMetadata(ACCESS_RULE, rule);

export interface SignedInRequest extends Request {
  actor?: Actor;
  sessionId?: string;
}

/** The person behind the request; only on handlers that are not `public`. */
export const CurrentActor = createParamDecorator((_: unknown, context: ExecutionContext): Actor => {
  const { actor } = context.switchToHttp().getRequest<SignedInRequest>();
  if (!actor) throw new Error('CurrentActor stands on a public handler.');
  return actor;
});
