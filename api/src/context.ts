import type { Type } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { DataSource } from 'typeorm';
import { AppModule } from './app.module';
import type { Clock } from './common/clock';

/** The API's services without its HTTP: what a program needs that acts on the club from the inside. */
export interface ServiceContext {
  get: <T>(service: Type<T>) => T;
  database: DataSource;
  close: () => Promise<void>;
}

/** Wires the whole API on the given clock. The environment is read as by the server itself. */
export async function openContext(clock: Clock): Promise<ServiceContext> {
  const context = await NestFactory.createApplicationContext(AppModule.on(clock), {
    logger: ['error', 'warn'],
  });
  return {
    get: (service) => context.get(service, { strict: false }),
    database: context.get(DataSource),
    close: () => context.close(),
  };
}
