import { Global, Module } from '@nestjs/common';
import { Clock } from './clock';
import { ProblemsController } from './problems.controller';

@Global()
@Module({ controllers: [ProblemsController], providers: [Clock], exports: [Clock] })
export class CommonModule {}
