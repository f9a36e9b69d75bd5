import { queryOptions } from '@tanstack/react-query';
import {
  exposedPeopleSchema,
  exposureMonthsSchema,
  exposurePointsSchema,
  type ExposureFilterInput,
  type ExposureMonthsFilter,
} from '../../../shared/contract/staff-exposure';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

export const exposureKey = ['staff-exposure'] as const;

export const exposureQueries = {
  points: ({ type, room, duty, quantity, period, person }: ExposureFilterInput) => {
    const filter = { type, room, duty, quantity, period, person };
    return queryOptions({
      queryKey: [...exposureKey, 'points', filter],
      queryFn: ({ signal }) =>
        request(withQuery('/api/staff-exposure/procedures', filter), {
          schema: exposurePointsSchema,
          signal,
        }),
    });
  },
  months: ({ person, period }: ExposureMonthsFilter) =>
    queryOptions({
      queryKey: [...exposureKey, 'months', { person, period }],
      queryFn: ({ signal }) =>
        request(withQuery('/api/staff-exposure/months', { person, period }), {
          schema: exposureMonthsSchema,
          signal,
        }),
    }),
  people: () =>
    queryOptions({
      queryKey: [...exposureKey, 'people'],
      queryFn: async ({ signal }) =>
        (await request('/api/staff-exposure/people', { schema: exposedPeopleSchema, signal })).items,
    }),
};
