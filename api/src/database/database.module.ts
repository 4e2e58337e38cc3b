import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Environment } from '../config/environment';
import { databaseOptions } from './options';

@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [Environment],
      useFactory: (environment: Environment) => ({
        ...databaseOptions(environment.DATABASE_URL, environment.DATABASE_POOL, environment.DATABASE_WAIT),
        // Migrating is the start script's business: several processes start at once.
        migrationsRun: false,
        retryAttempts: 3,
      }),
    }),
  ],
})
export class DatabaseModule {}
