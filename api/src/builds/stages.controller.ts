import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { BuildStageDto } from './dto/build-stage.dto';
import { SendBackDto, StageNoteDto } from './dto/stage-moves.dto';
import { StageMovesService } from './stage-moves.service';

@ApiTags('Builds')
@Controller('builds/:buildId/stages/:stageId')
export class StagesController {
  constructor(private readonly moves: StageMovesService) {}

  /** Sends the stage to a mentor, with a note. */
  @Post('submit')
  @HttpCode(200)
  @Access('signed-in')
  submit(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('stageId', ParseIdPipe) stageId: string,
    @Body() body: StageNoteDto,
  ): Promise<BuildStageDto> {
    return this.moves.submit(actor, buildId, stageId, body);
  }

  /** Takes the stage back from the mentor. */
  @Post('withdraw')
  @HttpCode(200)
  @Access('signed-in')
  withdraw(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('stageId', ParseIdPipe) stageId: string,
  ): Promise<BuildStageDto> {
    return this.moves.withdraw(actor, buildId, stageId);
  }

  @Post('sign-off')
  @HttpCode(200)
  @Access({ roles: ['mentor'] })
  signOff(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('stageId', ParseIdPipe) stageId: string,
    @Body() body: StageNoteDto,
  ): Promise<BuildStageDto> {
    return this.moves.signOff(actor, buildId, stageId, body);
  }

  /** Sends the stage back to its builder with a word. */
  @Post('send-back')
  @HttpCode(200)
  @Access({ roles: ['mentor'] })
  sendBack(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('stageId', ParseIdPipe) stageId: string,
    @Body() body: SendBackDto,
  ): Promise<BuildStageDto> {
    return this.moves.sendBack(actor, buildId, stageId, body);
  }
}
