import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { ClubService } from '../club/club.service';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notAllowed, notFound } from '../common/common.errors';
import { retryingOnce } from '../common/retrying';
import { spanWords } from '../common/wall-clock';
import { MailService } from '../mail/mail.service';
import { PeopleService } from '../people/people.service';
import { Booking } from './booking.entity';
import { bookingProblems } from './bookings.errors';
import { BookingsRepository } from './bookings.repository';
import { cancellation, mayCancel } from './bookings.rules';

@Injectable()
export class CancellationsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly repository: BookingsRepository,
    private readonly people: PeopleService,
    private readonly mail: MailService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** Gives back what is not used yet. Cancelling what is cancelled changes nothing and is no error. */
  async cancel(actor: Actor, bookingId: string): Promise<void> {
    requireMember(actor);
    const work = async (manager: EntityManager): Promise<void> => {
      const booking = await manager
        .getRepository(Booking)
        .findOne({ where: { id: bookingId }, lock: { mode: 'pessimistic_write' } });
      if (!booking) throw notFound('booking');
      this.refuse(actor, booking);
      if (booking.cancelledAt) return;
      const now = this.clock.now();
      if (cancellation(booking, now) === 'over')
        throw bookingProblems['booking-over']('This booking is over. What is past stays in the book.');
      await this.repository.release(manager, booking, now, actor.personId);
      if (booking.personId !== actor.personId) await this.tell(manager, actor, booking);
    };
    await retryingOnce(() => this.dataSource.transaction(work));
  }

  private refuse(actor: Actor, booking: Booking): void {
    if (mayCancel(booking, actor)) return;
    if (booking.kind === 'build night')
      throw bookingProblems['booking-of-build-night'](
        `These benches are held for ${booking.title}. A mentor can cancel the night under Build nights.`,
      );
    throw notAllowed('Only the person who booked it, a mentor, a steward or an organiser can cancel it.');
  }

  /** Nobody loses a bench without being told by whom. */
  private async tell(manager: EntityManager, actor: Actor, booking: Booking): Promise<void> {
    const owner = (await this.people.byIds([booking.personId], manager)).get(booking.personId);
    if (!owner || owner.leftAt) return;
    const { timeZone } = await this.club.settings(manager);
    const when = spanWords(booking, timeZone);
    const subject = `Your bench booking is cancelled: ${when}`;
    const text = `${actor.name} cancelled your booking of ${when}.\nThe Bench book shows when else there is room.`;
    await this.mail.queue(manager, [{ to: owner.email, subject, text }]);
  }
}
