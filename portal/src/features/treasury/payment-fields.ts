import { exampleAmount, readMoney } from '../../lib/money';
import type { TakePayment } from './api/treasury';

/** What the form holds while it is typed. */
export interface PaymentFields {
  personId: string;
  method: TakePayment['method'];
  amount: string;
  receivedOn: string;
  note: string;
  invoiceIds: string[];
  /** Chosen once for each payment, so that a second press takes nothing. */
  clientKey: string;
}

export const emptyPayment = (today: string, clientKey: string): PaymentFields => ({
  personId: '',
  method: 'cash',
  amount: '',
  receivedOn: today,
  note: '',
  invoiceIds: [],
  clientKey,
});

/** @returns what is wrong with the amount, in words, or undefined. */
export function amountFault(text: string): string | undefined {
  const minor = readMoney(text);
  if (minor === undefined) return `Type an amount such as ${exampleAmount()}.`;
  return minor > 0 ? undefined : 'The amount is more than nothing.';
}

/** The body of the request. Call it when {@link amountFault} has found nothing. */
export function paymentBody({ amount, note, ...rest }: PaymentFields): TakePayment {
  const words = note.trim();
  return { ...rest, amountMinor: readMoney(amount) ?? 0, ...(words && { note: words }) };
}
