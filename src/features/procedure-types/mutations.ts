import { procedureTypeSchema } from '../../../shared/contract/procedure-type';
import { useSaveRecord } from '../../lib/save-record';
import { procedureTypesKey } from './queries';

export const useSaveProcedureType = (id: string | null) =>
  useSaveRecord({
    path: '/api/procedure-types',
    id,
    schema: procedureTypeSchema,
    invalidates: [procedureTypesKey],
  });
