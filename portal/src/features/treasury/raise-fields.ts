import { readMoney } from '../../lib/money';
import type { RaiseInvoice } from './api/treasury';

/** What the form of an invoice holds while it is typed. */
export interface RaiseFields {
  personId: string;
  kind: RaiseInvoice['kind'];
  description: string;
  amount: string;
  dueOn: string;
}

export const emptyInvoice = (dueOn: string): RaiseFields => ({
  personId: '',
  kind: 'dues',
  description: '',
  amount: '',
  dueOn,
});

/** The body of the request. Call it when the form has found no fault. */
export const invoiceBody = ({ amount, description, ...rest }: RaiseFields): RaiseInvoice => ({
  ...rest,
  description: description.trim(),
  amountMinor: readMoney(amount) ?? 0,
});
