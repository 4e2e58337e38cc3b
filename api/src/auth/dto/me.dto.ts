import type { Role } from '../../common/actor';
import type { LiveSession } from '../sessions.service';

/** The person who is signed in, and what their roles let them see. */
export class MeDto {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  /** True on a bench tablet. */
  sharedDevice: boolean;
}

export function meDto({ actor, email, isSharedDevice }: LiveSession): MeDto {
  return {
    id: actor.personId,
    name: actor.name,
    email,
    roles: [...actor.roles],
    sharedDevice: isSharedDevice,
  };
}
