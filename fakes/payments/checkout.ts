import type { Context } from './context';
import { newId, nowSeconds } from './ids';
import type { Params } from './params';
import { basketOf, SESSION_PARAMS } from './checkout-params';
import { missingParameter, notFound, ServiceError } from './service-error';
import type { Session } from './shapes';
import { put } from './store';

const DAY_SECONDS = 86_400;
const HALF_HOUR_SECONDS = 1800;

export function createSession(context: Context, params: Params): Session {
  params.allowOnly(SESSION_PARAMS);
  if (params.oneOf('mode', ['payment']) === undefined) throw missingParameter('mode');
  const id = newId('cs_test');
  const { currency, totalMinor, ...basket } = basketOf(params, id);
  const session = newSession(id, currency, totalMinor, params);
  put(context.store.baskets, basket);
  return shown(context, put(context.store.sessions, session));
}

function newSession(id: string, currency: string, totalMinor: number, params: Params): Session {
  const created = nowSeconds();
  return {
    id,
    object: 'checkout.session',
    amount_subtotal: totalMinor,
    amount_total: totalMinor,
    cancel_url: params.webAddress('cancel_url') ?? null,
    client_reference_id: params.text('client_reference_id', 200) ?? null,
    created,
    currency,
    customer: null,
    customer_email: params.text('customer_email', 800) ?? null,
    expires_at: expiry(params, created),
    livemode: false,
    metadata: params.metadata('metadata'),
    mode: 'payment',
    payment_intent: null,
    payment_method_types: ['card'],
    payment_status: 'unpaid',
    status: 'open',
    success_url: successUrl(params),
    ui_mode: 'hosted_page',
    url: null,
  };
}

function successUrl(params: Params): string {
  const url = params.webAddress('success_url');
  if (url === undefined) throw missingParameter('success_url');
  return url;
}

function expiry(params: Params, created: number): number {
  const [min, max] = [created + HALF_HOUR_SECONDS, created + DAY_SECONDS];
  // The caller's clock may be a little ahead or behind; a minute is let pass.
  return params.wholeNumber('expires_at', { min: min - 60, max: max + 60 }) ?? max;
}

function findSession(context: Context, id: string): Session {
  const session = context.store.sessions.get(id);
  if (!session) throw notFound(id);
  return session;
}

/** The pay page's address is not stored: after a restart the port may be another one. */
export const shown = (context: Context, session: Session): Session =>
  session.status === 'open' ? { ...session, url: `${context.baseUrl()}/pay/${session.id}` } : session;

export function expireSession(context: Context, id: string): Session {
  const session = findSession(context, id);
  if (session.status !== 'open')
    throw new ServiceError(400, `Only an open session can be expired; this one is ${session.status}.`);
  return expire(context, session);
}

export function expireOverdue(context: Context): void {
  const now = nowSeconds();
  const overdue = [...context.store.sessions.values()].filter(
    (one) => one.status === 'open' && one.expires_at <= now,
  );
  overdue.forEach((session) => expire(context, session));
  if (overdue.length > 0) context.store.save();
}

function expire(context: Context, session: Session): Session {
  session.status = 'expired';
  context.emit('checkout.session.expired', session);
  return session;
}
