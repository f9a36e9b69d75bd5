import type { EntityManager } from 'typeorm';
import type { CalibrationFactor as FactorContract } from '../../shared/contract/calibration-factor';
import { CalibrationFactor } from './calibration-factor.entity';

type StoredFactor = Omit<FactorContract, 'isBeingApplied'>;
type FactorRow = Omit<StoredFactor, 'enteredAt'> & { enteredAt: Date };

/** All factors of a machine, the newest first; of two with the same day the later entered one counts. */
export async function listCalibrationFactors(
  db: EntityManager,
  hospitalId: string,
  equipmentId: string,
): Promise<StoredFactor[]> {
  const rows: FactorRow[] = await db.query(
    `select factor.id, factor.equipment_id as "equipmentId", factor."plane", factor."quantity", factor.factor,
            factor.uncertainty_percent as "uncertaintyPercent", factor.valid_from::text as "validFrom",
            factor.source, person."name" as "enteredBy", factor.entered_at as "enteredAt"
       from calibration_factor factor join person on person.id = factor.entered_by_id
      where factor.hospital_id = $1 and factor.equipment_id = $2
      order by factor.valid_from desc, factor.entered_at desc, factor.id desc`,
    [hospitalId, equipmentId],
  );
  return rows.map((row) => ({ ...row, enteredAt: row.enteredAt.toISOString() }));
}

export async function addCalibrationFactor(
  db: EntityManager,
  factor: Omit<CalibrationFactor, 'enteredAt'>,
): Promise<void> {
  await db.insert(CalibrationFactor, factor);
}
