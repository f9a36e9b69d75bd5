import { queryOptions } from '@tanstack/react-query';
import {
  candidatesSchema,
  previewSchema,
  regroupingsSchema,
  type PreviewInput,
} from '../../../shared/contract/regrouping';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

/** Below the key of the procedure: what changes it makes these stale. */
const keyOf = (id: string) => ['procedures', 'one', id] as const;
const pathOf = (id: string) => `/api/procedures/${encodeURIComponent(id)}`;

export const regroupingQueries = {
  list: (id: string) =>
    queryOptions({
      queryKey: [...keyOf(id), 'regroupings'],
      queryFn: async ({ signal }) =>
        (await request(`${pathOf(id)}/regroupings`, { schema: regroupingsSchema, signal })).items,
    }),
  candidates: (id: string, find: string) =>
    queryOptions({
      queryKey: [...keyOf(id), 'regroup-candidates', find],
      queryFn: async ({ signal }) =>
        (
          await request(withQuery(`${pathOf(id)}/regroup-candidates`, { find }), {
            schema: candidatesSchema,
            signal,
          })
        ).items,
    }),
  preview: (id: string, input: PreviewInput) =>
    queryOptions({
      queryKey: [...keyOf(id), 'regroup-preview', input],
      queryFn: ({ signal }) =>
        request(`${pathOf(id)}/regroup-preview`, {
          method: 'POST',
          body: input,
          schema: previewSchema,
          signal,
        }),
      staleTime: 0,
    }),
};
