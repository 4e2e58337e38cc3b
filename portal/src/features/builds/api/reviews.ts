import { queryOptions, useQuery } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Review = components['schemas']['ReviewDto'];

const reviewsQuery = queryOptions({
  queryKey: ['reviews'],
  queryFn: () => unwrap(api.GET('/api/reviews', { params: { query: { perPage: 100 } } })),
});

export const useReviews = (isMentor = true) => useQuery({ ...reviewsQuery, enabled: isMentor });
