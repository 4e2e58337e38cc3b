import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Person = components['schemas']['PersonDto'];

/** Everybody: a club's people fit on one page, so that words and names filter them without asking again. */
export const peopleQuery = queryOptions({
  queryKey: ['people', 'desk'],
  queryFn: () => unwrap(api.GET('/api/people', { params: { query: { perPage: 200 } } })),
});
