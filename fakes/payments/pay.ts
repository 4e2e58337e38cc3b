import type { CardFailure, CardOutcome } from './cards';
import { newCharge } from './charge';
import type { Context } from './context';
import { newId, nowSeconds } from './ids';
import type { Intent, Session } from './shapes';
import { put } from './store';
import { writeChargeTransaction } from './transactions';

/** What the payer did, for the open `session`; the outcome was read from the card number. */
export function pay(context: Context, session: Session, outcome: CardOutcome): void {
  const intent = intentFor(context, session);
  if (outcome.kind === 'declined') return refuse(context, intent, outcome.failure);
  intent.payment_method = newId('pm');
  intent.last_payment_error = null;
  session.status = 'complete';
  if (outcome.kind === 'late') return startLate(context, session, intent, outcome.failure);
  settle(context, session, intent);
  context.emit('checkout.session.completed', session);
}

function startLate(context: Context, session: Session, intent: Intent, failure?: CardFailure): void {
  intent.status = 'processing';
  put(context.store.latePayments, { id: session.id, dueAtMs: Date.now() + context.settings.lateMs, failure });
  context.emit('payment_intent.processing', intent);
  context.emit('checkout.session.completed', session);
  context.confirmLater(session.id);
}

/** The bank's late answer. Asked a second time for the same session it does nothing. */
export function finishLate(context: Context, sessionId: string): void {
  const late = context.store.latePayments.get(sessionId);
  const session = context.store.sessions.get(sessionId);
  if (!late || !session) return;
  context.store.latePayments.delete(sessionId);
  const intent = intentFor(context, session);
  if (late.failure) refuse(context, intent, late.failure);
  else settle(context, session, intent);
  context.emit(`checkout.session.async_payment_${late.failure ? 'failed' : 'succeeded'}`, session);
}

function settle(context: Context, session: Session, intent: Intent): void {
  const charge = put(context.store.charges, newCharge(intent));
  charge.balance_transaction = writeChargeTransaction(context, charge).id;
  intent.latest_charge = charge.id;
  intent.amount_received = intent.amount;
  intent.status = 'succeeded';
  session.payment_status = 'paid';
  context.emit('charge.succeeded', charge);
  context.emit('payment_intent.succeeded', intent);
}

function refuse(context: Context, intent: Intent, failure: CardFailure): void {
  const charge = put(context.store.charges, newCharge(intent, failure));
  intent.latest_charge = charge.id;
  intent.payment_method = null;
  intent.status = 'requires_payment_method';
  intent.last_payment_error = {
    type: 'card_error',
    charge: charge.id,
    code: failure.code,
    decline_code: failure.declineCode,
    message: failure.message,
  };
  context.emit('charge.failed', charge);
  context.emit('payment_intent.payment_failed', intent);
}

/** A session has no payment intent until somebody first tries to pay. */
function intentFor(context: Context, session: Session): Intent {
  const known =
    session.payment_intent === null ? undefined : context.store.intents.get(session.payment_intent);
  if (known) return known;
  const intent = put(context.store.intents, newIntent(context, session));
  session.payment_intent = intent.id;
  context.emit('payment_intent.created', intent);
  return intent;
}

function newIntent(context: Context, session: Session): Intent {
  const given = context.store.baskets.get(session.id)?.intent;
  return {
    id: newId('pi'),
    object: 'payment_intent',
    amount: session.amount_total,
    amount_received: 0,
    created: nowSeconds(),
    currency: session.currency,
    customer: null,
    description: given?.description ?? null,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    metadata: given?.metadata ?? {},
    payment_method: null,
    payment_method_types: ['card'],
    receipt_email: given?.receiptEmail ?? null,
    status: 'requires_payment_method',
  };
}
