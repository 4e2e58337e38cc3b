import type Stripe from 'stripe';

/**
 * The part of an SDK type that we answer with. Field names are checked against the SDK's; `Own` narrows what the SDK
 * leaves open (any text as a status) or expandable (an id or the whole object).
 */
type Shape<T, K extends keyof T, Own extends { [P in keyof Own]: P extends keyof T ? T[P] : never }> = Pick<
  T,
  K
> &
  Own;

export type Session = Shape<
  Stripe.Checkout.Session,
  | 'id'
  | 'object'
  | 'cancel_url'
  | 'client_reference_id'
  | 'created'
  | 'customer_email'
  | 'expires_at'
  | 'livemode'
  | 'payment_method_types',
  {
    amount_subtotal: number;
    amount_total: number;
    currency: string;
    customer: null;
    metadata: Record<string, string>;
    mode: 'payment';
    payment_intent: string | null;
    payment_status: 'paid' | 'unpaid';
    status: 'open' | 'complete' | 'expired';
    success_url: string;
    ui_mode: 'hosted_page';
    url: string | null;
  }
>;

export type Intent = Shape<
  Stripe.PaymentIntent,
  | 'id'
  | 'object'
  | 'amount'
  | 'amount_received'
  | 'created'
  | 'currency'
  | 'description'
  | 'last_payment_error'
  | 'livemode'
  | 'metadata'
  | 'payment_method_types'
  | 'receipt_email',
  {
    customer: null;
    latest_charge: string | null;
    payment_method: string | null;
    status: 'requires_payment_method' | 'processing' | 'succeeded' | 'canceled';
  }
>;

export type Charge = Shape<
  Stripe.Charge,
  | 'id'
  | 'object'
  | 'amount'
  | 'amount_captured'
  | 'amount_refunded'
  | 'captured'
  | 'created'
  | 'currency'
  | 'description'
  | 'disputed'
  | 'failure_code'
  | 'failure_message'
  | 'livemode'
  | 'metadata'
  | 'paid'
  | 'payment_method'
  | 'receipt_email'
  | 'refunded',
  {
    balance_transaction: string | null;
    customer: null;
    payment_intent: string;
    status: 'succeeded' | 'failed';
  }
>;

export type Transaction = Shape<
  Stripe.BalanceTransaction,
  | 'id'
  | 'object'
  | 'amount'
  | 'available_on'
  | 'balance_type'
  | 'created'
  | 'currency'
  | 'description'
  | 'exchange_rate'
  | 'fee'
  | 'fee_details'
  | 'net',
  {
    reporting_category: 'charge' | 'refund' | 'payout';
    source: string;
    status: 'pending' | 'available';
    type: 'charge' | 'refund' | 'payout';
  }
>;

export type Refund = Shape<
  Stripe.Refund,
  'id' | 'object' | 'amount' | 'created' | 'currency' | 'metadata' | 'receipt_number',
  {
    balance_transaction: string;
    charge: string;
    payment_intent: string;
    reason: RefundReason | null;
    status: 'succeeded';
  }
>;

export const REFUND_REASONS = ['duplicate', 'fraudulent', 'requested_by_customer'] as const;
type RefundReason = (typeof REFUND_REASONS)[number];

export type Payout = Shape<
  Stripe.Payout,
  | 'id'
  | 'object'
  | 'amount'
  | 'arrival_date'
  | 'automatic'
  | 'created'
  | 'currency'
  | 'description'
  | 'failure_code'
  | 'failure_message'
  | 'livemode'
  | 'metadata'
  | 'statement_descriptor',
  {
    balance_transaction: string;
    method: 'standard';
    reconciliation_status: 'completed';
    status: 'paid';
    type: 'bank_account';
  }
>;

/** Only these happen here; a name the SDK does not know drops out and its use no longer compiles. */
export type EventType = Extract<
  Stripe.Event['type'],
  | 'charge.failed'
  | 'charge.refunded'
  | 'charge.succeeded'
  | 'checkout.session.async_payment_failed'
  | 'checkout.session.async_payment_succeeded'
  | 'checkout.session.completed'
  | 'checkout.session.expired'
  | 'payment_intent.created'
  | 'payment_intent.payment_failed'
  | 'payment_intent.processing'
  | 'payment_intent.succeeded'
  | 'payout.created'
  | 'payout.paid'
  | 'refund.created'
>;

export type PaymentEvent = Pick<
  Stripe.EventBase,
  'id' | 'object' | 'api_version' | 'created' | 'livemode' | 'pending_webhooks'
> & {
  type: EventType;
  data: { object: Session | Intent | Charge | Refund | Payout };
  request: null;
};
