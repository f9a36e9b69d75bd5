import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { roomSchema } from '../../../shared/contract/room';
import { request } from '../../lib/api';

export const roomsKey = ['rooms'] as const;

export const roomQueries = {
  list: () =>
    queryOptions({
      queryKey: roomsKey,
      queryFn: async ({ signal }) =>
        (await request('/api/rooms', { schema: listOf(roomSchema), signal })).items,
    }),
};
