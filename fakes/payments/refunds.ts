import type { Context } from './context';
import { newId, nowSeconds } from './ids';
import type { Params } from './params';
import { badParameter, missingParameter, notFound, ServiceError } from './service-error';
import { type Charge, type Refund, REFUND_REASONS } from './shapes';
import { put } from './store';
import { writeRefundTransaction } from './transactions';

const REFUND_PARAMS = ['amount', 'charge', 'expand', 'metadata', 'payment_intent', 'reason'];

export function createRefund(context: Context, params: Params): Refund {
  params.allowOnly(REFUND_PARAMS);
  const charge = chargeToRefund(context, params);
  const bare = { ...newRefund(charge, params), amount: amountToRefund(charge, params) };
  const refund = { ...bare, balance_transaction: writeRefundTransaction(context, bare).id };
  put(context.store.refunds, refund);
  charge.amount_refunded += refund.amount;
  charge.refunded = charge.amount_refunded === charge.amount;
  context.emit('refund.created', refund);
  context.emit('charge.refunded', charge);
  return refund;
}

const newRefund = (charge: Charge, params: Params): Omit<Refund, 'balance_transaction' | 'amount'> => ({
  id: newId('re'),
  object: 'refund',
  charge: charge.id,
  created: nowSeconds(),
  currency: charge.currency,
  metadata: params.metadata('metadata'),
  payment_intent: charge.payment_intent,
  reason: params.oneOf('reason', REFUND_REASONS) ?? null,
  receipt_number: null,
  status: 'succeeded',
});

function chargeToRefund(context: Context, params: Params): Charge {
  const charge = params.has('charge') ? namedCharge(context, params) : chargeOfIntent(context, params);
  if (charge?.status !== 'succeeded')
    throw new ServiceError(400, 'This payment has not succeeded, so there is nothing to refund.');
  return charge;
}

function namedCharge(context: Context, params: Params): Charge {
  const id = params.requiredText('charge');
  const charge = context.store.charges.get(id);
  if (!charge) throw notFound(id, 'charge');
  return charge;
}

function chargeOfIntent(context: Context, params: Params): Charge | undefined {
  const id = params.text('payment_intent');
  if (id === undefined) throw missingParameter('payment_intent');
  const intent = context.store.intents.get(id);
  if (!intent) throw notFound(id, 'payment_intent');
  return intent.latest_charge === null ? undefined : context.store.charges.get(intent.latest_charge);
}

function amountToRefund(charge: Charge, params: Params): number {
  const left = charge.amount - charge.amount_refunded;
  if (left === 0)
    throw new ServiceError(400, 'This charge is refunded already.', { code: 'charge_already_refunded' });
  const amount = params.wholeNumber('amount', { min: 1, max: charge.amount }) ?? left;
  if (amount > left) throw badParameter('amount', `Only ${left} of the charge is left to refund`);
  return amount;
}
