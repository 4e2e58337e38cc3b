import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { ClubService } from '../club/club.service';
import { OpeningHoursService } from '../club/opening-hours.service';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { commonProblems, fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import type { DomainError, FieldProblem } from '../common/domain-error';
import { retryingOnce } from '../common/retrying';
import { GroupsService } from '../groups/groups.service';
import { InstrumentUseService } from '../instruments/instrument-use.service';
import { notBookable, overlap } from './bookings.errors';
import { BookingsRepository } from './bookings.repository';
import { listProblems, searchWindow, timeProblems } from './bookings.rules';
import { BookingsService } from './bookings.service';
import type { Span } from './bookings.types';
import { bookingDto, type BookingDto } from './dto/booking.dto';
import type { CreateBookingDto } from './dto/create-booking.dto';
import type { ListBookingsQueryDto } from './dto/list-bookings.dto';

@Injectable()
export class MemberBookingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly repository: BookingsRepository,
    private readonly bookings: BookingsService,
    private readonly instruments: InstrumentUseService,
    private readonly groups: GroupsService,
    private readonly club: ClubService,
    private readonly hours: OpeningHoursService,
    private readonly clock: Clock,
  ) {}

  /** Books all of what is wanted, or nothing. */
  async book(actor: Actor, wish: CreateBookingDto): Promise<BookingDto> {
    requireMember(actor);
    const span = { startsAt: new Date(wish.startsAt), endsAt: new Date(wish.endsAt) };
    refuseIf(timeProblems(span, this.clock.now()));
    const work = () => this.dataSource.transaction((manager) => this.write(manager, actor, wish, span));
    const bookingId = await translatingConstraints(() => retryingOnce(work), {
      booking_no_overlap: () => this.overlap(actor, wish.resourceIds, span),
      booking_check_exists: () => fieldError('checkId', 'There is no such check in any plan.'),
    });
    const made = await this.repository.findWhole(bookingId);
    if (!made) throw new Error('a booking that was made is not there');
    return bookingDto(made.booking, made.items, actor, this.clock.now());
  }

  /** Who has what between two instants; everybody sees it. */
  async list(actor: Actor, { from, to, resourceId }: ListBookingsQueryDto): Promise<BookingDto[]> {
    requireMember(actor);
    const span = { startsAt: new Date(from), endsAt: new Date(to) };
    refuseIf(listProblems(span));
    const found = await this.repository.findBetween(span, resourceId);
    return found.map(({ booking, items }) => bookingDto(booking, items, actor, this.clock.now()));
  }

  /** The person's own sessions that are not over. */
  async mine(actor: Actor): Promise<BookingDto[]> {
    requireMember(actor);
    const now = this.clock.now();
    const found = await this.repository.findAhead(actor.personId, now);
    return found.map(({ booking, items }) => bookingDto(booking, items, actor, now));
  }

  private async write(
    manager: EntityManager,
    actor: Actor,
    { resourceIds, groupId, checkId }: CreateBookingDto,
    span: Span,
  ): Promise<string> {
    await this.bookings.lockOffered(manager, resourceIds);
    if (groupId && !(await this.groups.isMember(manager, groupId, actor.personId)))
      throw fieldError('groupId', 'You are not in this group. Choose one of your own, or none.');
    const { reasons } = await this.instruments.judge(manager, actor.personId, resourceIds, span.endsAt);
    if (reasons.size > 0) throw notBookable(resourceIds, reasons);
    const head = { kind: 'session' as const, title: '', personId: actor.personId };
    const purpose = { groupId: groupId ?? null, checkId: checkId ?? null };
    const booking = { ...head, ...purpose, ...span, madeAt: this.clock.now() };
    return (await this.repository.insert(manager, booking, resourceIds)).id;
  }

  /** Stands outside the lost transaction: who has it by now, and when everything wanted is free. */
  private async overlap(actor: Actor, resourceIds: readonly string[], span: Span): Promise<DomainError> {
    const { timeZone } = await this.club.settings();
    const { manager } = this.dataSource;
    const { usableUntil } = await this.instruments.judge(manager, actor.personId, resourceIds, span.endsAt);
    const window = searchWindow(span, this.clock.now(), usableUntil);
    const nearest = window ? await this.nearestFree(resourceIds, span, window, timeZone) : [];
    const clashes = await this.repository.findClashes(resourceIds, [span]);
    return overlap(clashes, nearest, { zone: timeZone, personId: actor.personId });
  }

  /** While the workshop is open; at any hour only when there is nothing else. */
  private async nearestFree(
    resourceIds: readonly string[],
    span: Span,
    window: Span,
    zone: string,
  ): Promise<Span[]> {
    const open = await this.hours.openWithin(window, zone);
    const found = await this.repository.findNearestFree(resourceIds, span, open, zone);
    return found.length > 0 ? found : this.repository.findNearestFree(resourceIds, span, [window], zone);
  }
}

function refuseIf(problems: FieldProblem[]): void {
  const [first] = problems;
  if (first) throw commonProblems['invalid-input'](first.detail, { errors: problems });
}
