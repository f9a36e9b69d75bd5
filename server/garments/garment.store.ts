import type { EntityManager } from 'typeorm';
import type { Garment as GarmentContract } from '../../shared/contract/garment';
import { Garment } from './garment.entity';

export type GarmentFields = Omit<Garment, 'hospitalId' | 'version'>;
/** As stored; whether it is overdue depends on the day. */
export type StoredGarment = Omit<GarmentContract, 'isOverdue'>;

type GarmentRow = Omit<StoredGarment, 'owner'> & { ownerId: string | null; ownerName: string | null };

const toGarment = ({ ownerId, ownerName, ...row }: GarmentRow): StoredGarment => ({
  ...row,
  owner: ownerId === null ? null : { id: ownerId, name: ownerName ?? '' },
});

const selectGarments = `
  select garment.id, garment.code, garment."kind", garment.material, garment.front_lead_mm as "frontLeadMm",
         garment.back_lead_mm as "backLeadMm", garment.lead_kvp as "leadKvp",
         garment.is_measured as "isMeasured", garment.owner_id as "ownerId", person."name" as "ownerName",
         garment."state", garment.last_inspected_on::text as "lastInspectedOn",
         garment.next_due_on::text as "nextDueOn", garment.note, garment."version"
    from garment left join person on person.id = garment.owner_id
   where garment.hospital_id = $1`;

/** `ownerId` null: everybody's. Those in service come first. */
export async function listGarments(
  db: EntityManager,
  hospitalId: string,
  ownerId: string | null,
): Promise<StoredGarment[]> {
  const rows: GarmentRow[] = await db.query(
    `${selectGarments} and ($2::uuid is null or garment.owner_id = $2)
      order by garment."state" <> 'in-service', garment.code collate "und-x-icu"`,
    [hospitalId, ownerId],
  );
  return rows.map(toGarment);
}

export async function findGarment(
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<StoredGarment | null> {
  const rows: GarmentRow[] = await db.query(`${selectGarments} and garment.id = $2`, [hospitalId, id]);
  return rows[0] ? toGarment(rows[0]) : null;
}

export async function addGarment(
  db: EntityManager,
  hospitalId: string,
  garment: GarmentFields,
): Promise<void> {
  await db.insert(Garment, { ...garment, hospitalId });
}

/** False when somebody else saved a newer version meanwhile. */
export async function updateGarment(
  db: EntityManager,
  hospitalId: string,
  { id, ...garment }: GarmentFields,
  version: number,
): Promise<boolean> {
  const result = await db.update(Garment, { id, hospitalId, version }, { ...garment, version: version + 1 });
  return result.affected === 1;
}
