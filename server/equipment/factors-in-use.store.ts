import { In } from 'typeorm';
import type { EntityManager } from 'typeorm';
import { CalibrationFactor } from './calibration-factor.entity';
import { Equipment } from './equipment.entity';

export const listFactorsOf = (
  db: EntityManager,
  hospitalId: string,
  equipmentIds: string[],
): Promise<CalibrationFactor[]> =>
  equipmentIds.length === 0
    ? Promise.resolve([])
    : db.findBy(CalibrationFactor, { hospitalId, equipmentId: In(equipmentIds) });

export async function labelsOf(
  db: EntityManager,
  hospitalId: string,
  equipmentIds: string[],
): Promise<Map<string, string>> {
  if (equipmentIds.length === 0) return new Map();
  const rows = await db.findBy(Equipment, { hospitalId, id: In(equipmentIds) });
  return new Map(rows.map(({ id, label }) => [id, label]));
}

export const findEquipment = (db: EntityManager, hospitalId: string, id: string): Promise<Equipment | null> =>
  db.findOneBy(Equipment, { hospitalId, id });
