import { Module } from '@nestjs/common';
import { ClubModule } from '../club/club.module';
import { GroupsModule } from '../groups/groups.module';
import { InstrumentsModule } from '../instruments/instruments.module';
import { MailModule } from '../mail/mail.module';
import { PeopleModule } from '../people/people.module';
import { BookingsController } from './bookings.controller';
import { BookingsRepository } from './bookings.repository';
import { BookingsService } from './bookings.service';
import { CancellationsService } from './cancellations.service';
import { MemberBookingsService } from './member-bookings.service';

@Module({
  imports: [ClubModule, GroupsModule, InstrumentsModule, MailModule, PeopleModule],
  controllers: [BookingsController],
  providers: [BookingsRepository, BookingsService, CancellationsService, MemberBookingsService],
  exports: [BookingsService, CancellationsService, MemberBookingsService],
})
export class BookingsModule {}
