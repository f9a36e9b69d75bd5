import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { checkRuleSchema } from '../../../shared/contract/data-check';
import { request } from '../../lib/api';

export const dataChecksKey = ['data-checks'] as const;

export const dataCheckQueries = {
  list: () =>
    queryOptions({
      queryKey: [...dataChecksKey, 'all'],
      queryFn: async ({ signal }) =>
        (await request('/api/data-checks', { schema: listOf(checkRuleSchema), signal })).items,
      // While something is computed again its count falls: asked for until it is done.
      refetchInterval: ({ state }) => (state.data?.some((rule) => rule.isBeingRecomputed) ? 2000 : false),
    }),
};
