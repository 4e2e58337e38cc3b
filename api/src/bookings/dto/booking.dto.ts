import { ApiProperty } from '@nestjs/swagger';
import type { Actor } from '../../common/actor';
import type { BookingItem } from '../booking-item.entity';
import type { Booking } from '../booking.entity';
import { mayCancel } from '../bookings.rules';

export class BookedResourceDto {
  id: string;
  @ApiProperty({ enum: ['bench', 'instrument'] })
  kind: 'bench' | 'instrument';
  /** @example FR-031 */
  tag: string;
  /** @example Spectrum analyzer */
  name: string;
}

/** Who has which benches and instruments, and when. */
export class BookingDto {
  id: string;
  @ApiProperty({ enum: ['session', 'build night'] })
  kind: 'session' | 'build night';
  /** Of a build night; empty for a session. */
  title: string;
  personId: string;
  /** @example Tamsin Ardley */
  personName: string;
  /** Whether it is your session. */
  mine: boolean;
  @ApiProperty({ type: String, format: 'uuid', nullable: true })
  groupId: string | null;
  @ApiProperty({ type: String, nullable: true })
  groupName: string | null;
  resources: BookedResourceDto[];
  startsAt: Date;
  endsAt: Date;
  madeAt: Date;
  /** What it was made for: on your own only. */
  @ApiProperty({ type: String, format: 'uuid', nullable: true })
  checkId: string | null;
  /** Whether you may cancel it now. */
  mayCancel: boolean;
}

type NamedBooking = Pick<
  Booking,
  | 'id'
  | 'kind'
  | 'title'
  | 'personId'
  | 'person'
  | 'groupId'
  | 'group'
  | 'startsAt'
  | 'endsAt'
  | 'madeAt'
  | 'checkId'
>;

export function bookingDto(booking: NamedBooking, items: BookingItem[], actor: Actor, now: Date): BookingDto {
  const { id, kind, title, personId, person, groupId, group, startsAt, endsAt, madeAt, checkId } = booking;
  const mine = kind === 'session' && personId === actor.personId;
  return {
    id,
    kind,
    title,
    personId,
    personName: person.name,
    mine,
    groupId,
    groupName: group?.name ?? null,
    resources: items.map(({ resource }) => ({
      id: resource.id,
      kind: resource.kind,
      tag: resource.tag,
      name: resource.name,
    })),
    startsAt,
    endsAt,
    madeAt,
    checkId: mine ? checkId : null,
    mayCancel: mayCancel(booking, actor) && endsAt > now,
  };
}
