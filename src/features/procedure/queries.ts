import { queryOptions } from '@tanstack/react-query';
import { irradiationEventsSchema } from '../../../shared/contract/irradiation-event';
import { patientSchema } from '../../../shared/contract/procedure-row';
import { procedureSchema } from '../../../shared/contract/procedure';
import { suggestedTeamSchema } from '../../../shared/contract/record';
import { staffExposuresSchema } from '../../../shared/contract/staff-exposure';
import { request } from '../../lib/api';

/** Also the prefix of the ledger: what changes one procedure makes its row stale. */
export const proceduresKey = ['procedures'] as const;
export const procedureKey = (id: string) => [...proceduresKey, 'one', id] as const;

const pathOf = (id: string) => `/api/procedures/${encodeURIComponent(id)}`;

export const procedureQueries = {
  detail: (id: string) =>
    queryOptions({
      queryKey: [...procedureKey(id), 'detail'],
      queryFn: ({ signal }) => request(pathOf(id), { schema: procedureSchema, signal }),
    }),
  events: (id: string) =>
    queryOptions({
      queryKey: [...procedureKey(id), 'irradiation-events'],
      queryFn: async ({ signal }) =>
        (await request(`${pathOf(id)}/irradiation-events`, { schema: irradiationEventsSchema, signal }))
          .items,
      staleTime: 300_000,
    }),
  exposures: (id: string) =>
    queryOptions({
      queryKey: [...procedureKey(id), 'staff-exposures'],
      queryFn: ({ signal }) =>
        request(`${pathOf(id)}/staff-exposures`, { schema: staffExposuresSchema, signal }),
    }),
  suggestedTeam: (id: string) =>
    queryOptions({
      queryKey: [...procedureKey(id), 'suggested-team'],
      queryFn: ({ signal }) =>
        request(`${pathOf(id)}/suggested-team`, { schema: suggestedTeamSchema, signal }),
    }),
  /** Every answer is written into the audit: asked for once, never again by itself, and soon forgotten. */
  patient: (id: string) =>
    queryOptions({
      queryKey: ['procedure-patient', id],
      // Without the signal: a request that is given up and sent anew would be written down twice.
      queryFn: () => request(`${pathOf(id)}/patient`, { schema: patientSchema }),
      staleTime: Infinity,
      gcTime: 60_000,
      refetchOnWindowFocus: false,
      refetchOnReconnect: false,
      retry: false,
    }),
};
