import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { equipmentChoiceSchema } from '../../../shared/contract/equipment';
import { manualEntrySchema, neighbourSchema } from '../../../shared/contract/manual-entry';
import { request } from '../../lib/api';
import { withQuery } from '../../lib/url-query';

export const manualEntryQueries = {
  machines: () =>
    queryOptions({
      queryKey: ['equipment', 'choices'],
      queryFn: async ({ signal }) =>
        (await request('/api/equipment/choices', { schema: listOf(equipmentChoiceSchema), signal })).items,
    }),
  /** What is stored already of a machine about a start. */
  neighbours: (equipment: string, at: string) =>
    queryOptions({
      queryKey: ['procedures', 'neighbours', equipment, at],
      queryFn: async ({ signal }) =>
        (
          await request(withQuery('/api/manual-entries/neighbours', { equipment, at }), {
            schema: listOf(neighbourSchema),
            signal,
          })
        ).items,
    }),
  /** Below the procedure's own key: what changes the procedure makes them stale. */
  ofProcedure: (id: string) =>
    queryOptions({
      queryKey: ['procedures', 'one', id, 'manual-entries'],
      queryFn: async ({ signal }) =>
        (
          await request(`/api/procedures/${encodeURIComponent(id)}/manual-entries`, {
            schema: listOf(manualEntrySchema),
            signal,
          })
        ).items,
    }),
};

/** Each loading of it is written into the audit: it is a picture's address, opened on request only. */
export const photoPath = (entryId: string): string => `/api/manual-entries/${entryId}/photo`;
