import { hasRole, requireRole, type Actor } from '../common/actor';
import { notAllowed, notFound } from '../common/common.errors';
import type { Build } from './build.entity';
import { buildProblems } from './builds.errors';

type Owned = Pick<Build, 'personId'>;

/** A build is its builder's and the mentors' to see; to everybody else it is not there. */
export function requireSight<T extends Owned>(actor: Actor, build: T | null): T {
  if (build && (build.personId === actor.personId || hasRole(actor, 'mentor'))) return build;
  throw notFound('build');
}

/** Only the builder adds to a build. @throws DomainError `not-found` or `not-allowed` */
export function requireBuilder<T extends Owned>(actor: Actor, build: T | null): T {
  const seen = requireSight(actor, build);
  if (seen.personId === actor.personId) return seen;
  throw notAllowed('Only its builder adds to a build.');
}

/** A mentor who is not the builder. @throws DomainError `not-allowed`, `not-found` or `own-stage` */
export function requireOtherMentor<T extends Owned>(actor: Actor, build: T | null): T {
  requireRole(actor, 'mentor');
  const seen = requireSight(actor, build);
  if (seen.personId !== actor.personId) return seen;
  throw buildProblems['own-stage']('This is your own build. Another mentor looks at it.');
}
