import { Module } from '@nestjs/common';
import { InstrumentsModule } from '../instruments/instruments.module';
import { PeopleModule } from '../people/people.module';
import { PlansModule } from '../plans/plans.module';
import { BuildRecordsService } from './build-records.service';
import { BuildsController } from './builds.controller';
import { BuildsService } from './builds.service';
import { ChecksController } from './checks.controller';
import { InstrumentChoiceService } from './instrument-choice.service';
import { LicencesController } from './licences.controller';
import { LicencesService } from './licences.service';
import { MarksService } from './marks.service';
import { PhotosController } from './photos.controller';
import { PhotosService } from './photos.service';
import { ReadingsService } from './readings.service';
import { ReviewsController } from './reviews.controller';
import { ReviewsService } from './reviews.service';
import { StageMovesService } from './stage-moves.service';
import { StagesController } from './stages.controller';
import { WorksheetsController } from './worksheets.controller';
import { WorksheetsService } from './worksheets.service';

@Module({
  imports: [InstrumentsModule, PeopleModule, PlansModule],
  controllers: [
    BuildsController,
    StagesController,
    ChecksController,
    PhotosController,
    ReviewsController,
    LicencesController,
    WorksheetsController,
  ],
  providers: [
    BuildRecordsService,
    BuildsService,
    InstrumentChoiceService,
    LicencesService,
    MarksService,
    PhotosService,
    ReadingsService,
    ReviewsService,
    StageMovesService,
    WorksheetsService,
  ],
  exports: [BuildsService, LicencesService, MarksService, PhotosService, ReadingsService, StageMovesService],
})
export class BuildsModule {}
