import { Module } from '@nestjs/common';
import { BookingsModule } from '../bookings/bookings.module';
import { BuildsModule } from '../builds/builds.module';
import { ClubModule } from '../club/club.module';
import { MailModule } from '../mail/mail.module';
import { PeopleModule } from '../people/people.module';
import { BuildNightsController } from './build-nights.controller';
import { BuildNightsRepository } from './build-nights.repository';
import { BuildNightsService } from './build-nights.service';
import { NightChangesService } from './night-changes.service';
import { NightCheck } from './night-check';
import { NightDesk } from './night-desk';
import { NightWriter } from './night-writer';
import { PlacesService } from './places.service';
import { PlanningService } from './planning.service';
import { WaitingList } from './waiting-list';

@Module({
  imports: [BookingsModule, BuildsModule, ClubModule, MailModule, PeopleModule],
  controllers: [BuildNightsController],
  providers: [
    BuildNightsRepository,
    BuildNightsService,
    NightChangesService,
    NightCheck,
    NightDesk,
    NightWriter,
    PlacesService,
    PlanningService,
    WaitingList,
  ],
  exports: [BuildNightsService, NightChangesService, PlacesService, PlanningService],
})
export class BuildNightsModule {}
