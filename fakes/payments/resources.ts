import { shown } from './checkout';
import type { Context } from './context';
import { expanded, expandedList } from './expand';
import { createdFilter, LIST_PARAMS, pageOf } from './lists';
import { type Fields, Params } from './params';
import { notFound } from './service-error';

interface Entry {
  id: string;
  created: number;
}

/** A kind of object that can be fetched by id and listed. */
export interface Resource {
  path: string;
  all(context: Context): Map<string, Entry>;
  /** Fields a list may be narrowed by; each must then be equal. */
  filters: string[];
}

export const RESOURCES: Resource[] = [
  {
    path: 'checkout/sessions',
    all: shownSessions,
    filters: ['payment_intent', 'status'],
  },
  { path: 'payment_intents', all: ({ store }) => store.intents, filters: [] },
  { path: 'charges', all: ({ store }) => store.charges, filters: ['payment_intent'] },
  {
    path: 'balance_transactions',
    all: ({ store }) => store.transactions,
    filters: ['currency', 'payout', 'source', 'type'],
  },
  { path: 'refunds', all: ({ store }) => store.refunds, filters: ['charge', 'payment_intent'] },
  { path: 'payouts', all: ({ store }) => store.payouts, filters: ['status'] },
  { path: 'events', all: ({ store }) => store.events, filters: ['type'] },
];

function shownSessions(context: Context): Map<string, Entry> {
  return new Map([...context.store.sessions].map(([id, session]) => [id, shown(context, session)]));
}

export function retrieve(context: Context, resource: Resource, id: string, query: unknown): Fields {
  new Params(query).allowOnly(['expand']);
  const entry = resource.all(context).get(id);
  if (!entry) throw notFound(id);
  return expanded(context.store, entry, query);
}

export function list(context: Context, resource: Resource, query: unknown): object {
  const params = new Params(query);
  params.allowOnly([...LIST_PARAMS, 'created', ...resource.filters]);
  const wanted = resource.filters.map((field) => [field, params.text(field)] as const);
  const inTime = createdFilter(query);
  const entries = [...resource.all(context).values()]
    .filter(inTime)
    .filter((entry) =>
      wanted.every(([field, value]) => value === undefined || matches(context, entry, field, value)),
    );
  return expandedList(context.store, pageOf(`/v1/${resource.path}`, entries, params), query);
}

function matches(context: Context, entry: Entry, field: string, value: string): boolean {
  // Which payout carried a transaction is not a field of it; the service only lets one search by it.
  if (field === 'payout') return context.store.paidOut.get(entry.id)?.payout === value;
  return new Map<string, unknown>(Object.entries(entry)).get(field) === value;
}
