import express, { type NextFunction, type Request, type Response, Router } from 'express';
import { timingSafeEqual } from 'node:crypto';
import { createSession, expireSession } from './checkout';
import type { Context } from './context';
import { expanded } from './expand';
import { once } from './idempotency';
import { newId } from './ids';
import { Params } from './params';
import { createRefund } from './refunds';
import { list, RESOURCES, retrieve } from './resources';
import { ServiceError } from './service-error';

/** The routes the SDK calls. */
export function apiRoutes(context: Context): Router {
  const router = Router();
  router.use((request, response, next) => {
    response.set('request-id', newId('req'));
    requireKey(request, context.settings.secretKey);
    next();
  });
  router.use(express.urlencoded({ extended: true, limit: '256kb' }));
  addReads(router, context);
  addWrites(router, context);
  router.use((request) => {
    throw new ServiceError(404, `Unrecognized request URL (${request.method}: ${request.originalUrl}).`);
  });
  router.use(answerError);
  return router;
}

function addReads(router: Router, context: Context): void {
  for (const resource of RESOURCES) {
    router.get(
      `/${resource.path}`,
      ({ query }, response) => void response.json(list(context, resource, query)),
    );
    router.get(`/${resource.path}/:id`, ({ params, query }, response) => {
      response.json(retrieve(context, resource, params.id, query));
    });
  }
}

function addWrites(router: Router, context: Context): void {
  const write = (path: string, act: (params: Params, id: string) => object) =>
    router.post(path, (request, response) => {
      const { body, replayed } = once(context.store, keyed(request), () =>
        expanded(context.store, act(new Params(request.body), String(request.params.id)), expandOf(request)),
      );
      context.store.save();
      if (replayed) response.set('idempotent-replayed', 'true');
      response.json(body);
    });
  write('/checkout/sessions', (params) => createSession(context, params));
  write('/checkout/sessions/:id/expire', (_params, id) => expireSession(context, id));
  write('/refunds', (params) => createRefund(context, params));
}

const keyed = (request: Request<{ id?: string }, unknown, unknown>) => ({
  key: request.get('idempotency-key'),
  path: request.path,
  body: request.body,
});

const expandOf = (request: Request<{ id?: string }, unknown, unknown>) => ({
  expand: new Params(request.body).texts('expand'),
});

function requireKey(request: Request, secretKey: string): void {
  const given = Buffer.from(request.get('authorization') ?? '');
  const wanted = Buffer.from(`Bearer ${secretKey}`);
  if (given.length === wanted.length && timingSafeEqual(given, wanted)) return;
  throw new ServiceError(401, 'The API key is missing or not the right one.');
}

export function answerError(error: unknown, _request: Request, response: Response, next: NextFunction): void {
  if (response.headersSent) return next(error);
  const known = error instanceof ServiceError ? error : translated(error);
  response.status(known.status).json(known.body());
}

/** Errors of the body parser carry their own 4xx; anything else is a fault of ours and is printed. */
function translated(error: unknown): ServiceError {
  const status = error instanceof Error && 'status' in error ? error.status : undefined;
  if (status === 413) return new ServiceError(413, 'The request is too large.');
  if (typeof status === 'number' && status < 500)
    return new ServiceError(400, 'The request could not be read.');
  process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
  return new ServiceError(500, 'The stand-in failed.', {}, 'api_error');
}
