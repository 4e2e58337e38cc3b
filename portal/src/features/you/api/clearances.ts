import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';

export const myClearancesQuery = queryOptions({
  queryKey: ['clearances', 'mine'],
  queryFn: () => unwrap(api.GET('/api/clearances/mine')),
});
