import { randomUUID } from 'node:crypto';
import type { Actor } from '../../src/common/actor';
import type { OpenInvoiceDto, RaiseInvoiceDto } from '../../src/dues/dto/invoice.dto';
import type { PaymentDto, TakePaymentDto } from '../../src/dues/dto/payment.dto';
import { InvoicesService } from '../../src/dues/invoices.service';
import { PaymentsService } from '../../src/dues/payments.service';
import type { TestApp } from '../app';
import { person } from './person.factory';

/** A treasurer to act through the services. */
export async function treasurer(test: TestApp): Promise<Actor> {
  const { id, name } = await person(test, { name: 'Ines Calloway', roles: ['member', 'treasurer'] });
  return { personId: id, name, roles: ['member', 'treasurer'] };
}

/** An invoice of 24.00 due in 16 days; to a new person unless named. */
export async function invoice(
  test: TestApp,
  by: Actor,
  overrides: Partial<RaiseInvoiceDto> = {},
): Promise<OpenInvoiceDto> {
  const personId = overrides.personId ?? (await person(test)).id;
  return test.app.get(InvoicesService).raise(by, {
    kind: 'dues',
    description: 'Dues, January to March',
    amountMinor: 2400,
    dueOn: '2026-01-31',
    ...overrides,
    personId,
  });
}

/** What a treasurer's form sends: 24.00 in cash for the invoice. */
export function paymentFor(
  { personId, id }: Pick<OpenInvoiceDto, 'personId' | 'id'>,
  overrides: Partial<TakePaymentDto> = {},
): TakePaymentDto {
  const clientKey = randomUUID();
  const receivedOn = '2026-01-15';
  return {
    personId,
    method: 'cash',
    amountMinor: 2400,
    receivedOn,
    invoiceIds: [id],
    clientKey,
    ...overrides,
  };
}

export async function payment(
  test: TestApp,
  by: Actor,
  of: Pick<OpenInvoiceDto, 'personId' | 'id'>,
  overrides: Partial<TakePaymentDto> = {},
): Promise<PaymentDto> {
  return test.app.get(PaymentsService).take(by, paymentFor(of, overrides));
}
