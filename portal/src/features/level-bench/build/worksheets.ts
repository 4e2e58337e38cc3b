import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

type PutWorksheet = components['schemas']['PutWorksheetDto'];
type BuildSummary = components['schemas']['BuildSummaryDto'];

/** Where a calculation can be put: the stages of one's build under way, and the one that is on the bench. */
export interface Place {
  buildId: string;
  stages: readonly { id: string; words: string }[];
  currentStageId: string;
}

export function placeOf(builds: readonly BuildSummary[]): Place | undefined {
  const build = builds.find(({ endedAt }) => endedAt === null);
  if (!build) return undefined;
  const stages = build.stages.map(({ id, position, name }) => ({ id, words: `${position} ${name}` }));
  return { buildId: build.id, stages, currentStageId: build.currentStageId ?? stages[0]?.id ?? '' };
}

export function usePutWorksheet() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ buildId, stageId, ...body }: PutWorksheet & { buildId: string; stageId: string }) =>
      unwrap(
        api.POST('/api/builds/{buildId}/stages/{stageId}/worksheets', {
          params: { path: { buildId, stageId } },
          body,
        }),
      ),
    onSettled: () => client.invalidateQueries({ queryKey: ['worksheets'] }),
  });
}
