import type { EntityManager } from 'typeorm';
import type { Equipment as EquipmentContract } from '../../shared/contract/equipment';
import { Equipment } from './equipment.entity';

export type EquipmentFields = Pick<
  EquipmentContract,
  'id' | 'label' | 'roomId' | 'tubePosition' | 'inServiceFrom' | 'inServiceTo'
>;
type Identity = Pick<
  Equipment,
  'identityKey' | 'manufacturer' | 'modelName' | 'serialNumber' | 'stationName'
>;

const selectEquipment = `
  select machine.id, machine.room_id as "roomId", machine.manufacturer, machine.model_name as "modelName",
         machine.serial_number as "serialNumber", machine.station_name as "stationName", machine.label,
         machine.tube_position as "tubePosition", machine.in_service_from::text as "inServiceFrom",
         machine.in_service_to::text as "inServiceTo", machine."version",
         (select count(*)::int from dose_report report
           where report.equipment_id = machine.id and report.outcome = 'stored') as "reportCount"
    from equipment machine
   where machine.hospital_id = $1`;

/** Those without a room come first: somebody has to assign one. */
export const listEquipment = (db: EntityManager, hospitalId: string): Promise<EquipmentContract[]> =>
  db.query(`${selectEquipment} order by machine.room_id is null desc, machine.label collate "und-x-icu"`, [
    hospitalId,
  ]);

export async function findEquipment(
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<EquipmentContract | null> {
  const rows: EquipmentContract[] = await db.query(`${selectEquipment} and machine.id = $2`, [
    hospitalId,
    id,
  ]);
  return rows[0] ?? null;
}

export async function addEquipment(
  db: EntityManager,
  hospitalId: string,
  equipment: EquipmentFields & Identity,
): Promise<void> {
  await db.insert(Equipment, { ...equipment, hospitalId });
}

/** False when somebody else saved a newer version meanwhile. */
export async function updateEquipment(
  db: EntityManager,
  hospitalId: string,
  { id, ...equipment }: EquipmentFields,
  version: number,
): Promise<boolean> {
  const result = await db.update(
    Equipment,
    { id, hospitalId, version },
    { ...equipment, version: version + 1 },
  );
  return result.affected === 1;
}
