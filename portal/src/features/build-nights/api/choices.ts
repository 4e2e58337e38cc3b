import { queryOptions } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';

const LONG = 5 * 60_000;
const MOST = { perPage: 200 };

export interface Choice {
  value: string;
  label: string;
}

/** The benches that can be had, in the order they stand. */
export const benchChoicesQuery = queryOptions({
  queryKey: ['benches', 'choices'],
  queryFn: async (): Promise<Choice[]> => {
    const { items } = await unwrap(api.GET('/api/benches', { params: { query: MOST } }));
    return items.map(({ id, tag }) => ({ value: id, label: tag }));
  },
  staleTime: LONG,
});

/** Everybody who may be on duty. */
export const mentorChoicesQuery = queryOptions({
  queryKey: ['people', 'mentors'],
  queryFn: async (): Promise<Choice[]> => {
    const query = { ...MOST, role: 'mentor' as const };
    const { items } = await unwrap(api.GET('/api/people', { params: { query } }));
    return items.map(({ id, name }) => ({ value: id, label: name }));
  },
  staleTime: LONG,
});

/** The stages of every plan's newest edition; a plan's name stands before them when there are several. */
export const stageChoicesQuery = queryOptions({
  queryKey: ['plans', 'stage-choices'],
  queryFn: getStageChoices,
  staleTime: LONG,
});

async function getStageChoices(): Promise<Choice[]> {
  const { items } = await unwrap(api.GET('/api/plans', { params: { query: MOST } }));
  const published = items.filter(({ editions }) => editions.length > 0);
  const editions = await Promise.all(
    published.map(({ id: planId, editions: numbers }) =>
      unwrap(
        api.GET('/api/plans/{planId}/editions/{number}', {
          params: { path: { planId, number: Math.max(...numbers) } },
        }),
      ),
    ),
  );
  return editions.flatMap(({ planName, stages }) =>
    stages.map(({ id, position, name }) => ({
      value: id,
      label: `${editions.length > 1 ? `${planName}, ` : ''}${position} ${name}`,
    })),
  );
}
