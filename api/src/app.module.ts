import { Module, type DynamicModule } from '@nestjs/common';
import { DiscoveryModule } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { AuthModule } from './auth/auth.module';
import { BookingsModule } from './bookings/bookings.module';
import { BuildNightsModule } from './build-nights/build-nights.module';
import { BuildsModule } from './builds/builds.module';
import { ClubModule } from './club/club.module';
import type { Clock } from './common/clock';
import { CommonModule } from './common/common.module';
import { ConfigModule } from './config/config.module';
import { Environment } from './config/environment';
import { logging } from './config/logging';
import { DatabaseModule } from './database/database.module';
import { DuesModule } from './dues/dues.module';
import { GroupsModule } from './groups/groups.module';
import { HealthModule } from './health/health.module';
import { InstrumentsModule } from './instruments/instruments.module';
import { LedgerModule } from './ledger/ledger.module';
import { MailModule } from './mail/mail.module';
import { PeopleModule } from './people/people.module';
import { PlansModule } from './plans/plans.module';
import { ReconciliationModule } from './reconciliation/reconciliation.module';

const features = [
  AuthModule,
  BookingsModule,
  BuildNightsModule,
  BuildsModule,
  ClubModule,
  DuesModule,
  GroupsModule,
  HealthModule,
  InstrumentsModule,
  LedgerModule,
  MailModule,
  PeopleModule,
  PlansModule,
  ReconciliationModule,
];

const jobs = ScheduleModule.forRootAsync({
  inject: [Environment],
  useFactory: ({ FERRITE_JOBS }: Environment) => {
    const isOn = FERRITE_JOBS === 'on';
    return { cronJobs: isOn, intervals: isOn, timeouts: isOn };
  },
});

@Module({})
export class AppModule {
  /** The whole API. The product runs on the real clock; tests and seeds bring one they can set. */
  static on(clock: Clock): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule,
        CommonModule.on(clock),
        logging,
        DiscoveryModule,
        jobs,
        DatabaseModule,
        ...features,
      ],
    };
  }
}
