import type { EntityManager } from 'typeorm';
import type { Equipment as EquipmentContract, EquipmentChoice } from '../../shared/contract/equipment';
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

/** Machines that may be chosen: those that are in service, or were a month ago. */
export const listEquipmentChoices = (db: EntityManager, hospitalId: string): Promise<EquipmentChoice[]> =>
  db.query(
    `select machine.id, machine.label,
            case when room.id is not null then json_build_object('id', room.id, 'name', room.code) end as room,
            coalesce(latest.planes @> '[{"plane": "B"}]', false) as "isBiplane"
       from equipment machine
       left join room on room.id = machine.room_id
       left join lateral (
         select procedure.planes from procedure where procedure.equipment_id = machine.id
          order by procedure.started_at desc limit 1) latest on true
      where machine.hospital_id = $1
        and (machine.in_service_to is null or machine.in_service_to > current_date - 31)
      order by room.code is null, room.code collate "und-x-icu", machine.label collate "und-x-icu"`,
    [hospitalId],
  );

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
