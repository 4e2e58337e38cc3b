import type { Context } from './context';
import { feeMinor } from './fees';
import { newId, nowSeconds } from './ids';
import type { Charge, Payout, Refund, Transaction } from './shapes';
import { put } from './store';

/** Money of a card payment waits two days before it may be paid out (common practice). */
const SETTLING_SECONDS = 2 * 86_400;

type Movement = Pick<Transaction, 'amount' | 'currency' | 'source' | 'type' | 'description'>;

export function writeChargeTransaction(context: Context, charge: Charge): Transaction {
  const { id: source, amount, currency, description } = charge;
  const fee = feeMinor(amount, context.settings.fee);
  return put(
    context.store.transactions,
    newTransaction({ amount, currency, source, type: 'charge', description }, fee),
  );
}

/** The fee of the first payment is not given back (common practice). */
export function writeRefundTransaction(
  context: Context,
  refund: Omit<Refund, 'balance_transaction'>,
): Transaction {
  const { id: source, currency } = refund;
  const movement: Movement = { amount: -refund.amount, currency, source, type: 'refund', description: null };
  return put(context.store.transactions, newTransaction(movement));
}

export function writePayoutTransaction(
  context: Context,
  payout: Omit<Payout, 'balance_transaction'>,
): Transaction {
  const { id: source, currency, description } = payout;
  const movement: Movement = { amount: -payout.amount, currency, source, type: 'payout', description };
  return put(context.store.transactions, newTransaction(movement));
}

function newTransaction(movement: Movement, fee = 0): Transaction {
  const { currency } = movement;
  const created = nowSeconds();
  const waits = movement.type === 'charge';
  const detail = {
    amount: fee,
    application: null,
    currency,
    description: 'Processing fee',
    type: 'stripe_fee',
  };
  return {
    id: newId('txn'),
    object: 'balance_transaction',
    ...movement,
    available_on: waits ? created + SETTLING_SECONDS : created,
    balance_type: 'payments',
    created,
    exchange_rate: null,
    fee,
    fee_details: fee > 0 ? [detail] : [],
    net: movement.amount - fee,
    reporting_category: movement.type,
    status: waits ? 'pending' : 'available',
  };
}
