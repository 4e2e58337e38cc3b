import express, { type Express } from 'express';
import { JsonFile } from '../common/json-file';
import { closeServer, listen, LOOPBACK, portOf } from '../common/listen';
import { apiRoutes } from './api-routes';
import { expireOverdue } from './checkout';
import type { Context } from './context';
import { controlRoutes } from './control-routes';
import { newEvent } from './event';
import { LatePayments } from './late-payments';
import { finishLate } from './pay';
import { payPageRoutes } from './pay-page-routes';
import type { Settings } from './settings';
import { Store } from './store';
import { Webhooks } from './webhooks';

export async function startPayments(settings: Settings) {
  const store = new Store(settings.stateFile === undefined ? undefined : new JsonFile(settings.stateFile));
  const webhooks = new Webhooks(store, settings);
  let baseUrl = '';
  const late = new LatePayments((sessionId) => {
    finishLate(context, sessionId);
    store.save();
  });
  const context: Context = {
    settings,
    store,
    baseUrl: () => baseUrl,
    emit: (type, object) => webhooks.add(newEvent(type, object)),
    confirmLater: (id) => late.schedule(id, store.latePayments.get(id)?.dueAtMs ?? 0),
  };
  const server = await listen(appFor(context, webhooks, late), settings.port);
  baseUrl = `http://${LOOPBACK}:${portOf(server)}`;
  store.latePayments.forEach(({ id }) => context.confirmLater(id));
  webhooks.resume();
  return {
    port: portOf(server),
    readyLine: `listening ${portOf(server)}`,
    close: () => {
      late.stop();
      webhooks.stop();
      return closeServer(server);
    },
  };
}

function appFor(context: Context, webhooks: Webhooks, late: LatePayments): Express {
  const app = express();
  app.disable('x-powered-by');
  // Lists are asked with nested parameters such as created[gte].
  app.set('query parser', 'extended');
  app.get('/health', (_request, response) => void response.json({ status: 'ok' }));
  app.use('/v1', (_request, _response, next) => {
    expireOverdue(context);
    next();
  });
  app.use('/v1', apiRoutes(context));
  app.use('/pay', payPageRoutes(context));
  app.use('/control', controlRoutes({ context, webhooks, late }));
  return app;
}
