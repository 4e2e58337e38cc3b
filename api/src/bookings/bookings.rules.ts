import type { Actor } from '../common/actor';
import type { FieldProblem } from '../common/domain-error';
import type { Span } from './bookings.types';

const MINUTE_MS = 60_000;
const DAY_MS = 24 * 60 * MINUTE_MS;

const LONGEST_HOURS = 12;
const FURTHEST_DAYS = 180;
/** How far before and after the wanted time free times are looked for. */
const SEARCH_DAYS = 14;
/** Free times begin on a quarter of an hour where nothing else sets their start. */
const QUARTER_MS = 15 * MINUTE_MS;
/** Longest list of bookings in one answer. */
const LONGEST_LIST_DAYS = 62;
/** Outside of this the database's own calendar would be what refuses. */
const [FIRST_YEAR, LAST_YEAR] = [2000, 2200];

/** What is wrong with the times of a wanted session; empty when nothing is. */
export function timeProblems({ startsAt, endsAt }: Span, now: Date): FieldProblem[] {
  const problems: FieldProblem[] = [];
  const say = (field: 'startsAt' | 'endsAt', detail: string) =>
    problems.push({ pointer: `#/${field}`, detail });
  const thisMinute = Math.floor(now.getTime() / MINUTE_MS) * MINUTE_MS;
  if (startsAt.getTime() < thisMinute) say('startsAt', 'This time is past. Choose one from now on.');
  if (startsAt.getTime() > now.getTime() + FURTHEST_DAYS * DAY_MS)
    say('startsAt', `The book is open for the next ${FURTHEST_DAYS} days. Choose an earlier day.`);
  if (endsAt <= startsAt) say('endsAt', 'It ends before it has begun. Choose a later end.');
  else if (endsAt.getTime() - startsAt.getTime() > LONGEST_HOURS * 60 * MINUTE_MS)
    say('endsAt', `One booking is at most ${LONGEST_HOURS} hours long. Choose an earlier end.`);
  return problems;
}

/** What is wrong with the stretch somebody wants listed; empty when nothing is. */
export function listProblems({ startsAt: from, endsAt: to }: Span): FieldProblem[] {
  const isOutside = (instant: Date) =>
    instant.getUTCFullYear() < FIRST_YEAR || instant.getUTCFullYear() > LAST_YEAR;
  if (isOutside(from)) return [{ pointer: '#/from', detail: 'There is no book for that year.' }];
  if (to <= from) return [{ pointer: '#/to', detail: 'This lies before the other end, or on it.' }];
  if (to.getTime() - from.getTime() > LONGEST_LIST_DAYS * DAY_MS)
    return [{ pointer: '#/to', detail: `Ask for at most ${LONGEST_LIST_DAYS} days at once.` }];
  return [];
}

/**
 * Where free times are looked for.
 *
 * @param usableUntil - after it, what is wanted may not be used any more.
 * @returns undefined when there is no room for the wanted length.
 */
export function searchWindow(wanted: Span, now: Date, usableUntil: Date | undefined): Span | undefined {
  const length = wanted.endsAt.getTime() - wanted.startsAt.getTime();
  const nextQuarter = Math.ceil(now.getTime() / QUARTER_MS) * QUARTER_MS;
  const from = Math.max(nextQuarter, wanted.startsAt.getTime() - SEARCH_DAYS * DAY_MS);
  const to = Math.min(
    wanted.endsAt.getTime() + SEARCH_DAYS * DAY_MS,
    now.getTime() + FURTHEST_DAYS * DAY_MS + length,
    usableUntil?.getTime() ?? Infinity,
  );
  return to - from < length ? undefined : { startsAt: new Date(from), endsAt: new Date(to) };
}

/** Whose word ends a session: the person's own, a mentor's, a steward's, an organiser's. A night is the mentors'. */
export function mayCancel({ kind, personId }: { kind: string; personId: string }, actor: Actor): boolean {
  if (kind !== 'session') return false;
  return personId === actor.personId || actor.roles.some((role) => CANCELLERS.has(role));
}

const CANCELLERS = new Set(['mentor', 'steward', 'organiser']);

/** What cancelling does: nothing was used yet, or the rest is given back. */
export function cancellation({ startsAt, endsAt }: Span, now: Date): 'whole' | 'rest' | 'over' {
  if (startsAt >= now) return 'whole';
  return endsAt > now ? 'rest' : 'over';
}
