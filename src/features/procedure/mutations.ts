import { useMutation } from '@tanstack/react-query';
import { procedureSchema, type Procedure, type ProcedureMark } from '../../../shared/contract/procedure';
import { request } from '../../lib/api';
import { proceduresKey } from './queries';

export const useSaveProcedureRecord = (id: string) =>
  useMutation<Procedure, Error, object>({
    mutationFn: (body) =>
      request(`/api/procedures/${id}/record`, { method: 'PUT', body, schema: procedureSchema }),
    meta: { invalidates: [proceduresKey, ['staff-exposure']] },
  });

export const useMarkProcedure = (id: string) =>
  useMutation<Procedure, Error, ProcedureMark>({
    mutationFn: (body) =>
      request(`/api/procedures/${id}`, { method: 'PATCH', body, schema: procedureSchema }),
    meta: { invalidates: [proceduresKey, ['staff-exposure']] },
  });
