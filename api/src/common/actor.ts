import { notAllowed } from './common.errors';

export const ROLES = ['member', 'mentor', 'steward', 'treasurer', 'organiser'] as const;
export type Role = (typeof ROLES)[number];

/** Who is acting. Everyone is a member; `roles` names what they hold beside that. */
export interface Actor {
  personId: string;
  name: string;
  roles: readonly Role[];
}

export function hasRole(actor: Actor, ...wanted: Role[]): boolean {
  return wanted.some((role) => actor.roles.includes(role));
}

const ROLE_WORDS: Record<Role, string> = {
  member: 'members',
  mentor: 'mentors',
  steward: 'stewards',
  treasurer: 'treasurers',
  organiser: 'organisers',
};

/** First line of a use case that needs a role. @throws DomainError `not-allowed` (403) */
export function requireRole(actor: Actor, ...wanted: Role[]): void {
  if (hasRole(actor, ...wanted)) return;
  const who = wanted.map((role) => ROLE_WORDS[role]).join(' or ');
  throw notAllowed(`This is for ${who}. Ask an organiser if you need the role.`);
}

/** First line of a use case open to every member. @throws DomainError `not-allowed` (403) */
export function requireMember(actor: Actor): void {
  requireRole(actor, 'member');
}
