import type Stripe from 'stripe';
import type { Params } from './params';
import { badParameter, missingParameter } from './service-error';
import type { Basket } from './store';

type SessionParam = keyof Stripe.Checkout.SessionCreateParams;
type LineParam = keyof Stripe.Checkout.SessionCreateParams.LineItem;
type PriceParam = keyof Stripe.Checkout.SessionCreateParams.LineItem.PriceData;
type IntentParam = keyof Stripe.Checkout.SessionCreateParams.PaymentIntentData;

/** What a session may be opened with here; anything else is refused rather than silently ignored. */
export const SESSION_PARAMS = [
  'cancel_url',
  'client_reference_id',
  'customer_email',
  'expand',
  'expires_at',
  'line_items',
  'locale',
  'metadata',
  'mode',
  'payment_intent_data',
  'submit_type',
  'success_url',
] satisfies SessionParam[];
const LINE_PARAMS = ['price_data', 'quantity'] satisfies LineParam[];
const PRICE_PARAMS = ['currency', 'product_data', 'unit_amount'] satisfies PriceParam[];
const INTENT_PARAMS = ['description', 'metadata', 'receipt_email'] satisfies IntentParam[];

/** Eight digits is the service's own limit for one amount. */
const AMOUNT = { min: 0, max: 99_999_999 };

export function basketOf(params: Params, id: string): Basket & { currency: string; totalMinor: number } {
  const items = params.groups('line_items').map(readItem);
  const [first] = items;
  if (!first) throw missingParameter('line_items');
  if (items.some((item) => item.currency !== first.currency))
    throw badParameter('line_items', 'All line items must have the same currency');
  const totalMinor = items.reduce((sum, item) => sum + item.quantity * item.unitMinor, 0);
  if (totalMinor < 1 || totalMinor > AMOUNT.max)
    throw badParameter('line_items', `The total must be from 1 to ${AMOUNT.max} minor units`);
  const lines = items.map(({ name, quantity, unitMinor }) => ({ name, quantity, unitMinor }));
  return {
    id,
    lines,
    intent: readIntent(params.group('payment_intent_data')),
    currency: first.currency,
    totalMinor,
  };
}

function readItem(item: Params) {
  item.allowOnly(LINE_PARAMS);
  const price = item.group('price_data');
  price.allowOnly(PRICE_PARAMS);
  return {
    name: price.group('product_data').requiredText('name', 5000),
    currency: readCurrency(price),
    quantity: item.wholeNumber('quantity', { min: 1, max: 999_999 }) ?? 1,
    unitMinor: price.requiredWholeNumber('unit_amount', AMOUNT),
  };
}

export function readCurrency(params: Params): string {
  const currency = params.requiredText('currency').toLowerCase();
  if (!/^[a-z]{3}$/.test(currency)) throw badParameter('currency', `Invalid currency: ${currency}`);
  return currency;
}

function readIntent(data: Params): Basket['intent'] {
  data.allowOnly(INTENT_PARAMS);
  return {
    description: data.text('description', 1000) ?? null,
    metadata: data.metadata('metadata'),
    receiptEmail: data.text('receipt_email', 800) ?? null,
  };
}
