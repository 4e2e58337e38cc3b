import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Licence = components['schemas']['LicenceDto'];

export const licencesQuery = queryOptions({
  queryKey: ['licences'],
  queryFn: () => unwrap(api.GET('/api/licences')),
});

export function useSeeLicence() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (buildId: string) =>
      unwrap(api.POST('/api/builds/{buildId}/licence', { params: { path: { buildId } } })),
    onSettled: () => client.invalidateQueries({ queryKey: licencesQuery.queryKey }),
  });
}
