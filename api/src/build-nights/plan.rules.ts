import type { Span } from '../bookings/bookings.service';
import { clubDay } from '../common/club-day';
import { fieldError } from '../common/common.errors';
import { wallOf } from '../common/wall-clock';
import { occurrencesOf } from './occurrences.rules';
import { fallsOn, MOST_NIGHTS, readRule } from './repeat.rules';
import { spanOnWall } from './span-on-wall.rules';

const MINUTE_MS = 60_000;
const SHORTEST_MS = 15 * MINUTE_MS;
const LONGEST_MS = 12 * 60 * MINUTE_MS;
const FURTHEST_MS = 2 * 366 * 24 * 60 * MINUTE_MS;

export interface NightPlan {
  startsAt: string;
  endsAt: string;
  repeat?: { rule: string };
  skip?: string[];
  instead?: { date: string; benchIds?: string[]; mentorIds?: string[] }[];
  benchIds?: string[];
  mentorIds?: string[];
}

/** One night as it is asked for. */
export interface WantedNight {
  /** On the club's calendar. */
  date: string;
  startsAt: Date;
  endsAt: Date;
  benchIds: string[];
  mentorIds: string[];
  isLeftOut: boolean;
}

/**
 * The nights a plan asks for, in the order of time, those left out among them.
 *
 * @throws DomainError `invalid-input` on the field at fault.
 */
export function wantedNights(
  plan: NightPlan,
  zone: string,
  now: Date,
  mentorIdsByDefault: string[],
): WantedNight[] {
  const times = readTimes(plan, now);
  const spans = plan.repeat ? seriesSpans(times, plan.repeat.rule, zone) : [times];
  return spans.map((span) => {
    const date = clubDay(span.startsAt, zone);
    const other = plan.instead?.find((night) => night.date === date);
    return {
      date,
      ...span,
      benchIds: other?.benchIds ?? plan.benchIds ?? [],
      mentorIds: someMentor(other?.mentorIds ?? plan.mentorIds ?? mentorIdsByDefault),
      isLeftOut: plan.skip?.includes(date) ?? false,
    };
  });
}

/** @throws DomainError `invalid-input` when nobody would be on duty. */
export function someMentor(mentorIds: string[]): string[] {
  if (mentorIds.length === 0) throw fieldError('mentorIds', 'At least one mentor is on duty.');
  return mentorIds;
}

/** The first night as it was given; the others at its hours on the wall. */
function seriesSpans(given: Span, rule: string, zone: string): Span[] {
  const first = wallOf(given.startsAt, zone);
  if (!fallsOn(readRule(rule), first.dayOfWeek)) {
    throw fieldError('startsAt', 'The first night does not lie on a day of the rule.');
  }
  const starts = occurrencesOf({ start: first, rule, zone }, () => false, MOST_NIGHTS + 1);
  if (starts.length > MOST_NIGHTS) {
    throw fieldError('repeat.rule', `A series has at most ${MOST_NIGHTS} nights; this rule makes more.`);
  }
  if (starts.length === 0) throw fieldError('repeat.rule', 'UNTIL lies before the first night.');
  return [given, ...starts.slice(1).map((start) => spanOnWall(start, given, zone))];
}

/**
 * The times of one night, read and found sensible.
 *
 * @throws DomainError `invalid-input` on `startsAt` or `endsAt`.
 */
export function readTimes(
  times: { startsAt: string; endsAt: string },
  now: Date,
): { startsAt: Date; endsAt: Date } {
  const startsAt = readInstant('startsAt', times.startsAt);
  const endsAt = readInstant('endsAt', times.endsAt);
  const length = endsAt.getTime() - startsAt.getTime();
  if (startsAt <= now) throw fieldError('startsAt', 'This lies in the past.');
  if (startsAt.getTime() - now.getTime() > FURTHEST_MS) {
    throw fieldError('startsAt', 'Nights are planned at most two years ahead.');
  }
  if (length <= 0) throw fieldError('endsAt', 'The night ends before it begins.');
  if (length < SHORTEST_MS) throw fieldError('endsAt', 'A night lasts 15 minutes or more.');
  if (length > LONGEST_MS) throw fieldError('endsAt', 'A night lasts at most 12 hours.');
  return { startsAt, endsAt };
}

export function readInstant(field: string, text: string): Date {
  const instant = new Date(text);
  if (Number.isNaN(instant.getTime())) throw fieldError(field, 'This is not a time of the calendar.');
  return instant;
}
