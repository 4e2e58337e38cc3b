import type { Payment } from './api/dues';

/** How money came, in a table. */
export const HOW: Record<Payment['method'], string> = {
  card: 'Card',
  cash: 'Cash',
  cheque: 'Cheque',
  transfer: 'Transfer',
};

/** The same on a receipt. */
export const PAID_HOW: Record<Payment['method'], string> = {
  card: 'By card, on the club’s payment page',
  cash: 'In cash',
  cheque: 'By cheque',
  transfer: 'By transfer',
};
