import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Worksheet = components['schemas']['WorksheetDto'];

const WORKSHEETS = ['worksheets'] as const;

export const worksheetsQuery = (buildId: string) =>
  queryOptions({
    queryKey: [...WORKSHEETS, buildId],
    queryFn: () => unwrap(api.GET('/api/builds/{buildId}/worksheets', { params: { path: { buildId } } })),
  });

export function useTakeBackWorksheet(buildId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (worksheetId: string) =>
      unwrap(
        api.DELETE('/api/builds/{buildId}/worksheets/{worksheetId}', {
          params: { path: { buildId, worksheetId } },
        }),
      ),
    onSettled: () => client.invalidateQueries({ queryKey: WORKSHEETS }),
  });
}
