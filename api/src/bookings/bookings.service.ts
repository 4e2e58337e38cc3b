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
    // What is held follows the times at once, so what is given up goes first.
    await manager.getRepository(BookingItem).delete({ bookingId });
    await manager.getRepository(Booking).update({ id: bookingId, kind: 'build night' }, head);
    await this.bookings.insertItems(manager, { id: bookingId, ...head }, resourceIds);
  }

  /** For build nights: another name on the same benches at the same times. */
  async renameForNight(manager: EntityManager, bookingId: string, title: string): Promise<void> {
    await manager.getRepository(Booking).update({ id: bookingId, kind: 'build night' }, { title });
  }

  /** For build nights: gives the benches back, those of a running night from now on. Twice is as good as once. */
  async releaseForNight(manager: EntityManager, bookingId: string, personId: string): Promise<void> {
    const booking = await manager
      .getRepository(Booking)
      .findOne({ where: { id: bookingId, kind: 'build night' }, lock: { mode: 'pessimistic_write' } });
    if (booking) await this.bookings.release(manager, booking, this.clock.now(), personId);
  }

  /**
   * Queues up for what is wanted, and refuses what the club does not offer.
   *
   * @throws DomainError 422 on the first of `resourceIds` that is unknown or retired
   */
  async lockOffered(manager: EntityManager, resourceIds: readonly string[]): Promise<void> {
    if (resourceIds.length === 0) throw fieldError('resourceIds', 'Choose at least one bench or instrument.');
    const found = await this.bookings.lockResources(manager, resourceIds);
    const offered = new Set(found.filter(({ retiredAt }) => retiredAt === null).map(({ id }) => id));
    const missing = resourceIds.findIndex((id) => !offered.has(id));
    if (missing >= 0)
      throw fieldError(`resourceIds.${missing}`, 'The club has no such bench or instrument, or no longer.');
  }
}
