import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import {
  procedureCountSchema,
  procedurePageSchema,
  type ProcedureFilter,
} from '../../../shared/contract/procedure-row';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

/** Everything that is read of procedures; an upload or a saved record makes it stale. */
const proceduresKey = ['procedures'] as const;

export const ledgerQueries = {
  pages: ({ cursor: _, ...filter }: ProcedureFilter) =>
    infiniteQueryOptions({
      queryKey: [...proceduresKey, 'pages', filter],
      queryFn: ({ pageParam, signal }) =>
        request(withQuery('/api/procedures', { ...filter, cursor: pageParam }), {
          schema: procedurePageSchema,
          signal,
        }),
      initialPageParam: '',
      getNextPageParam: (page) => page.nextCursor,
    }),
  count: ({ cursor: _, sort: __, order: ___, limit: ____, ...filter }: ProcedureFilter) =>
    queryOptions({
      queryKey: [...proceduresKey, 'count', filter],
      queryFn: ({ signal }) =>
        request(withQuery('/api/procedures/count', filter), { schema: procedureCountSchema, signal }),
    }),
};
