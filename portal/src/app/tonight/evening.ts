import { bookingsQuery } from '../../features/bench-book/api/bench-book';
import { nightsQuery, type BuildNight } from '../../features/build-nights/api/nights';
import { addDays, clubDay, instantOf } from '../../lib/club-time';

/** Nights are looked for so far ahead, so that "the next night" has an answer. */
const DAYS_AHEAD = 35;

/** Everything booked on a day of the club, by everybody: one's own evening and the bench row. */
export const dayBookingsQuery = (day: string) => bookingsQuery(day, 1);

export const comingNightsQuery = (day: string) =>
  nightsQuery(instantOf(day, 0), instantOf(addDays(day, DAYS_AHEAD), 0));

/** The nights of a day, and the first one after it. */
export function nightsAround(
  nights: readonly BuildNight[],
  day: string,
): { tonight?: BuildNight; next?: BuildNight } {
  const standing = nights.filter(({ cancelledAt }) => !cancelledAt);
  const isOn = ({ startsAt }: BuildNight): boolean => clubDay(startsAt) === day;
  return { tonight: standing.find(isOn), next: standing.find((night) => clubDay(night.startsAt) > day) };
}
