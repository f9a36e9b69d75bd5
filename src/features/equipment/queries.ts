import { queryOptions } from '@tanstack/react-query';
import { calibrationFactorSchema } from '../../../shared/contract/calibration-factor';
import { listOf } from '../../../shared/contract/common';
import { equipmentSchema } from '../../../shared/contract/equipment';
import { request } from '../../lib/api';

export const equipmentKey = ['equipment'] as const;

export const equipmentQueries = {
  list: () =>
    queryOptions({
      queryKey: [...equipmentKey, 'all'],
      queryFn: async ({ signal }) =>
        (await request('/api/equipment', { schema: listOf(equipmentSchema), signal })).items,
    }),
  calibrationFactors: (id: string) =>
    queryOptions({
      queryKey: [...equipmentKey, id, 'calibration-factors'],
      queryFn: async ({ signal }) =>
        (
          await request(`/api/equipment/${id}/calibration-factors`, {
            schema: listOf(calibrationFactorSchema),
            signal,
          })
        ).items,
      // Until the newest factor has reached every procedure.
      refetchInterval: ({ state }) => (state.data?.some((factor) => factor.isBeingApplied) ? 2000 : false),
    }),
};
