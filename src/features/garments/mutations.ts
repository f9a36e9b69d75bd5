import { garmentSchema } from '../../../shared/contract/garment';
import { useSaveRecord } from '../../lib/save-record';
import { garmentsKey } from './queries';

export const useSaveGarment = (id: string | null) =>
  useSaveRecord({ path: '/api/garments', id, schema: garmentSchema, invalidates: [garmentsKey] });
