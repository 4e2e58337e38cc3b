import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../api-client/client';
import type { components } from '../../api-client/schema';
import { addDays, clubDay, instantOf } from '../../lib/club-time';

export type Booking = components['schemas']['BookingDto'];
export type BuildNight = components['schemas']['BuildNightDto'];

/** Nights are looked for so far ahead, so that "the next night" has an answer. */
const DAYS_AHEAD = 35;

const midnightOf = (day: string): string => instantOf(day, 0);

/** Everything booked on a day of the club, by everybody: one's own evening and the bench row. */
export const dayBookingsQuery = (day: string) =>
  queryOptions({
    queryKey: ['tonight', 'bookings', day],
    queryFn: () =>
      unwrap(
        api.GET('/api/bookings', {
          params: { query: { from: midnightOf(day), to: midnightOf(addDays(day, 1)) } },
        }),
      ),
  });

export const comingBookingsQuery = queryOptions({
  queryKey: ['tonight', 'my bookings'],
  queryFn: () => unwrap(api.GET('/api/bookings/mine')),
});

export const nightsQuery = (day: string) =>
  queryOptions({
    queryKey: ['tonight', 'nights', day],
    queryFn: () =>
      unwrap(
        api.GET('/api/build-nights', {
          params: { query: { from: midnightOf(day), to: midnightOf(addDays(day, DAYS_AHEAD)) } },
        }),
      ),
  });

export const benchesQuery = queryOptions({
  queryKey: ['tonight', 'benches'],
  queryFn: () => unwrap(api.GET('/api/benches')),
});

export const myInvoicesQuery = queryOptions({
  queryKey: ['tonight', 'invoices'],
  queryFn: () => unwrap(api.GET('/api/invoices/mine')),
});

export const treasuryQuery = queryOptions({
  queryKey: ['tonight', 'treasury'],
  queryFn: () => unwrap(api.GET('/api/treasury/summary')),
});

export const instrumentsQuery = queryOptions({
  queryKey: ['tonight', 'instruments'],
  queryFn: () => unwrap(api.GET('/api/instruments', { params: { query: { perPage: 200 } } })),
});

/** The nights of a day, and the first one after it. */
export function nightsAround(
  nights: readonly BuildNight[],
  day: string,
): { tonight?: BuildNight; next?: BuildNight } {
  const standing = nights.filter(({ cancelledAt }) => !cancelledAt);
  const isOn = ({ startsAt }: BuildNight): boolean => clubDay(startsAt) === day;
  return { tonight: standing.find(isOn), next: standing.find((night) => clubDay(night.startsAt) > day) };
}
