import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { writeDay } from '../common/club-day';
import { writeMinor } from '../common/minor-units';
import { ClubService } from '../club/club.service';
import { MailService } from '../mail/mail.service';
import { PeopleService } from '../people/people.service';
import type { PaymentDto } from './dto/payment.dto';

const HOW = { card: 'by card', cash: 'in cash', cheque: 'by cheque', transfer: 'by transfer' } as const;

@Injectable()
export class ReceiptMail {
  constructor(
    private readonly mail: MailService,
    private readonly people: PeopleService,
    private readonly club: ClubService,
  ) {}

  /** The receipt as a letter, in the transaction that took the money. */
  async queue(manager: EntityManager, payment: PaymentDto): Promise<void> {
    const payer = (await this.people.byIds([payment.personId], manager)).get(payment.personId);
    if (!payer) return;
    const { currency } = await this.club.settings(manager);
    const amount = `${writeMinor(payment.amountMinor, currency)} ${currency}`;
    const lines = payment.paid.map(
      (share) => `  ${share.invoiceNumber}  ${share.description}: ${writeMinor(share.amountMinor, currency)}`,
    );
    if (payment.creditMinor > 0)
      lines.push(`  Credit for later invoices: ${writeMinor(payment.creditMinor, currency)}`);
    const text = [
      `Received with thanks from ${payer.name}: ${amount} ${HOW[payment.method]} on ${writeDay(payment.receivedOn)}.`,
      lines.join('\n'),
      `Receipt ${payment.receiptNumber}. It is kept under Dues in the portal.`,
    ].join('\n\n');
    const subject = `Receipt ${payment.receiptNumber} for ${amount}`;
    await this.mail.queue(manager, [{ to: payer.email, subject, text }]);
  }
}
