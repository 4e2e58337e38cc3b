import { type Fields, isFields, Params } from './params';
import { badParameter } from './service-error';
import type { Store } from './store';

const LINKS = ['balance_transaction', 'charge', 'latest_charge', 'payment_intent', 'source'];

/** A copy of `object` in which the links named in `expand` are replaced by what they point to. */
export function expanded(store: Store, object: object, query: unknown): Fields {
  const copy: Fields = { ...object };
  new Params(query).texts('expand').forEach((path) => follow(store, copy, path.split('.'), path));
  return copy;
}

/** In a list, paths begin with `data.` and apply to each entry. */
export function expandedList(store: Store, list: { data: object[] }, query: unknown): object {
  const paths = new Params(query).texts('expand').map(withoutData);
  return { ...list, data: list.data.map((object) => expanded(store, object, { expand: paths })) };
}

function withoutData(path: string): string {
  if (!path.startsWith('data.')) throw cannotExpand(path);
  return path.slice('data.'.length);
}

function follow(store: Store, holder: Fields, [field, ...rest]: string[], path: string): void {
  if (field === undefined || !LINKS.includes(field) || !Object.hasOwn(holder, field))
    throw cannotExpand(path);
  const link = holder[field];
  if (typeof link === 'string') holder[field] = structuredClone(target(store, link));
  const next = holder[field];
  if (rest.length > 0 && isFields(next)) follow(store, next, rest, path);
}

function target(store: Store, id: string): object | undefined {
  const { charges, intents, transactions, refunds, payouts } = store;
  return [charges, intents, transactions, refunds, payouts].map((map) => map.get(id)).find(Boolean);
}

const cannotExpand = (path: string) => badParameter('expand', `This property cannot be expanded (${path}).`);
