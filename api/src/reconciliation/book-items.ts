import { Injectable } from '@nestjs/common';
import { InvoicesService } from '../dues/invoices.service';
import { PaymentsService } from '../dues/payments.service';
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
    const open = await this.open();
    return {
      books: [...matched, ...open.slice(0, MOST_OPEN)],
      booksLeftOut: Math.max(open.length - MOST_OPEN, 0),
    };
  }

  private async open(): Promise<BookItemDto[]> {
    const waiting = await this.payments.awaitingBank();
    const invoices = await this.invoices.allOpen();
    return [
      ...waiting.map(waitingItem),
      ...invoices.map(({ id, number, personName, description, openMinor, amountMinor }) => ({
        kind: 'invoice' as const,
        id,
        tag: number,
        name: personName,
        detail: openMinor < amountMinor ? `${description}, the rest` : description,
        amountMinor: openMinor,
        lineId: null,
      })),
    ];
  }
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
