import { Global, Module, type DynamicModule } from '@nestjs/common';
import { Clock } from './clock';
import { ProblemsController } from './problems.controller';

@Global()
@Module({ controllers: [ProblemsController] })
export class CommonModule {
  static on(clock: Clock): DynamicModule {
    return { module: CommonModule, providers: [{ provide: Clock, useValue: clock }], exports: [Clock] };
  }
}
