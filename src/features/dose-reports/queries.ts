import { infiniteQueryOptions } from '@tanstack/react-query';
import { doseReportPageSchema, type DoseReportFilter } from '../../../shared/contract/dose-report';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

export const doseReportsKey = ['dose-reports'] as const;

export const doseReportQueries = {
  pages: ({ outcome }: DoseReportFilter) =>
    infiniteQueryOptions({
      queryKey: [...doseReportsKey, { outcome }],
      queryFn: ({ pageParam, signal }) =>
        request(withQuery('/api/dose-reports', { outcome, cursor: pageParam }), {
          schema: doseReportPageSchema,
          signal,
        }),
      initialPageParam: '',
      getNextPageParam: (page) => page.nextCursor,
    }),
};
