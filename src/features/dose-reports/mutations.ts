import { useMutation } from '@tanstack/react-query';
import { receivedFileSchema } from '../../../shared/contract/received-files';
import { request } from '../../lib/api';
import { doseReportsKey } from './queries';

/** Reads a kept file again, now that the reader may have learnt better. */
export const useReadAgain = () =>
  useMutation({
    mutationFn: (id: string) =>
      request(`/api/dose-reports/${id}/read-again`, { method: 'POST', schema: receivedFileSchema }),
    meta: { invalidates: [doseReportsKey, ['procedures']] },
  });
