import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { sessionSchema, type SignIn } from '../../../shared/contract/session';
import { noContentSchema, request } from '../../lib/api';
import { sessionQueries } from './queries';

/** Signs in and forgets whatever the last person had on the screen. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignIn) => request('/api/session', { method: 'POST', body, schema: sessionSchema }),
    onSuccess: (session) => {
      client.clear();
      client.setQueryData(sessionQueries.current().queryKey, session);
    },
  });
}

/** Signs out. The cache is emptied by the sign-in page, when nothing of it is on the screen any more. */
export function useSignOut() {
  return useMutation({
    mutationFn: () =>
      request('/api/session', { method: 'DELETE', schema: z.union([noContentSchema, sessionSchema]) }),
  });
}
