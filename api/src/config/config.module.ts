import { Global, Module } from '@nestjs/common';
import { Environment, readEnvironment } from './environment';

/** Gives every room the one checked {@link Environment}. */
@Global()
@Module({
  providers: [{ provide: Environment, useFactory: () => readEnvironment(process.env) }],
  exports: [Environment],
})
export class ConfigModule {}
