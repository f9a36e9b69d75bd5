import { MutationCache, QueryCache, QueryClient, type QueryKey } from '@tanstack/react-query';
import { ApiProblem } from './api-problem';

declare module '@tanstack/react-query' {
  interface Register {
    mutationMeta: {
      /** Keys (prefixes) of the queries that this mutation makes stale. */
      invalidates?: readonly QueryKey[];
    };
  }
}

/** The signed-in person's query; when any answer says "not signed in", it is asked again. */
export const sessionKey = ['session'] as const;

const isOwnFault = (error: unknown): boolean =>
  error instanceof ApiProblem && error.status > 0 && error.status < 500;

/** The page's cache. What a mutation makes stale is said in its meta and done here, in one place. */
export function createQueryClient(): QueryClient {
  const onError = (error: unknown) => {
    if (error instanceof ApiProblem && error.code === 'not-signed-in') {
      void client.invalidateQueries({ queryKey: sessionKey });
    }
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({
      onError,
      onSuccess: async (_data, _variables, _onMutateResult, mutation) => {
        const keys = mutation.meta?.invalidates ?? [];
        await Promise.all(keys.map((queryKey) => client.invalidateQueries({ queryKey })));
      },
    }),
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        refetchOnWindowFocus: true,
        retry: (count, error) => !isOwnFault(error) && count < 1,
      },
    },
  });
  return client;
}

export const queryClient = createQueryClient();
