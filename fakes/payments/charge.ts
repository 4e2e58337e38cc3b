import type { CardFailure } from './cards';
import { newId, nowSeconds } from './ids';
import type { Charge, Intent } from './shapes';

export const newCharge = (intent: Intent, failure?: CardFailure): Charge => ({
  id: newId('ch'),
  object: 'charge',
  amount: intent.amount,
  amount_captured: failure ? 0 : intent.amount,
  amount_refunded: 0,
  balance_transaction: null,
  captured: !failure,
  created: nowSeconds(),
  currency: intent.currency,
  customer: null,
  description: intent.description,
  disputed: false,
  failure_code: failure?.code ?? null,
  failure_message: failure?.message ?? null,
  livemode: false,
  metadata: { ...intent.metadata },
  paid: !failure,
  payment_intent: intent.id,
  payment_method: intent.payment_method,
  receipt_email: intent.receipt_email,
  refunded: false,
  status: failure ? 'failed' : 'succeeded',
});
