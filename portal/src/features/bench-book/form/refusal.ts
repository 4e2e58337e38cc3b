import { ProblemError } from '../../../api-client/problem-error';
import type { FreeTime } from '../api/bench-book';

/** What a refused booking says: words for the whole, words for fields, and when else it is free. */
export interface Refusal {
  /** Undefined when every word of it stands at a field. */
  detail: string | undefined;
  fields: Partial<Record<'from' | 'to' | 'groupId' | 'checkId' | 'benchId', string>>;
  /** By the id of the bench or instrument. */
  resources: Record<string, string>;
  nearestFree: FreeTime[];
}

const FIELDS = new Map([
  ['#/startsAt', 'from'],
  ['#/endsAt', 'to'],
  ['#/groupId', 'groupId'],
  ['#/checkId', 'checkId'],
] as const);

/** Reads the API's refusal of a booking; undefined when it failed for another reason and may be tried again. */
export function readRefusal(error: unknown, resourceIds: readonly string[]): Refusal | undefined {
  if (!(error instanceof ProblemError) || error.status < 400 || error.status >= 500) return undefined;
  const refusal: Refusal = { detail: undefined, fields: {}, resources: {}, nearestFree: [] };
  let placed = 0;
  for (const { pointer, detail } of error.errors) {
    const field = FIELDS.get(pointer as '#/startsAt');
    const resourceId = resourceIds[Number(/^#\/resourceIds\/(\d+)$/.exec(pointer)?.[1] ?? -1)];
    if (field) refusal.fields[field] = detail;
    else if (resourceId) refusal.resources[resourceId] = joined(refusal.resources[resourceId], detail);
    if (field || resourceId) placed += 1;
  }
  if (placed === 0 || placed < error.errors.length) refusal.detail = error.detail;
  refusal.nearestFree = freeTimes(error.body.nearestFree);
  return refusal;
}

const joined = (before: string | undefined, more: string): string => (before ? `${before} ${more}` : more);

function freeTimes(value: unknown): FreeTime[] {
  if (!Array.isArray(value)) return [];
  return value.filter(
    (span: Partial<FreeTime> | null): span is FreeTime =>
      typeof span?.startsAt === 'string' && typeof span.endsAt === 'string',
  );
}
