import {
  keepPreviousData,
  queryOptions,
  skipToken,
  useMutation,
  useQueryClient,
} from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type BuildNight = components['schemas']['BuildNightDto'];
export type NightDetail = components['schemas']['BuildNightDetailDto'];
export type NightPlan = components['schemas']['PlanNightsDto'];
export type NightChange = components['schemas']['ChangeNightDto'];
/** The part of a plan that can clash. */
export type NightTimes = components['schemas']['PreviewNightsDto'];
export type CheckedNight = components['schemas']['CheckedNightDto'];
export type NightRemedy = components['schemas']['NightRemedyDto'];

const KEY = 'build-nights';

/** The nights between two instants, at most 100 days apart. */
export const nightsQuery = (from: string, to: string) =>
  queryOptions({
    queryKey: [KEY, 'list', from, to],
    queryFn: async () =>
      (await unwrap(api.GET('/api/build-nights', { params: { query: { from, to } } }))).items,
    placeholderData: keepPreviousData,
  });

export const nightQuery = (id: string) =>
  queryOptions({
    queryKey: [KEY, 'one', id],
    queryFn: () => unwrap(api.GET('/api/build-nights/{id}', { params: { path: { id } } })),
  });

/** What a half-typed plan would meet, date by date. */
export const previewQuery = (times: NightTimes | undefined) =>
  queryOptions({
    queryKey: [KEY, 'preview', times],
    queryFn: times ? () => unwrap(api.POST('/api/build-nights/preview', { body: times })) : skipToken,
    placeholderData: keepPreviousData,
    staleTime: 0,
  });

function useNightMutation<Input>(send: (input: Input) => Promise<NightDetail>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: (night) => client.setQueryData(nightQuery(night.id).queryKey, night),
    // Also after a refusal: what was shown was not true any more.
    onSettled: () => client.invalidateQueries({ queryKey: [KEY] }),
  });
}

const at = (id: string) => ({ params: { path: { id } } });

/** Says that one is coming, or that one is not. */
export const useComing = () =>
  useNightMutation(({ id, isComing }: { id: string; isComing: boolean }) =>
    isComing
      ? unwrap(api.POST('/api/build-nights/{id}/coming', at(id)))
      : unwrap(api.DELETE('/api/build-nights/{id}/coming', at(id))),
  );

export const useChangeNight = () =>
  useNightMutation(({ id, change }: { id: string; change: NightChange }) =>
    unwrap(api.PATCH('/api/build-nights/{id}', { ...at(id), body: change })),
  );

export const useCancelNight = () =>
  useNightMutation(({ id, reason }: { id: string; reason: string }) =>
    unwrap(api.POST('/api/build-nights/{id}/cancel', { ...at(id), body: { reason } })),
  );

export function useScheduleNights() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (plan: NightPlan) => unwrap(api.POST('/api/build-nights', { body: plan })),
    onSettled: () => client.invalidateQueries({ queryKey: [KEY] }),
  });
}
