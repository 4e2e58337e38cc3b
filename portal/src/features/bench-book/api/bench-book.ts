import { keepPreviousData, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';
import { addDays, instantOf } from '../../../lib/club-time';

export type Bench = components['schemas']['BenchDto'];
export type Instrument = components['schemas']['InstrumentDto'];
export type Booking = components['schemas']['BookingDto'];
export type BookingWish = components['schemas']['CreateBookingDto'];
export type FreeTime = components['schemas']['SpanDto'];

const EVERYTHING = { perPage: 200 };
const BOOKINGS_KEY = ['bookings'] as const;
/** Others book too: what is shown is asked for again this often. */
const REFRESH_MS = 30_000;

const getBenches = async (): Promise<Bench[]> =>
  (await unwrap(api.GET('/api/benches', { params: { query: EVERYTHING } }))).items;

const getInstruments = async (on: string): Promise<Instrument[]> =>
  (await unwrap(api.GET('/api/instruments', { params: { query: { ...EVERYTHING, on } } }))).items;

const getBookings = (from: string, days: number): Promise<Booking[]> =>
  unwrap(
    api.GET('/api/bookings', {
      params: { query: { from: instantOf(from, 0), to: instantOf(addDays(from, days), 0) } },
    }),
  );

export const benchesQuery = queryOptions({ queryKey: ['benches'], queryFn: getBenches });

/** The instruments as they may be used on a day. */
export const instrumentsQuery = (on: string) =>
  queryOptions({
    queryKey: ['instruments', 'on', on],
    queryFn: () => getInstruments(on),
    placeholderData: keepPreviousData,
  });

/** Who has what on these days of the club. */
export const bookingsQuery = (from: string, days: number) =>
  queryOptions({
    queryKey: [...BOOKINGS_KEY, from, days],
    queryFn: () => getBookings(from, days),
    refetchInterval: REFRESH_MS,
  });

/** One's own. */
export const myBookingsQuery = queryOptions({
  queryKey: [...BOOKINGS_KEY, 'mine'],
  queryFn: () => unwrap(api.GET('/api/bookings/mine')),
});

export const myGroupsQuery = queryOptions({
  queryKey: ['groups', 'mine'],
  queryFn: () => unwrap(api.GET('/api/groups/mine')),
});

/** Books, and has the week drawn again: after a lost race too, for then it has changed. */
export function useBook() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: BookingWish) => unwrap(api.POST('/api/bookings', { body })),
    onSettled: () => client.invalidateQueries({ queryKey: BOOKINGS_KEY }),
  });
}

export function useCancelBooking() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (bookingId: string) =>
      unwrap(api.DELETE('/api/bookings/{bookingId}', { params: { path: { bookingId } } })),
    onSettled: () => client.invalidateQueries({ queryKey: BOOKINGS_KEY }),
  });
}
