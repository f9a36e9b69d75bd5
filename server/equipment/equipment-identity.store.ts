import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { Equipment } from './equipment.entity';

export type EquipmentIdentity = Pick<
  Equipment,
  'manufacturer' | 'modelName' | 'serialNumber' | 'stationName'
>;

/** What makes two reports the same machine's: maker, model and serial number, else the station. */
export function identityKeyOf({
  manufacturer,
  modelName,
  serialNumber,
  stationName,
}: EquipmentIdentity): string {
  const parts = serialNumber
    ? [manufacturer, modelName, serialNumber]
    : [manufacturer, modelName, stationName];
  return parts.map((part) => (part ?? '').trim().toLowerCase()).join('|');
}

/** The machine that wrote a report; unknown, it is added without a room and waits for one. */
export async function findOrAddEquipment(
  db: EntityManager,
  hospitalId: string,
  identity: EquipmentIdentity,
): Promise<Equipment> {
  const identityKey = identityKeyOf(identity);
  const label = [identity.manufacturer, identity.modelName, identity.stationName].filter(Boolean).join(' ');
  await db
    .createQueryBuilder()
    .insert()
    .into(Equipment)
    .values({ ...identity, id: newId(), hospitalId, identityKey, label: label || 'Unnamed machine' })
    .orIgnore()
    .execute();
  return db.findOneByOrFail(Equipment, { hospitalId, identityKey });
}
