import { readCurrency } from './checkout-params';
import type { Context } from './context';
import { newId, nowSeconds } from './ids';
import type { Params } from './params';
import { ServiceError } from './service-error';
import type { Payout, Transaction } from './shapes';
import { put } from './store';
import { writePayoutTransaction } from './transactions';

/** Sends all that no earlier payout carried, settled or not, to the bank: tests do not wait two days. */
export function createPayout(context: Context, params: Params): Payout {
  params.allowOnly(['arrival_date', 'currency']);
  const currency = params.has('currency') ? readCurrency(params) : 'gbp';
  const carried = waiting(context, currency);
  const amount = carried.reduce((sum, one) => sum + one.net, 0);
  if (amount <= 0)
    throw new ServiceError(400, `There is no ${currency} balance to pay out.`, {
      code: 'balance_insufficient',
    });
  const bare = newPayout(amount, currency, params);
  const own = writePayoutTransaction(context, bare);
  const payout = put(context.store.payouts, { ...bare, balance_transaction: own.id });
  [...carried, own].forEach((one) => carry(context, one, payout));
  context.emit('payout.created', payout);
  context.emit('payout.paid', payout);
  return payout;
}

const waiting = ({ store }: Context, currency: string): Transaction[] =>
  [...store.transactions.values()].filter((one) => one.currency === currency && !store.paidOut.has(one.id));

function carry(context: Context, transaction: Transaction, payout: Payout): void {
  transaction.status = 'available';
  transaction.available_on = Math.min(transaction.available_on, payout.created);
  put(context.store.paidOut, { id: transaction.id, payout: payout.id });
}

function newPayout(amount: number, currency: string, params: Params): Omit<Payout, 'balance_transaction'> {
  const created = nowSeconds();
  return {
    id: newId('po'),
    object: 'payout',
    amount,
    arrival_date: params.wholeNumber('arrival_date', { min: 0, max: 9_999_999_999 }) ?? created,
    automatic: true,
    created,
    currency,
    description: 'Card payout',
    failure_code: null,
    failure_message: null,
    livemode: false,
    metadata: {},
    method: 'standard',
    reconciliation_status: 'completed',
    statement_descriptor: 'CARD PAYOUT',
    status: 'paid',
    type: 'bank_account',
  };
}
