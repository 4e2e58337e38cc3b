import express, { type Request, type Response, Router } from 'express';
import { PAGE_HEADERS } from '../common/html';
import { outcomeOf, readCardNumber } from './cards';
import { expireOverdue } from './checkout';
import type { Context } from './context';
import { pay } from './pay';
import { closedPage, payPage } from './pay-page';
import { isFields } from './params';
import type { Session } from './shapes';

/** The hosted page the payer is sent to. */
export function payPageRoutes(context: Context): Router {
  const router = Router();
  router.use((_request, response, next) => {
    response.set(PAGE_HEADERS);
    next();
  });
  router.get('/:id', (request, response) => {
    const session = openSession(context, request, response);
    if (session) show(context, response, session, 200);
  });
  router.post('/:id', express.urlencoded({ extended: false, limit: '8kb' }), (request, response) => {
    const session = openSession(context, request, response);
    if (session) answer(context, session, request.body, response);
  });
  return router;
}

function answer(context: Context, session: Session, form: unknown, response: Response): void {
  if (field(form, 'choice') === 'back')
    return response.redirect(303, session.cancel_url ?? `/pay/${session.id}`);
  const typed = field(form, 'card');
  const number = readCardNumber(typed);
  if (number === undefined)
    return show(context, response, session, 422, { typed, error: 'Check the card number.' });
  const outcome = outcomeOf(number);
  pay(context, session, outcome);
  context.store.save();
  if (outcome.kind === 'declined')
    return show(context, response, session, 402, { typed, error: outcome.failure.message });
  response.redirect(303, returnUrl(session));
}

/** The session, if it can still be paid; otherwise the reader is told why not. */
function openSession(
  context: Context,
  request: Request<{ id: string }>,
  response: Response,
): Session | undefined {
  expireOverdue(context);
  const session = context.store.sessions.get(request.params.id);
  if (session?.status === 'open') return session;
  if (!session) response.status(404).send(closedPage('There is no such payment.'));
  else if (session.status === 'complete')
    response.status(409).send(closedPage('This payment was made.', onwards(session)));
  else response.status(410).send(closedPage('The time to pay has run out.', back(session)));
  return undefined;
}

const onwards = (session: Session) => ({ url: returnUrl(session), label: 'Continue' });

const back = (session: Session) =>
  session.cancel_url ? { url: session.cancel_url, label: 'Go back' } : undefined;

const returnUrl = (session: Session) => session.success_url.replaceAll('{CHECKOUT_SESSION_ID}', session.id);

function show(
  context: Context,
  response: Response,
  session: Session,
  status: number,
  again: { typed?: string; error?: string } = {},
): void {
  const lines = context.store.baskets.get(session.id)?.lines ?? [];
  response.status(status).send(payPage({ session, lines, ...again }));
}

function field(form: unknown, name: string): string {
  const value = isFields(form) ? form[name] : undefined;
  return typeof value === 'string' ? value : '';
}
