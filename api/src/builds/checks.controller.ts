import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { InstrumentChoiceDto, MarkDto } from './dto/evidence.dto';
import { KeepReadingDto, ReadingDto } from './dto/reading.dto';
import { InstrumentChoiceService } from './instrument-choice.service';
import { MarksService } from './marks.service';
import { ReadingsService } from './readings.service';

@ApiTags('Builds')
@Controller('builds/:buildId/checks/:checkId')
export class ChecksController {
  constructor(
    private readonly readings: ReadingsService,
    private readonly marks: MarksService,
    private readonly instruments: InstrumentChoiceService,
  ) {}

  /** Keeps a reading as typed; the answer says what it comes to and how it is judged. */
  @Post('readings')
  @Access('signed-in')
  keepReading(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('checkId', ParseIdPipe) checkId: string,
    @Body() body: KeepReadingDto,
  ): Promise<ReadingDto> {
    return this.readings.keep(actor, buildId, checkId, body);
  }

  /** Ticks the check, acknowledges it by name, or says that a mentor has seen it. */
  @Post('marks')
  @Access('signed-in')
  mark(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('checkId', ParseIdPipe) checkId: string,
  ): Promise<MarkDto> {
    return this.marks.mark(actor, buildId, checkId);
  }

  @Delete('marks')
  @HttpCode(204)
  @Access('signed-in')
  takeBackMark(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('checkId', ParseIdPipe) checkId: string,
  ): Promise<void> {
    return this.marks.takeBack(actor, buildId, checkId);
  }

  /** Instruments of the kind the check asks for, with the reason against those that cannot be chosen. */
  @Get('instruments')
  @Access('signed-in')
  listInstruments(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('checkId', ParseIdPipe) checkId: string,
  ): Promise<InstrumentChoiceDto[]> {
    return this.instruments.list(actor, buildId, checkId);
  }
}
