import { Temporal } from 'temporal-polyfill';
import type { FieldProblem } from '../common/domain-error';
import { instantOf, wallOf } from '../common/wall-clock';

export interface OpenDay {
  /** ISO 8601: Monday is 1, Sunday 7. */
  weekday: number;
  opensMinute: number;
  closesMinute: number;
}

interface Span {
  startsAt: Date;
  endsAt: Date;
}

/** What is wrong with the hours somebody gives; empty when nothing is. */
export function hoursProblems(days: readonly OpenDay[]): FieldProblem[] {
  return days.flatMap(({ opensMinute, closesMinute }, index) =>
    closesMinute > opensMinute
      ? []
      : [{ pointer: `#/days/${index}/closesMinute`, detail: 'It closes when it opens, or before.' }],
  );
}

/**
 * The stretches of a span of time in which the workshop is open, in order.
 *
 * | case | answer |
 * |---|---|
 * | the club gives no hours | the whole span |
 * | closed all the while | none |
 * | the clocks change meanwhile | from wall time to wall time |
 */
export function openSpans({ startsAt, endsAt }: Span, week: readonly OpenDay[], zone: string): Span[] {
  if (week.length === 0) return [{ startsAt, endsAt }];
  const spans: Span[] = [];
  const last = wallOf(endsAt, zone).toPlainDate();
  let day = wallOf(startsAt, zone).toPlainDate();
  for (; Temporal.PlainDate.compare(day, last) <= 0; day = day.add({ days: 1 })) {
    const hours = week.find(({ weekday }) => weekday === day.dayOfWeek);
    if (!hours) continue;
    const at = (minutes: number) => instantOf(day.toPlainDateTime().add({ minutes }), zone);
    const [opens, closes] = [at(hours.opensMinute), at(hours.closesMinute)];
    const from = opens > startsAt ? opens : startsAt;
    const to = closes < endsAt ? closes : endsAt;
    if (from < to) spans.push({ startsAt: from, endsAt: to });
  }
  return spans;
}
