import { Body, Controller, Delete, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiConflictResponse, ApiTags, ApiUnprocessableEntityResponse } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { CancellationsService } from './cancellations.service';
import { BookingOverlapDto, NotBookableDto } from './dto/booking-refusal.dto';
import { BookingDto } from './dto/booking.dto';
import { CreateBookingDto } from './dto/create-booking.dto';
import { ListBookingsQueryDto } from './dto/list-bookings.dto';
import { MemberBookingsService } from './member-bookings.service';

@ApiTags('Bench book')
@Controller('bookings')
export class BookingsController {
  constructor(
    private readonly bookings: MemberBookingsService,
    private readonly cancellations: CancellationsService,
  ) {}

  /** Books benches and instruments together: all of them, or nothing. */
  @Post()
  @Access('signed-in')
  @ApiConflictResponse({ type: BookingOverlapDto, description: 'Somebody has it; when else it is free' })
  @ApiUnprocessableEntityResponse({ type: NotBookableDto, description: 'Not like this; why, and what helps' })
  book(@CurrentActor() actor: Actor, @Body() body: CreateBookingDto): Promise<BookingDto> {
    return this.bookings.book(actor, body);
  }

  /** Who has what in a stretch of at most 62 days. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: ListBookingsQueryDto): Promise<BookingDto[]> {
    return this.bookings.list(actor, query);
  }

  /** Your own sessions that are not over. */
  @Get('mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<BookingDto[]> {
    return this.bookings.mine(actor);
  }

  /** Cancels it, or ends it now when it runs already. Cancelling twice is no error. */
  @Delete(':bookingId')
  @Access('signed-in')
  @HttpCode(204)
  cancel(@CurrentActor() actor: Actor, @Param('bookingId', ParseIdPipe) bookingId: string): Promise<void> {
    return this.cancellations.cancel(actor, bookingId);
  }
}
