import { createHash } from 'node:crypto';
import { ServiceError } from './service-error';
import { put, type Store } from './store';

const KEPT_MS = 86_400_000;

export interface KeyedRequest {
  key: string | undefined;
  path: string;
  body: unknown;
}

/** Runs a request once per key: the same key gives the first answer again; a refused request may be tried anew. */
export function once(
  store: Store,
  request: KeyedRequest,
  run: () => object,
): { body: object; replayed: boolean } {
  if (!request.key) return { body: run(), replayed: false };
  const fingerprint = createHash('sha256')
    .update(JSON.stringify([request.path, request.body]))
    .digest('hex');
  forgetOld(store);
  const kept = store.answers.get(request.key);
  if (!kept) {
    const body = structuredClone(run());
    put(store.answers, { id: request.key, request: fingerprint, keptAtMs: Date.now(), body });
    return { body, replayed: false };
  }
  if (kept.request !== fingerprint) throw usedOtherwise(request.key);
  return { body: kept.body, replayed: true };
}

function forgetOld(store: Store): void {
  const limit = Date.now() - KEPT_MS;
  [...store.answers.values()]
    .filter((one) => one.keptAtMs < limit)
    .forEach((one) => store.answers.delete(one.id));
}

const usedOtherwise = (key: string) =>
  new ServiceError(400, `The key ${key} was used before with another request.`, {}, 'idempotency_error');
