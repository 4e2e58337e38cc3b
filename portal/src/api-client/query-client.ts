import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ProblemError } from './problem-error';
import { ME_KEY } from './session';

const TRIES = 2;

const canHeal = (error: unknown): boolean =>
  error instanceof ProblemError && (error.status === 0 || error.status >= 500);

/** Retries only what can heal. An expired sign-in anywhere makes the session empty, which leads to sign-in. */
export function makeQueryClient(): QueryClient {
  const watch = (error: unknown): void => {
    if (error instanceof ProblemError && error.status === 401 && client.getQueryData(ME_KEY)) {
      client.setQueryData(ME_KEY, null);
    }
  };
  const client = new QueryClient({
    queryCache: new QueryCache({ onError: watch }),
    mutationCache: new MutationCache({ onError: watch }),
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (failures, error) => canHeal(error) && failures < TRIES,
        networkMode: 'always', // a club hall's own server may answer while the device says it is offline
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
  return client;
}
