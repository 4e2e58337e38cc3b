import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import {
  ListPaymentsQueryDto,
  PaymentDto,
  PaymentsPageDto,
  ReceiptDto,
  TakePaymentDto,
} from './dto/payment.dto';
import { PaymentsService } from './payments.service';

@ApiTags('Dues')
@Controller()
export class PaymentsController {
  constructor(private readonly payments: PaymentsService) {}

  /** Latest first. */
  @Get('payments')
  @Access({ roles: ['treasurer'] })
  list(@CurrentActor() actor: Actor, @Query() query: ListPaymentsQueryDto): Promise<PaymentsPageDto> {
    return this.payments.list(actor, query);
  }

  /** Writes down cash, a cheque or a transfer. */
  @Post('payments')
  @Access({ roles: ['treasurer'] })
  take(@CurrentActor() actor: Actor, @Body() payment: TakePaymentDto): Promise<PaymentDto> {
    return this.payments.take(actor, payment);
  }

  @Post('payments/:paymentId/take-back')
  @HttpCode(200)
  @Access({ roles: ['treasurer'] })
  takeBack(
    @CurrentActor() actor: Actor,
    @Param('paymentId', ParseIdPipe) paymentId: string,
  ): Promise<PaymentDto> {
    return this.payments.takeBack(actor, paymentId);
  }

  /** A receipt: the payer's own, and the treasurer's. Its id is the payment's. */
  @Get('receipts/:paymentId')
  @Access('signed-in')
  receipt(
    @CurrentActor() actor: Actor,
    @Param('paymentId', ParseIdPipe) paymentId: string,
  ): Promise<ReceiptDto> {
    return this.payments.receipt(actor, paymentId);
  }
}
