import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ClubModule } from '../club/club.module';
import { PeopleModule } from '../people/people.module';
import { BenchesController } from './benches.controller';
import { Clearance } from './clearance.entity';
import { ClearancesController } from './clearances.controller';
import { ClearancesService } from './clearances.service';
import { InstrumentCareService } from './instrument-care.service';
import { InstrumentChange } from './instrument-change.entity';
import { InstrumentUseService } from './instrument-use.service';
import { Instrument } from './instrument.entity';
import { InstrumentsController } from './instruments.controller';
import { InstrumentsService } from './instruments.service';
import { InventoryService } from './inventory.service';
import { Resource } from './resource.entity';

@Module({
  imports: [
    TypeOrmModule.forFeature([Clearance, Instrument, InstrumentChange, Resource]),
    ClubModule,
    PeopleModule,
  ],
  controllers: [BenchesController, InstrumentsController, ClearancesController],
  providers: [
    ClearancesService,
    InstrumentCareService,
    InstrumentsService,
    InstrumentUseService,
    InventoryService,
  ],
  exports: [
    ClearancesService,
    InstrumentCareService,
    InstrumentsService,
    InstrumentUseService,
    InventoryService,
  ],
})
export class InstrumentsModule {}
