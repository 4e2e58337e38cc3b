import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Access, CurrentActor } from '../common/access';
import type { Actor } from '../common/actor';
import { ParseIdPipe } from '../common/parse-id.pipe';
import { CardCheckService } from './card-check.service';
import { CheckoutService } from './checkout.service';
import { CardPaymentDto, CheckoutDto } from './dto/checkout.dto';
import {
  InvoiceDto,
  InvoicesPageDto,
  ListInvoicesQueryDto,
  OpenInvoiceDto,
  RaiseInvoiceDto,
} from './dto/invoice.dto';
import { InvoicesService } from './invoices.service';

@ApiTags('Dues')
@Controller('invoices')
export class InvoicesController {
  constructor(
    private readonly invoices: InvoicesService,
    private readonly checkout: CheckoutService,
    private readonly cardCheck: CardCheckService,
  ) {}

  /** What the signed-in person owes and has paid. */
  @Get('mine')
  @Access('signed-in')
  mine(@CurrentActor() actor: Actor): Promise<InvoiceDto[]> {
    return this.invoices.mine(actor);
  }

  /** Everybody's, those due first first. */
  @Get()
  @Access({ roles: ['treasurer'] })
  list(@CurrentActor() actor: Actor, @Query() query: ListInvoicesQueryDto): Promise<InvoicesPageDto> {
    return this.invoices.list(actor, query);
  }

  @Post()
  @Access({ roles: ['treasurer'] })
  raise(@CurrentActor() actor: Actor, @Body() invoice: RaiseInvoiceDto): Promise<OpenInvoiceDto> {
    return this.invoices.raise(actor, invoice);
  }

  /** Opens the card service's page for what is left to pay. */
  @Post(':invoiceId/checkout')
  @HttpCode(200)
  @Access('signed-in')
  open(
    @CurrentActor() actor: Actor,
    @Param('invoiceId', ParseIdPipe) invoiceId: string,
  ): Promise<CheckoutDto> {
    return this.checkout.open(actor, invoiceId);
  }

  /** What became of the last visit to the card page. Asked again and again by the page a person comes back to. */
  @Get(':invoiceId/card-payment')
  @Access('signed-in')
  cardPayment(
    @CurrentActor() actor: Actor,
    @Param('invoiceId', ParseIdPipe) invoiceId: string,
  ): Promise<CardPaymentDto> {
    return this.checkout.cardPayment(actor, invoiceId);
  }

  /** Asks the card service itself, for the page that has waited long enough for its word. */
  @Post(':invoiceId/card-payment/check')
  @HttpCode(200)
  @Access('signed-in')
  check(
    @CurrentActor() actor: Actor,
    @Param('invoiceId', ParseIdPipe) invoiceId: string,
  ): Promise<CardPaymentDto> {
    return this.cardCheck.check(actor, invoiceId);
  }
}
