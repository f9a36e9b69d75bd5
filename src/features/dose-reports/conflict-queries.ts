import { queryOptions, useMutation } from '@tanstack/react-query';
import { conflictSchema, decidedSchema, type DecideInput } from '../../../shared/contract/decide-report';
import { request } from '../../lib/api';
import { doseReportsKey } from './queries';

const pathOf = (id: string) => `/api/dose-reports/${encodeURIComponent(id)}`;

/** A held report beside the stored one of the same identity. */
export const conflictQuery = (id: string) =>
  queryOptions({
    // Apart from the list: once decided there is nothing to compare, and the open dialog would ask in vain.
    queryKey: ['dose-report-conflict', id],
    queryFn: ({ signal }) => request(`${pathOf(id)}/conflict`, { schema: conflictSchema, signal }),
    staleTime: 0,
  });

/** `onDone` is called even when the decided row has left the list meanwhile. */
export const useDecide = (id: string, onDone: (input: DecideInput) => void) =>
  useMutation({
    mutationFn: (body: DecideInput) =>
      request(`${pathOf(id)}/decide`, { method: 'POST', body, schema: decidedSchema }),
    onSuccess: (_decided, input) => onDone(input),
    meta: { invalidates: [doseReportsKey, ['procedures'], ['staff-exposure']] },
  });
