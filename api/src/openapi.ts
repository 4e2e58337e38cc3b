import { writeFileSync } from 'node:fs';
import { NestFactory } from '@nestjs/core';
import { AppModule } from './app.module';
import { Clock } from './common/clock';
import { describeApi } from './openapi.document';

/** Writes the OpenAPI document to the file named on the command line. Needs no database: nothing is started. */
async function writeDocument(file: string): Promise<void> {
  const app = await NestFactory.create(AppModule.on(new Clock()), { preview: true, logger: ['error'] });
  app.setGlobalPrefix('api');
  writeFileSync(file, `${JSON.stringify(describeApi(app), null, 2)}\n`);
}

void writeDocument(process.argv[2] ?? 'openapi.json');
