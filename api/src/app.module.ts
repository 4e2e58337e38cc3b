import { randomUUID } from 'node:crypto';
import { Module } from '@nestjs/common';
import { DiscoveryModule } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { LoggerModule } from 'nestjs-pino';
import { AuthModule } from './auth/auth.module';
import { ClubModule } from './club/club.module';
import { CommonModule } from './common/common.module';
import { ConfigModule } from './config/config.module';
import { Environment } from './config/environment';
import { DatabaseModule } from './database/database.module';
import { HealthModule } from './health/health.module';
import { MailModule } from './mail/mail.module';
import { PeopleModule } from './people/people.module';
import { PlansModule } from './plans/plans.module';
import { BuildsModule } from './builds/builds.module';
import { GroupsModule } from './groups/groups.module';
import { InstrumentsModule } from './instruments/instruments.module';
import { BookingsModule } from './bookings/bookings.module';
import { BuildNightsModule } from './build-nights/build-nights.module';
import { DuesModule } from './dues/dues.module';
import { LedgerModule } from './ledger/ledger.module';
import { ReconciliationModule } from './reconciliation/reconciliation.module';

@Module({
  imports: [
    ConfigModule,
    CommonModule,
    LoggerModule.forRootAsync({
      inject: [Environment],
      useFactory: ({ LOG_LEVEL }: Environment) => ({
        pinoHttp: {
          level: LOG_LEVEL,
          genReqId: () => randomUUID(),
          autoLogging: { ignore: (request) => request.url === '/api/health' },
          // Nothing secret is logged: no bodies at all, and no cookies or keys among the headers.
          serializers: {
            req: ({ id, method, url }: { id: string; method: string; url: string }) => ({
              id,
              method,
              url: url.split('?')[0],
            }),
            res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
          },
        },
      }),
    }),
    DiscoveryModule,
    ScheduleModule.forRoot(),
    DatabaseModule,
    HealthModule,
    AuthModule,
    PeopleModule,
    ClubModule,
    MailModule,
    PlansModule,
    BuildsModule,
    GroupsModule,
    InstrumentsModule,
    BookingsModule,
    BuildNightsModule,
    DuesModule,
    LedgerModule,
    ReconciliationModule,
  ],
})
export class AppModule {}
