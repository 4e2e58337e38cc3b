import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import supertest from 'supertest';
import { DataSource } from 'typeorm';
import { AppModule } from '../src/app.module';
import { setUpApp } from '../src/app.setup';
import { SettableClock } from '../src/common/clock';
import { Environment, readEnvironment } from '../src/config/environment';
import { createDatabase } from './database';

/** A Thursday in the club's winter, before the evening begins. */
export const TEST_NOW = new Date('2026-01-15T12:00:00Z');

export interface TestApp {
  app: NestExpressApplication;
  clock: SettableClock;
  dataSource: DataSource;
  environment: Environment;
  /** Requests from somebody who is not signed in. */
  http: () => supertest.Agent;
  /** The address it listens on, for races that need real sockets. */
  baseUrl: string;
  close: () => Promise<void>;
}

/** The whole API on a database of its own and a clock that stands at {@link TEST_NOW}. */
export async function startTestApp(overrides: Partial<Environment> = {}): Promise<TestApp> {
  const database = await createDatabase();
  const test = await appOn(database.url, overrides);
  const close = async (): Promise<void> => {
    await test.close();
    await database.drop();
  };
  return { ...test, close };
}

/** Another process of the API on a database that is there already: it knows nothing of what the first one read. */
export async function appOn(url: string, overrides: Partial<Environment> = {}): Promise<TestApp> {
  const clock = new SettableClock(TEST_NOW);
  const environment = readEnvironment({ ...testEnvironment(url), ...overrides });
  const module = await Test.createTestingModule({ imports: [AppModule.on(clock)] })
    .overrideProvider(Environment)
    .useValue(environment)
    .compile();
  const app = module.createNestApplication<NestExpressApplication>({ rawBody: true });
  setUpApp(app);
  await app.listen(0, '127.0.0.1');
  const server = app.getHttpServer();
  const baseUrl = await app.getUrl();
  return {
    app,
    clock,
    environment,
    dataSource: app.get(DataSource),
    http: () => supertest.agent(server),
    baseUrl,
    close: () => app.close(),
  };
}

export function testEnvironment(databaseUrl: string): Record<string, string> {
  return {
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl,
    DATABASE_POOL: '12',
    JWT_SECRET: 'only for tests, and long enough to be taken',
    STRIPE_SECRET_KEY: 'sk_test_ferrite_row',
    STRIPE_WEBHOOK_SECRET: 'whsec_test_ferrite_row',
    STRIPE_API_BASE: 'http://127.0.0.1:9',
    SMTP_URL: 'smtp://127.0.0.1:9',
    PORTAL_DIST: '/nowhere',
    LOG_LEVEL: 'silent',
    FERRITE_JOBS: 'off',
  };
}
