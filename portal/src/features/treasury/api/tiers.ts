import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';
import { TREASURY_KEY, useTreasuryMutation } from './treasury';

export type Tier = components['schemas']['TierDto'];
export type PersonOnTier = components['schemas']['PersonOnTierDto'];
export type GiveTier = components['schemas']['AssignTierDto'];
type AddTier = components['schemas']['CreateTierDto'];

export const tiersQuery = queryOptions({
  queryKey: [...TREASURY_KEY, 'tiers'],
  queryFn: () => unwrap(api.GET('/api/tiers')),
});

export const tierPeopleQuery = queryOptions({
  queryKey: [...TREASURY_KEY, 'tiers', 'people'],
  queryFn: () => unwrap(api.GET('/api/tiers/people', { params: { query: { page: 1, perPage: 200 } } })),
});

export const useAddTier = () =>
  useTreasuryMutation((body: AddTier) => unwrap(api.POST('/api/tiers', { body })));

export const useGiveTier = () =>
  useTreasuryMutation((body: GiveTier) => unwrap(api.POST('/api/tiers/assignments', { body })));
