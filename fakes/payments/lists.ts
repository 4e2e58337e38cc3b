import { isFields, Params } from './params';
import { notFound } from './service-error';

export const LIST_PARAMS = ['limit', 'starting_after', 'ending_before', 'expand'];

interface Page<T> {
  object: 'list';
  url: string;
  has_more: boolean;
  data: T[];
}

/** One page, newest first, by the id of the last entry seen (or the first, going back). */
export function pageOf<T extends { id: string }>(url: string, oldestFirst: T[], query: Params): Page<T> {
  const all = oldestFirst.toReversed();
  const limit = query.wholeNumber('limit', { min: 1, max: 100 }) ?? 10;
  const before = query.text('ending_before');
  if (before === undefined) return forward(url, all, limit, query.text('starting_after'));
  const end = placeOf(all, before, 'ending_before');
  const start = Math.max(0, end - limit);
  return { object: 'list', url, has_more: start > 0, data: all.slice(start, end) };
}

function forward<T extends { id: string }>(url: string, all: T[], limit: number, after?: string): Page<T> {
  const start = after === undefined ? 0 : placeOf(all, after, 'starting_after') + 1;
  const data = all.slice(start, start + limit);
  return { object: 'list', url, has_more: start + limit < all.length, data };
}

function placeOf(all: { id: string }[], id: string, param: string): number {
  const place = all.findIndex((one) => one.id === id);
  if (place < 0) throw notFound(id, param);
  return place;
}

const SECONDS = { min: 0, max: 9_999_999_999 };

/** `created=123` or `created[gte]=123` and its like. */
export function createdFilter(query: unknown): (one: { created: number }) => boolean {
  const params = new Params(query);
  if (!isFields(query) || !isFields(query.created)) {
    const exact = params.wholeNumber('created', SECONDS);
    return (one) => exact === undefined || one.created === exact;
  }
  const range = params.group('created');
  range.allowOnly(['gt', 'gte', 'lt', 'lte']);
  const bound = (key: string) => range.wholeNumber(key, SECONDS);
  const [gt = -1, gte = 0, lt = Infinity, lte = Infinity] = [
    bound('gt'),
    bound('gte'),
    bound('lt'),
    bound('lte'),
  ];
  return ({ created }) => created > gt && created >= gte && created < lt && created <= lte;
}
