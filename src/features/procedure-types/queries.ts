import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { procedureTypeSchema } from '../../../shared/contract/procedure-type';
import { request } from '../../lib/api';

export const procedureTypesKey = ['procedure-types'] as const;

export const procedureTypeQueries = {
  list: () =>
    queryOptions({
      queryKey: procedureTypesKey,
      queryFn: async ({ signal }) =>
        (await request('/api/procedure-types', { schema: listOf(procedureTypeSchema), signal })).items,
    }),
};
