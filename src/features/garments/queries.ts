import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { garmentSchema } from '../../../shared/contract/garment';
import { request } from '../../lib/api';

export const garmentsKey = ['garments'] as const;

export const garmentQueries = {
  list: () =>
    queryOptions({
      queryKey: garmentsKey,
      queryFn: async ({ signal }) =>
        (await request('/api/garments', { schema: listOf(garmentSchema), signal })).items,
    }),
};
