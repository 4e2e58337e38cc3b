import { Controller, Headers, HttpCode, Post, Req, type RawBodyRequest } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Access } from '../common/access';
import { WebhookDto } from './dto/webhook.dto';
import { WebhooksService } from './webhooks.service';

@ApiTags('Card service')
@Controller('webhooks')
export class WebhooksController {
  constructor(private readonly webhooks: WebhooksService) {}

  /** Events of the card service. The signature over the raw body is the proof of who calls. */
  @Post('stripe')
  @HttpCode(200)
  @Access('public')
  receive(
    @Req() request: RawBodyRequest<Request>,
    @Headers('stripe-signature') signature?: string,
  ): Promise<WebhookDto> {
    return this.webhooks.receive(request.rawBody, signature);
  }
}
