import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';
import { addDays, clubDay, instantOf } from '../../../lib/club-time';

type Schemas = components['schemas'];
export type Instrument = Schemas['InstrumentDto'];
export type Change = Schemas['InstrumentChangeDto'];
export type Clearance = Schemas['ClearanceDto'];
type Path = { instrumentId: string };

const ALL = { query: { perPage: 200 } } as const;
const INSTRUMENTS_KEY = ['instruments'] as const;
const CLEARANCES_KEY = ['clearances'] as const;

export const instrumentListQuery = queryOptions({
  queryKey: [...INSTRUMENTS_KEY, 'today'],
  queryFn: async () => (await unwrap(api.GET('/api/instruments', { params: ALL }))).items,
});

export const instrumentQuery = (instrumentId: string) =>
  queryOptions({
    queryKey: [...INSTRUMENTS_KEY, instrumentId],
    queryFn: () => unwrap(api.GET('/api/instruments/{instrumentId}', { params: { path: { instrumentId } } })),
  });

export const historyQuery = (instrumentId: string) =>
  queryOptions({
    queryKey: [...INSTRUMENTS_KEY, instrumentId, 'history'],
    queryFn: () =>
      unwrap(api.GET('/api/instruments/{instrumentId}/history', { params: { path: { instrumentId } } })),
  });

/** Bookings of an instrument from now on, for so many days. */
export const bookingsAheadQuery = (instrumentId: string, days: number) =>
  queryOptions({
    queryKey: ['bookings', 'of', instrumentId, clubDay(), days],
    queryFn: async () => {
      const from = new Date().toISOString();
      const query = { from, to: instantOf(addDays(clubDay(), days), 0) };
      const bookings = await unwrap(api.GET('/api/bookings', { params: { query } }));
      return bookings.filter(({ resources }) => resources.some(({ id }) => id === instrumentId));
    },
  });

export const clearancesQuery = queryOptions({
  queryKey: CLEARANCES_KEY,
  queryFn: async () => (await unwrap(api.GET('/api/clearances', { params: ALL }))).items,
});

export const peopleQuery = queryOptions({
  queryKey: ['people', 'all'],
  queryFn: async () => (await unwrap(api.GET('/api/people', { params: ALL }))).items,
});

/** Everything that shows an instrument is asked for again after any change to one. */
function useChange<T, R>(send: (body: T) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: INSTRUMENTS_KEY });
      await client.invalidateQueries({ queryKey: CLEARANCES_KEY });
    },
  });
}

export const useChangeCondition = () =>
  useChange(({ instrumentId, ...body }: Schemas['ChangeConditionDto'] & Path) =>
    unwrap(
      api.POST('/api/instruments/{instrumentId}/condition', { params: { path: { instrumentId } }, body }),
    ),
  );

export const useChangeCalibration = () =>
  useChange(({ instrumentId, ...body }: Schemas['ChangeCalibrationDto'] & Path) =>
    unwrap(
      api.POST('/api/instruments/{instrumentId}/calibration', { params: { path: { instrumentId } }, body }),
    ),
  );

export const useGrantClearance = () =>
  useChange((body: Schemas['GrantClearanceDto']) => unwrap(api.POST('/api/clearances', { body })));

export const useEndClearance = () =>
  useChange((clearanceId: string) =>
    unwrap(api.DELETE('/api/clearances/{clearanceId}', { params: { path: { clearanceId } } })),
  );
