import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { api, unwrap } from './client';
import { ProblemError } from './problem-error';
import type { components } from './schema';

export type Me = components['schemas']['MeDto'];
export type Role = Me['roles'][number];
type SignIn = components['schemas']['SignInDto'];

export const ME_KEY = ['me'] as const;

async function getMe(): Promise<Me | null> {
  try {
    return await unwrap(api.GET('/api/auth/me'));
  } catch (error) {
    if (error instanceof ProblemError && error.status === 401) return null;
    throw error;
  }
}

/** Who is signed in; null when nobody is. */
const meQuery = queryOptions({ queryKey: ME_KEY, queryFn: getMe, staleTime: 5 * 60_000 });

/** `me` is undefined while it is being asked, null when nobody is signed in. */
export function useSession() {
  const query = useQuery(meQuery);
  return { me: query.data, error: query.error, retry: () => void query.refetch() };
}

/**
 * The person who is signed in, with `hasRole`. For pages inside the frame, which only opens to them.
 * @throws Error outside of it.
 */
export function useMe(): Me & { hasRole: (...roles: Role[]) => boolean } {
  const { data } = useQuery(meQuery);
  // When the session ends, a page may be drawn once more before the frame leads to sign-in: by whom it was last.
  const [last, setLast] = useState(data);
  if (data && data !== last) setLast(data);
  const me = data ?? last;
  if (!me) throw new Error('useMe is for pages behind the sign-in');
  return { ...me, hasRole: (...roles) => roles.some((role) => me.roles.includes(role)) };
}

/** Signs in, forgets what the person before had loaded, and knows the new person before it resolves. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (body: SignIn) => {
      await unwrap(api.POST('/api/auth/sign-in', { body }));
      client.removeQueries({
        predicate: (query) => query.queryKey[0] !== 'club' && query.queryKey[0] !== ME_KEY[0],
      });
      return client.fetchQuery({ ...meQuery, staleTime: 0 });
    },
  });
}

/** Ends the session on the server; drafts stay on the device for the same person. */
export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => unwrap(api.POST('/api/auth/sign-out')),
    onSuccess: () => {
      client.setQueryData(ME_KEY, null);
      client.removeQueries({
        predicate: (query) => query.queryKey[0] !== 'club' && query.queryKey[0] !== ME_KEY[0],
      });
    },
  });
}
