import { Injectable } from '@nestjs/common';
import { DataSource, In, type EntityManager, type SelectQueryBuilder } from 'typeorm';
import { Resource } from '../instruments/resource.entity';
import { BookingItem } from './booking-item.entity';
import { Booking } from './booking.entity';
import { FIND_CLASHES, FIND_NEAREST_FREE } from './bookings.queries';
import { cancellation } from './bookings.rules';
import type { Clash, Span } from './bookings.types';

type NewBooking = Pick<
  Booking,
  'kind' | 'title' | 'personId' | 'groupId' | 'checkId' | 'startsAt' | 'endsAt' | 'madeAt'
>;

/** A booking with what it holds. */
export interface WholeBooking {
  booking: Booking;
  items: BookingItem[];
}

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
    const uncancelled = { cancelledAt: null, cancelledById: null, holds: true };
    const made = await manager.getRepository(Booking).save({ ...booking, ...uncancelled });
    await this.insertItems(manager, made, resourceIds);
    return made;
  }

  async insertItems(
    manager: EntityManager,
    { id, startsAt, endsAt }: Pick<Booking, 'id' | 'startsAt' | 'endsAt'>,
    resourceIds: readonly string[],
  ): Promise<void> {
    const items = resourceIds.map((resourceId) => ({ bookingId: id, resourceId, startsAt, endsAt }));
    await manager.getRepository(BookingItem).insert(items);
  }

  /** Gives back what is not used yet: all of it, or from now on. What is over or given back already stays as it is. */
  async release(manager: EntityManager, booking: Booking, now: Date, cancelledById: string): Promise<void> {
    if (booking.cancelledAt !== null) return;
    const extent = cancellation(booking, now);
    if (extent === 'over') return;
    const given = extent === 'rest' ? { endsAt: now } : { holds: false };
    await manager
      .getRepository(Booking)
      .update({ id: booking.id }, { ...given, cancelledAt: now, cancelledById });
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

  /** Up to three times within one of the stretches at which all of them are free as long as wanted, the nearest first. */
  async findNearestFree(
    resourceIds: readonly string[],
    wanted: Span,
    stretches: readonly Span[],
    zone: string,
  ): Promise<Span[]> {
    if (stretches.length === 0) return [];
    const lengthMs = wanted.endsAt.getTime() - wanted.startsAt.getTime();
    return this.dataSource.query<Span[]>(FIND_NEAREST_FREE, [
      resourceIds,
      wanted.startsAt,
      lengthMs / 1000,
      stretches.map(({ startsAt }) => startsAt),
      stretches.map(({ endsAt }) => endsAt),
      zone,
    ]);
  }

  /** What touches the span, in the order it begins. */
  async findBetween({ startsAt, endsAt }: Span, resourceId: string | undefined): Promise<WholeBooking[]> {
    const found = this.confirmed().andWhere('booking.starts_at < :endsAt AND booking.ends_at > :startsAt', {
      startsAt,
      endsAt,
    });
    if (resourceId !== undefined) {
      found.innerJoin(BookingItem, 'wanted', 'wanted.booking_id = booking.id');
      found.andWhere('wanted.resource_id = :resourceId', { resourceId });
    }
    return this.withItems(await found.getMany());
  }

  /** A person's sessions that are not over. */
  async findAhead(personId: string, now: Date): Promise<WholeBooking[]> {
    const found = this.confirmed()
      .andWhere(`booking.kind = 'session' AND booking.person_id = :personId`, { personId })
      .andWhere('booking.ends_at > :now', { now });
    return this.withItems(await found.getMany());
  }

  async findWhole(bookingId: string): Promise<WholeBooking | undefined> {
    const found = this.named().where('booking.id = :bookingId', { bookingId });
    const [whole] = await this.withItems(await found.getMany());
    return whole;
  }

  /** Bookings that hold, those cut short included. */
  private confirmed(): SelectQueryBuilder<Booking> {
    return this.named().where('booking.holds');
  }

  private named(): SelectQueryBuilder<Booking> {
    return this.dataSource
      .getRepository(Booking)
      .createQueryBuilder('booking')
      .innerJoinAndSelect('booking.person', 'person')
      .leftJoinAndSelect('booking.group', 'build_group')
      .orderBy('booking.starts_at')
      .addOrderBy('booking.id');
  }

  private async withItems(bookings: Booking[]): Promise<WholeBooking[]> {
    const items = await this.dataSource.getRepository(BookingItem).find({
      where: { bookingId: In(bookings.map(({ id }) => id)), holds: true },
      relations: { resource: true },
      order: { resource: { kind: 'ASC', position: 'ASC', tag: 'ASC' } },
    });
    const itemsOf = (id: string): BookingItem[] => items.filter(({ bookingId }) => bookingId === id);
    return bookings.map((booking) => ({ booking, items: itemsOf(booking.id) }));
  }
}
