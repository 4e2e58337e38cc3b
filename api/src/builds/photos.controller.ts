import { Body, Controller, Delete, Get, HttpCode, Param, Post, Res, UploadedFile } from '@nestjs/common';
import { ApiBody, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { TakesFile } from '../common/one-file';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { AddPhotoDto, PhotoDto } from './dto/evidence.dto';
import { PHOTO_BYTES } from './photos.rules';
import { PhotosService } from './photos.service';

const UPLOAD = {
  type: 'object',
  required: ['photo'],
  properties: {
    photo: { type: 'string', format: 'binary' },
    caption: { type: 'string', maxLength: 120 },
  },
};

@ApiTags('Builds')
@Controller('builds/:buildId')
export class PhotosController {
  constructor(private readonly photos: PhotosService) {}

  /** Adds a picture of at most 6 MB to a check that asks for one. */
  @Post('checks/:checkId/photos')
  @Access('signed-in')
  @ApiBody({ schema: UPLOAD })
  @TakesFile('photo', { bytes: PHOTO_BYTES, fields: 4 })
  add(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('checkId', ParseIdPipe) checkId: string,
    @UploadedFile() file: { buffer: Buffer } | undefined,
    @Body() body: AddPhotoDto,
  ): Promise<PhotoDto> {
    return this.photos.add(actor, buildId, checkId, file?.buffer, body);
  }

  /** The picture itself. */
  @Get('photos/:photoId')
  @Access('signed-in')
  @ApiOkResponse({ content: { 'image/*': { schema: { type: 'string', format: 'binary' } } } })
  async show(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('photoId', ParseIdPipe) photoId: string,
    @Res() response: Response,
  ): Promise<void> {
    const { bytes, contentType, sha256 } = await this.photos.bytes(actor, buildId, photoId);
    // The browser may keep it, but asks each time whether it may still show it.
    response.set({
      'Cache-Control': 'private, no-cache',
      'Content-Disposition': 'inline',
      ETag: `"${sha256}"`,
    });
    response.type(contentType).send(bytes);
  }

  /** Takes a picture back while the stage is still in its builder's hands. */
  @Delete('photos/:photoId')
  @HttpCode(204)
  @Access('signed-in')
  takeBack(
    @CurrentActor() actor: Actor,
    @Param('buildId', ParseIdPipe) buildId: string,
    @Param('photoId', ParseIdPipe) photoId: string,
  ): Promise<void> {
    return this.photos.takeBack(actor, buildId, photoId);
  }
}
