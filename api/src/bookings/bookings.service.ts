import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { fieldError } from '../common/common.errors';
import { BookingItem } from './booking-item.entity';
import { Booking } from './booking.entity';
import { BookingsRepository } from './bookings.repository';
import type { Clash, NightReservation, Span } from './bookings.types';

export type { Clash, NightReservation, Span } from './bookings.types';

@Injectable()
export class BookingsService {
  constructor(
    private readonly bookings: BookingsRepository,
    private readonly clock: Clock,
  ) {}

  /** For build nights: what lies in the way, night by night. Empty when everything is free. */
  findClashes(
    resourceIds: readonly string[],
    spans: readonly Span[],
    options: { exceptBookingIds?: readonly string[]; manager?: EntityManager } = {},
  ): Promise<Clash[]> {
    return this.bookings.findClashes(resourceIds, spans, options);
  }

  /**
   * For build nights: holds the benches for evenings, in the caller's transaction, all or none of them.
   *
   * @returns the booking's id for each night, in the order given.
   * @throws DomainError 422 on `resourceIds` for an unknown or retired bench; QueryFailedError `booking_no_overlap`
   * when one is taken: translate it outside the transaction.
   */
  async reserveForNights(manager: EntityManager, nights: readonly NightReservation[]): Promise<string[]> {
    await this.lockOffered(
      manager,
      nights.flatMap(({ resourceIds }) => resourceIds),
    );
    const ids: string[] = [];
    for (const { resourceIds, ...night } of nights) {
      const head = { ...night, kind: 'build night' as const, groupId: null, checkId: null };
      const { id } = await this.bookings.insert(manager, { ...head, madeAt: this.clock.now() }, resourceIds);
      ids.push(id);
    }
    return ids;
  }

  async reserveForNight(manager: EntityManager, night: NightReservation): Promise<string> {
    const [id] = await this.reserveForNights(manager, [night]);
    if (!id) throw new Error('one night was asked for and none was reserved');
    return id;
  }

  /** For build nights: other times or other benches for a night that is already held. Refuses as reserving does. */
  async moveForNight(
    manager: EntityManager,
    bookingId: string,
    night: Omit<NightReservation, 'personId'>,
  ): Promise<void> {
    const { resourceIds, ...head } = night;
    await this.lockOffered(manager, resourceIds);
    await manager.getRepository(Booking).update({ id: bookingId, kind: 'build night' }, head);
    await manager.getRepository(BookingItem).delete({ bookingId });
    await this.bookings.insertItems(manager, { id: bookingId, ...head }, resourceIds);
  }

  /** For build nights: gives the benches back. Releasing what is released already changes nothing. */
  async releaseForNight(manager: EntityManager, bookingId: string, personId: string): Promise<void> {
    const cancelledAt = this.clock.now();
    await manager.query(
      `UPDATE booking SET cancelled_at = $2, cancelled_by_id = $3
       WHERE id = $1 AND kind = 'build night' AND cancelled_at IS NULL`,
      [bookingId, cancelledAt, personId],
    );
    await manager.query(
      `UPDATE booking_item SET cancelled_at = $2 WHERE booking_id = $1 AND cancelled_at IS NULL`,
      [bookingId, cancelledAt],
    );
  }

  private async lockOffered(manager: EntityManager, resourceIds: readonly string[]): Promise<void> {
    const offered = await this.bookings.lockResources(manager, resourceIds);
    const known = new Set(offered.filter(({ retiredAt }) => retiredAt === null).map(({ id }) => id));
    if (resourceIds.length === 0) throw fieldError('resourceIds', 'Choose at least one bench or instrument.');
    if (!resourceIds.every((id) => known.has(id)))
      throw fieldError('resourceIds', 'One of these is not a bench or instrument of the club, or no longer.');
  }
}
