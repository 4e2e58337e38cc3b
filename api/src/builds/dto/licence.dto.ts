import type { Build } from '../build.entity';
import type { PersonRefDto } from './person-ref.dto';

/** A build under way and whether an organiser has seen the licence it will go on the air under. */
export class LicenceDto {
  buildId: string;
  builder: PersonRefDto;
  /** @example Larkmoor Twenty */
  planName: string;
  /** @example 7 */
  serial: number;
  seenAt: string | null;
  seenBy: PersonRefDto | null;
}

export function licenceDto(build: Build): LicenceDto {
  const { id, person, edition, serial, licenceSeenAt, licenceSeenBy } = build;
  return {
    buildId: id,
    builder: { id: person.id, name: person.name },
    planName: edition.plan.name,
    serial,
    seenAt: licenceSeenAt?.toISOString() ?? null,
    seenBy: licenceSeenBy && { id: licenceSeenBy.id, name: licenceSeenBy.name },
  };
}
