import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Group = components['schemas']['GroupDto'];

const getGroups = async (): Promise<Group[]> =>
  (await unwrap(api.GET('/api/groups', { params: { query: { perPage: 200 } } }))).items;

export const groupsQuery = queryOptions({ queryKey: ['groups'], queryFn: getGroups });
