import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from './client';

// Several features ask after one's own builds and none may import another: one home for each question, so that what is
// kept under one key is always of one shape.

/** One's own builds with everything in them. */
export const myBuildsQuery = queryOptions({
  queryKey: ['builds', 'mine'],
  queryFn: () => unwrap(api.GET('/api/builds/mine')),
});

/** Only how far they are: what a page asks that shows none of what is in them. */
export const myBuildSummariesQuery = queryOptions({
  queryKey: ['builds', 'summaries'],
  queryFn: () => unwrap(api.GET('/api/builds/mine/summary')),
});
