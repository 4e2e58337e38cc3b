import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ClubController } from './club.controller';
import { Club } from './club.entity';
import { ClubService } from './club.service';
import { OpeningHours } from './opening-hours.entity';
import { OpeningHoursService } from './opening-hours.service';

@Module({
  imports: [TypeOrmModule.forFeature([Club, OpeningHours])],
  controllers: [ClubController],
  providers: [ClubService, OpeningHoursService],
  exports: [ClubService, OpeningHoursService],
})
export class ClubModule {}
