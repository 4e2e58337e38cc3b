import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ClubModule } from '../club/club.module';
import { LedgerModule } from '../ledger/ledger.module';
import { MailModule } from '../mail/mail.module';
import { PeopleModule } from '../people/people.module';
import { AwaitingBankService } from './awaiting-bank.service';
import { CardCheckService } from './card-check.service';
import { CardEvents } from './card-events';
import { CardService } from './card-service';
import { CheckoutService } from './checkout.service';
import { CreditService } from './credit.service';
import { DuesController } from './dues.controller';
import { Invoice } from './invoice.entity';
import { InvoicesController } from './invoices.controller';
import { InvoicesRepository } from './invoices.repository';
import { InvoicesService } from './invoices.service';
import { MyDuesService } from './my-dues.service';
import { PaymentEvent } from './payment-event.entity';
import { Payment } from './payment.entity';
import { PaymentsController } from './payments.controller';
import { PaymentsRepository } from './payments.repository';
import { PaymentsService } from './payments.service';
import { ReceiptMail } from './receipt-mail';
import { PersonTier, Tier } from './tier.entity';
import { TiersService } from './tiers.service';
import { TillService } from './till.service';
import { TreasuryService } from './treasury.service';
import { WebhooksController } from './webhooks.controller';
import { WebhooksService } from './webhooks.service';

@Module({
  imports: [
    TypeOrmModule.forFeature([Invoice, Payment, PaymentEvent, PersonTier, Tier]),
    ClubModule,
    LedgerModule,
    MailModule,
    PeopleModule,
  ],
  controllers: [DuesController, InvoicesController, PaymentsController, WebhooksController],
  providers: [
    AwaitingBankService,
    CardCheckService,
    CardEvents,
    CardService,
    CheckoutService,
    CreditService,
    InvoicesRepository,
    InvoicesService,
    MyDuesService,
    PaymentsRepository,
    PaymentsService,
    ReceiptMail,
    TiersService,
    TillService,
    TreasuryService,
    WebhooksService,
  ],
  exports: [AwaitingBankService, InvoicesService, PaymentsService, TiersService, TillService],
})
export class DuesModule {}
