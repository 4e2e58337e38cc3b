import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import { setUpApp } from './app.setup';
import { Clock } from './common/clock';
import { Environment } from './config/environment';

async function main(): Promise<void> {
  // rawBody: the card service signs the bytes it sends, so they are kept as they came.
  const app = await NestFactory.create<NestExpressApplication>(AppModule.on(new Clock()), {
    rawBody: true,
    bufferLogs: true,
  });
  setUpApp(app);
  const { HOST, PORT } = app.get(Environment);
  await app.listen(PORT, HOST);
}

void main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
