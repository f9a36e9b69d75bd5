import { calibrationFactorSchema } from '../../../shared/contract/calibration-factor';
import { equipmentSchema } from '../../../shared/contract/equipment';
import { useSaveRecord } from '../../lib/save-record';
import { equipmentKey } from './queries';

/** A machine that gets a room takes its procedures along: their lists are stale too. */
const withProcedures = [equipmentKey, ['procedures']];

export const useSaveEquipment = (id: string | null) =>
  useSaveRecord({ path: '/api/equipment', id, schema: equipmentSchema, invalidates: withProcedures });

export const useEnterCalibrationFactor = () =>
  useSaveRecord({
    path: '/api/calibration-factors',
    id: null,
    schema: calibrationFactorSchema,
    invalidates: [equipmentKey],
  });
