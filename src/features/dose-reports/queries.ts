import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { doseReportPageSchema, type DoseReportFilter } from '../../../shared/contract/dose-report';
import { readAgainListSchema, type ReadAgainList } from '../../../shared/contract/read-again';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

export const doseReportsKey = ['dose-reports'] as const;

export const fetchReadAgain = (cursor: string, signal?: AbortSignal): Promise<ReadAgainList> =>
  request(withQuery('/api/dose-reports/read-again', { cursor, limit: '50' }), {
    schema: readAgainListSchema,
    signal,
  });

export const doseReportQueries = {
  pages: ({ outcome, text, archive }: DoseReportFilter) =>
    infiniteQueryOptions({
      queryKey: [...doseReportsKey, { outcome, text, archive }],
      queryFn: ({ pageParam, signal }) =>
        request(withQuery('/api/dose-reports', { outcome, text, archive, cursor: pageParam }), {
          schema: doseReportPageSchema,
          signal,
        }),
      initialPageParam: '',
      getNextPageParam: (page) => page.nextCursor,
    }),
  /** How many kept files may be read again; the files themselves are fetched while they are looked at. */
  readAgain: () =>
    queryOptions({
      queryKey: [...doseReportsKey, 'read-again'],
      queryFn: ({ signal }) => fetchReadAgain('', signal),
    }),
};
