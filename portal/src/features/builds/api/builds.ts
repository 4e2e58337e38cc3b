import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import { myBuildsQuery, myBuildSummariesQuery } from '../../../api-client/my-builds';
import type { components } from '../../../api-client/schema';

export type Build = components['schemas']['BuildDto'];
export type BuildStage = components['schemas']['BuildStageDto'];
export type BuildCheck = components['schemas']['BuildCheckDto'];
export type Reading = components['schemas']['ReadingDto'];
export type Photo = components['schemas']['PhotoDto'];
export type InstrumentChoice = components['schemas']['InstrumentChoiceDto'];
export type Caution = BuildStage['cautions'][number];
type KeepReading = components['schemas']['KeepReadingDto'];

/** Everything about builds; whatever is written to one makes all of it stale. */
const BUILDS = ['builds'] as const;

const buildQuery = (buildId: string) =>
  queryOptions({
    queryKey: [...BUILDS, buildId],
    queryFn: () => unwrap(api.GET('/api/builds/{buildId}', { params: { path: { buildId } } })),
  });

export const plansQuery = queryOptions({
  queryKey: ['plans'],
  queryFn: () => unwrap(api.GET('/api/plans', { params: { query: {} } })),
});

export const instrumentsQuery = (buildId: string, checkId: string) =>
  queryOptions({
    queryKey: [...BUILDS, buildId, 'instruments', checkId],
    queryFn: () =>
      unwrap(
        api.GET('/api/builds/{buildId}/checks/{checkId}/instruments', {
          params: { path: { buildId, checkId } },
        }),
      ),
    staleTime: 60_000,
  });

export const useMyBuilds = () => useQuery(myBuildsQuery);
export const useMyBuildSummaries = () => useQuery(myBuildSummariesQuery);
export const useBuild = (buildId: string) => useQuery(buildQuery(buildId));

/** A mutation after which builds, and the queue of those who wait, are asked anew. */
function useBuildMutation<Input, Output>(mutationFn: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn,
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: BUILDS }),
        client.invalidateQueries({ queryKey: ['reviews'] }),
      ]),
  });
}

export const useStartBuild = () =>
  useBuildMutation((planId: string) => unwrap(api.POST('/api/builds', { body: { planId } })));

export const useKeepReading = (buildId: string, checkId: string) =>
  useBuildMutation((body: KeepReading) =>
    unwrap(
      api.POST('/api/builds/{buildId}/checks/{checkId}/readings', {
        params: { path: { buildId, checkId } },
        body,
      }),
    ),
  );

/** Ticks, or takes the tick back. */
export const useMark = (buildId: string) =>
  useBuildMutation(({ checkId, isMarked }: { checkId: string; isMarked: boolean }): Promise<unknown> => {
    const params = { path: { buildId, checkId } };
    const path = '/api/builds/{buildId}/checks/{checkId}/marks';
    return isMarked ? unwrap(api.POST(path, { params })) : unwrap(api.DELETE(path, { params }));
  });

export const useAddPhoto = (buildId: string, checkId: string) =>
  useBuildMutation(({ file, caption }: { file: File; caption: string }) => {
    const form = new FormData();
    form.set('caption', caption);
    form.set('photo', file);
    return unwrap(
      api.POST('/api/builds/{buildId}/checks/{checkId}/photos', {
        params: { path: { buildId, checkId } },
        // The document calls a file a string; the form itself is what is sent.
        body: form as never,
        bodySerializer: (body: unknown) => body as FormData,
      }),
    );
  });

export const useTakeBackPhoto = (buildId: string) =>
  useBuildMutation((photoId: string) =>
    unwrap(api.DELETE('/api/builds/{buildId}/photos/{photoId}', { params: { path: { buildId, photoId } } })),
  );

export type StageMove = 'submit' | 'withdraw' | 'sign-off' | 'send-back';

export const useMoveStage = (buildId: string, stageId: string) =>
  useBuildMutation(({ move, note }: { move: StageMove; note: string }): Promise<BuildStage> => {
    const params = { path: { buildId, stageId } };
    const body = note.trim() ? { note } : {};
    switch (move) {
      case 'submit':
        return unwrap(api.POST('/api/builds/{buildId}/stages/{stageId}/submit', { params, body }));
      case 'withdraw':
        return unwrap(api.POST('/api/builds/{buildId}/stages/{stageId}/withdraw', { params }));
      case 'sign-off':
        return unwrap(api.POST('/api/builds/{buildId}/stages/{stageId}/sign-off', { params, body }));
      case 'send-back':
        return unwrap(
          api.POST('/api/builds/{buildId}/stages/{stageId}/send-back', { params, body: { note } }),
        );
    }
  });
