import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Person = components['schemas']['PersonDto'];

export const peopleQuery = (name: string) =>
  queryOptions({
    queryKey: ['people', 'desk', name],
    queryFn: () =>
      unwrap(api.GET('/api/people', { params: { query: { perPage: 200, ...(name && { name }) } } })),
    placeholderData: keepPreviousData,
  });
