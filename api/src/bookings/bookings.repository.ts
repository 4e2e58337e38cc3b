import { Injectable } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';
import { Resource } from '../instruments/resource.entity';
import { BookingItem } from './booking-item.entity';
import { Booking } from './booking.entity';
import type { Clash, Span } from './bookings.types';

type NewBooking = Pick<
  Booking,
  'kind' | 'title' | 'personId' | 'groupId' | 'checkId' | 'startsAt' | 'endsAt' | 'madeAt'
>;

@Injectable()
export class BookingsRepository {
  constructor(private readonly dataSource: DataSource) {}

  /**
   * Queues up for the benches and instruments, always in the order of their ids. Without the queue, simultaneous
   * writers each see the others' unfinished rows in the exclusion index, wait for each other and are shot as a
   * deadlock one a second; the constraint alone keeps the book right, the queue keeps it quick.
   */
  lockResources(manager: EntityManager, resourceIds: readonly string[]): Promise<Resource[]> {
    return manager.getRepository(Resource).find({
      where: { id: In([...new Set(resourceIds)]) },
      order: { id: 'ASC' },
      lock: { mode: 'for_no_key_update' },
    });
  }

  async insert(
    manager: EntityManager,
    booking: NewBooking,
    resourceIds: readonly string[],
  ): Promise<Booking> {
    const made = await manager
      .getRepository(Booking)
      .save({ ...booking, cancelledAt: null, cancelledById: null });
    await this.insertItems(manager, made, resourceIds);
    return made;
  }

  async insertItems(
    manager: EntityManager,
    { id, startsAt, endsAt }: Pick<Booking, 'id' | 'startsAt' | 'endsAt'>,
    resourceIds: readonly string[],
  ): Promise<void> {
    const items = [...resourceIds]
      .sort()
      .map((resourceId) => ({ bookingId: id, resourceId, startsAt, endsAt, cancelledAt: null }));
    await manager.getRepository(BookingItem).insert(items);
  }

  /** Everything confirmed that lies in the way of any of the spans, first span first. */
  async findClashes(
    resourceIds: readonly string[],
    spans: readonly Span[],
    {
      exceptBookingIds = [],
      manager,
    }: { exceptBookingIds?: readonly string[]; manager?: EntityManager } = {},
  ): Promise<Clash[]> {
    if (resourceIds.length === 0 || spans.length === 0) return [];
    return (manager ?? this.dataSource).query<Clash[]>(FIND_CLASHES, [
      resourceIds,
      spans.map(({ startsAt }) => startsAt),
      spans.map(({ endsAt }) => endsAt),
      exceptBookingIds,
    ]);
  }
}

const FIND_CLASHES = `
  SELECT (wanted.ordinal - 1)::integer AS "spanIndex", booking.id AS "bookingId", booking.kind, booking.title,
         person.id AS "personId", person.name AS "personName",
         resource.id AS "resourceId", resource.tag AS "resourceTag",
         item.starts_at AS "startsAt", item.ends_at AS "endsAt", booking.made_at AS "madeAt"
  FROM unnest($2::timestamptz[], $3::timestamptz[]) WITH ORDINALITY AS wanted(starts_at, ends_at, ordinal)
  JOIN booking_item item
    ON item.resource_id = ANY ($1::uuid[]) AND item.cancelled_at IS NULL
   AND tstzrange(item.starts_at, item.ends_at, '[)') && tstzrange(wanted.starts_at, wanted.ends_at, '[)')
  JOIN booking ON booking.id = item.booking_id
  JOIN person ON person.id = booking.person_id
  JOIN resource ON resource.id = item.resource_id
  WHERE booking.id <> ALL ($4::uuid[])
  ORDER BY wanted.ordinal, item.starts_at, resource.position, resource.tag`;
