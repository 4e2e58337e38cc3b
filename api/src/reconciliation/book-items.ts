import { Injectable } from '@nestjs/common';
import { AwaitingBankService } from '../dues/awaiting-bank.service';
import { InvoicesService } from '../dues/invoices.service';
import { PaymentsService } from '../dues/payments.service';
import type { OpenInvoiceDto } from '../dues/dto/invoice.dto';
import type { PaymentDto } from '../dues/dto/payment.dto';
import type { Account } from '../ledger/account.entity';
import type { BookItemDto } from './dto/statement.dto';
import type { LineMatch } from './line-match.entity';
import type { StatementLine } from './statement-line.entity';

/** More open items than these do not help anybody choose. */
const MOST_OPEN = 200;

/** The right-hand side of the reconciliation: what lines were matched to, then what still waits. */
@Injectable()
export class BookItems {
  constructor(
    private readonly invoices: InvoicesService,
    private readonly payments: PaymentsService,
    private readonly awaiting: AwaitingBankService,
  ) {}

  async of(
    lines: readonly StatementLine[],
    matches: ReadonlyMap<string, LineMatch>,
    accounts: readonly Account[],
  ): Promise<{ books: BookItemDto[]; booksLeftOut: number }> {
    const paymentIds = [...matches.values()].flatMap(({ paymentId }) => paymentId ?? []);
    const payments = await this.payments.byIds(paymentIds);
    const matched = lines.flatMap((line) => {
      const match = matches.get(line.id);
      return match ? behind(line, match, payments, accounts) : [];
    });
    const { items, total } = await this.open();
    return { books: [...matched, ...items], booksLeftOut: total - items.length };
  }

  private async open(): Promise<{ items: BookItemDto[]; total: number }> {
    const waiting = await this.awaiting.latest(MOST_OPEN);
    const invoices = await this.invoices.allOpen();
    const items = [...waiting.items.map(waitingItem), ...invoices.map(openItem)];
    return { items: items.slice(0, MOST_OPEN), total: waiting.total + invoices.length };
  }
}

function openItem(invoice: OpenInvoiceDto): BookItemDto {
  const { id, number, personName, description, openMinor, amountMinor } = invoice;
  const detail = openMinor < amountMinor ? `${description}, the rest` : description;
  return { kind: 'invoice', id, tag: number, name: personName, detail, amountMinor: openMinor, lineId: null };
}

function waitingItem({ id, receiptNumber, personName, method, amountMinor, paid }: PaymentDto): BookItemDto {
  const what = method === 'cheque' ? 'Cheque' : 'Transfer';
  const detail = [what, ...paid.map(({ invoiceNumber }) => invoiceNumber)].join(' ');
  return { kind: 'payment', id, tag: receiptNumber, name: personName, detail, amountMinor, lineId: null };
}

function behind(
  line: StatementLine,
  match: LineMatch,
  payments: ReadonlyMap<string, PaymentDto>,
  accounts: readonly Account[],
): BookItemDto[] {
  const payment = payments.get(match.paymentId ?? '');
  if (payment) return shares(payment, line.id);
  const code = match.accountCode ?? '';
  const name = accounts.find((account) => account.code === code)?.name ?? code;
  const { note: detail } = match;
  return [
    { kind: 'account', id: code, tag: code, name, detail, amountMinor: line.amountMinor, lineId: line.id },
  ];
}

/** One item for each invoice it paid, and one for what it left over. */
function shares(payment: PaymentDto, lineId: string): BookItemDto[] {
  const { id, receiptNumber, personName: name, creditMinor } = payment;
  const paid = payment.paid.map(({ invoiceId, invoiceNumber, description, amountMinor }) => ({
    kind: 'invoice' as const,
    id: invoiceId,
    tag: invoiceNumber,
    name,
    detail: description,
    amountMinor,
    lineId,
  }));
  if (creditMinor === 0) return paid;
  const detail = 'Credit on account';
  return [
    ...paid,
    { kind: 'payment', id, tag: receiptNumber, name, detail, amountMinor: creditMinor, lineId },
  ];
}
