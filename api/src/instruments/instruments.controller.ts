import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { PageQueryDto } from '../common/paging.dto';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { ChangeCalibrationDto, ChangeConditionDto } from './dto/change-instrument.dto';
import { InstrumentHistoryDto } from './dto/instrument-change.dto';
import { InstrumentDetailDto, InstrumentPageDto } from './dto/instrument.dto';
import { ListInstrumentsQueryDto, UseDayQueryDto } from './dto/list-instruments.dto';
import { InstrumentCareService } from './instrument-care.service';
import { InstrumentsService } from './instruments.service';

@ApiTags('Instruments')
@Controller('instruments')
export class InstrumentsController {
  constructor(
    private readonly instruments: InstrumentsService,
    private readonly care: InstrumentCareService,
  ) {}

  /** Every instrument of the club, and whether you may book it on the day asked about. */
  @Get()
  @Access('signed-in')
  list(@CurrentActor() actor: Actor, @Query() query: ListInstrumentsQueryDto): Promise<InstrumentPageDto> {
    return this.instruments.list(actor, query);
  }

  @Get(':instrumentId')
  @Access('signed-in')
  show(
    @CurrentActor() actor: Actor,
    @Param('instrumentId', ParseIdPipe) instrumentId: string,
    @Query() query: UseDayQueryDto,
  ): Promise<InstrumentDetailDto> {
    return this.instruments.show(actor, instrumentId, query);
  }

  /** Who changed what on it, and when, the latest first. */
  @Get(':instrumentId/history')
  @Access('signed-in')
  history(
    @CurrentActor() actor: Actor,
    @Param('instrumentId', ParseIdPipe) instrumentId: string,
    @Query() query: PageQueryDto,
  ): Promise<InstrumentHistoryDto> {
    return this.instruments.history(actor, instrumentId, query);
  }

  /** Puts it in repair, out of use, or back in use. */
  @Post(':instrumentId/condition')
  @Access({ roles: ['steward'] })
  @HttpCode(204)
  changeCondition(
    @CurrentActor() actor: Actor,
    @Param('instrumentId', ParseIdPipe) instrumentId: string,
    @Body() body: ChangeConditionDto,
  ): Promise<void> {
    return this.care.changeCondition(actor, instrumentId, body);
  }

  /** Sets the last day on which its calibration holds. */
  @Post(':instrumentId/calibration')
  @Access({ roles: ['steward'] })
  @HttpCode(204)
  changeCalibration(
    @CurrentActor() actor: Actor,
    @Param('instrumentId', ParseIdPipe) instrumentId: string,
    @Body() body: ChangeCalibrationDto,
  ): Promise<void> {
    return this.care.changeCalibration(actor, instrumentId, body);
  }
}
