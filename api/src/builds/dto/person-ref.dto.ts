import type { Person } from '../../people/person.entity';

/** Somebody named in a build record. */
export class PersonRefDto {
  id: string;
  /** @example Hollis Brandreth */
  name: string;
}

/** @param people - by id; somebody who is not among them has no name to show. */
export function personRef(people: ReadonlyMap<string, Person>, id: string): PersonRefDto {
  return { id, name: people.get(id)?.name ?? 'Somebody' };
}
