import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { PageQueryDto } from '../common/paging.dto';
import { BenchPageDto } from './dto/bench.dto';
import { InstrumentsService } from './instruments.service';

@ApiTags('Instruments')
@Controller('benches')
export class BenchesController {
  constructor(private readonly instruments: InstrumentsService) {}

  /** The benches that can be booked, in the order they stand. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: PageQueryDto): Promise<BenchPageDto> {
    return this.instruments.benches(actor, query);
  }
}
