import { useMutation } from '@tanstack/react-query';
import { savedPersonSchema } from '../../../shared/contract/person';
import { request } from '../../lib/api';
import { useSaveRecord } from '../../lib/save-record';
import { peopleKey } from './queries';

export const useSavePerson = (id: string | null) =>
  useSaveRecord({ path: '/api/people', id, schema: savedPersonSchema, invalidates: [peopleKey] });

/** Makes a new one-time link; the one before ends. */
export const useInvitePerson = (id: string) =>
  useMutation({
    mutationFn: () =>
      request(`/api/people/${id}/invitation`, { method: 'POST', body: {}, schema: savedPersonSchema }),
    meta: { invalidates: [peopleKey] },
  });
