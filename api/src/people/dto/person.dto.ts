import { ROLES, type Role } from '../../common/actor';
import type { Person } from '../person.entity';

/** What every member may know of another. */
export class PersonDto {
  /** @example 0b6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f11 */
  id: string;
  /** @example Tamsin Ardley */
  name: string;
  roles: Role[];
}

export function personDto(person: Pick<Person, 'id' | 'name' | 'roles'>): PersonDto {
  return { id: person.id, name: person.name, roles: ROLES.filter((role) => person.roles.includes(role)) };
}
