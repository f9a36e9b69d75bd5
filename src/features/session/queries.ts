import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { sessionSchema, type Session, type User } from '../../../shared/contract/session';
import { request } from '../../lib/api';
import { sessionKey } from '../../lib/query-client';

export const sessionQueries = {
  current: () =>
    queryOptions({
      queryKey: sessionKey,
      queryFn: ({ signal }) => request('/api/session', { schema: sessionSchema, signal }),
      staleTime: 60_000,
    }),
};

/** Who is signed in, and at which hospital. */
export const useSession = (): Session => useSuspenseQuery(sessionQueries.current()).data;

/** The signed-in person; only for pages behind the sign-in. */
export function useUser(): User {
  const { user } = useSession();
  if (!user) throw new Error('This part of the page stands behind the sign-in.');
  return user;
}
