import express, { Router } from 'express';
import { answerError } from './api-routes';
import type { Context } from './context';
import type { LatePayments } from './late-payments';
import { Params } from './params';
import { createPayout } from './payouts';
import { notFound, ServiceError } from './service-error';
import type { PaymentEvent } from './shapes';
import type { Delivery } from './store';
import type { Webhooks } from './webhooks';

interface Controls {
  context: Context;
  webhooks: Webhooks;
  late: LatePayments;
}

/** Levers for tests and demonstrations; the hosted service has nothing like them. */
export function controlRoutes(controls: Controls): Router {
  const router = Router();
  router.use(express.urlencoded({ extended: true, limit: '64kb' }), express.json({ limit: '64kb' }));
  addDeliveryControls(router, controls);
  addMoneyControls(router, controls);
  router.use((request) => {
    throw new ServiceError(404, `There is no control ${request.method} ${request.path}.`);
  });
  router.use(answerError);
  return router;
}

function addDeliveryControls(router: Router, { context, webhooks }: Controls): void {
  router.get(
    '/events',
    (_request, response) => void response.json({ ...webhooks.status(), events: deliveries(context) }),
  );
  router.post('/pause', (_request, response) => {
    webhooks.pause();
    response.json(webhooks.status());
  });
  router.post('/resume', (_request, response) => {
    webhooks.resume();
    response.json(webhooks.status());
  });
  router.post('/webhook', (request, response) => {
    webhooks.sendTo(new Params(request.body).webAddress('url'));
    response.json(webhooks.status());
  });
  router.post('/redeliver/:id', async (request, response) => {
    response.json(await webhooks.send(eventOf(context, request.params.id)));
  });
  router.post('/deliver-out-of-order', async (request, response) => {
    response.json({
      events: await sendInOrder(webhooks, outOfOrder(context, webhooks, new Params(request.body))),
    });
  });
}

function addMoneyControls(router: Router, { context, late }: Controls): void {
  router.post('/payout', (request, response) => {
    const payout = createPayout(context, new Params(asText(request.body)));
    context.store.save();
    response.json(payout);
  });
  router.post('/confirm-late', (_request, response) => {
    const sessions = [...context.store.latePayments.keys()];
    sessions.forEach((id) => late.finishNow(id));
    response.json({ sessions });
  });
}

/** The order asked for, or everything still waiting with the newest first. */
function outOfOrder(context: Context, webhooks: Webhooks, params: Params): PaymentEvent[] {
  const asked = params.texts('events');
  const ids =
    asked.length > 0
      ? asked
      : webhooks
          .waiting()
          .map((delivery) => delivery.id)
          .toReversed();
  return ids.map((id) => eventOf(context, id));
}

async function sendInOrder(webhooks: Webhooks, events: PaymentEvent[]): Promise<Delivery[]> {
  const sent: Delivery[] = [];
  for (const event of events) sent.push(await webhooks.send(event));
  return sent;
}

const deliveries = ({ store }: Context) =>
  [...store.events.values()].map(({ id, type, created }) => ({
    type,
    created,
    ...store.deliveries.get(id),
    id,
  }));

function eventOf(context: Context, id: string): PaymentEvent {
  const event = context.store.events.get(id);
  if (!event) throw notFound(id);
  return event;
}

/** JSON bodies bring numbers where forms bring text. */
function asText(body: unknown): unknown {
  if (typeof body !== 'object' || body === null) return undefined;
  return Object.fromEntries(
    Object.entries(body).map(([key, value]) => [key, typeof value === 'number' ? String(value) : value]),
  );
}
