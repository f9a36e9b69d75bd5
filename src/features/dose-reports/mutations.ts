import { useMutation } from '@tanstack/react-query';
import { readAgainResultSchema } from '../../../shared/contract/read-again';
import { request } from '../../lib/api';
import { doseReportsKey } from './queries';

/** Reads a kept file again, now that the reader may have learnt better. */
export const useReadAgain = () =>
  useMutation({
    mutationFn: (id: string) =>
      request(`/api/dose-reports/${id}/read-again`, { method: 'POST', schema: readAgainResultSchema }),
    meta: { invalidates: [doseReportsKey, ['procedures']] },
  });
