import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { linkSchema, sessionSchema, type UseLink } from '../../../shared/contract/session';
import { request } from '../../lib/api';
import { sessionQueries } from './queries';

export const signInLinkQueries = {
  one: (token: string) =>
    queryOptions({
      queryKey: ['sign-in-link', token],
      queryFn: ({ signal }) =>
        request(`/api/sign-in-links/${encodeURIComponent(token)}`, { schema: linkSchema, signal }),
      retry: false,
      // Once used, the link answers that it is spent; the form must not be taken away by that.
      staleTime: Infinity,
    }),
};

/** Spends a one-time link: chooses a password and signs in. */
export function useSpendSignInLink() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: UseLink) =>
      request('/api/sign-in-links', { method: 'POST', body, schema: sessionSchema }),
    onSuccess: (session) => client.setQueryData(sessionQueries.current().queryKey, session),
  });
}
