import type { EntityManager } from 'typeorm';
import { Hospital } from './hospital.entity';

export const findHospital = (db: EntityManager, id: string): Promise<Hospital> =>
  db.findOneByOrFail(Hospital, { id });

/** Before anybody signs in, the page names the hospital where there is only one. */
export async function findOnlyHospital(db: EntityManager): Promise<Hospital | null> {
  const hospitals = await db.find(Hospital, { take: 2 });
  return hospitals.length === 1 ? (hospitals[0] ?? null) : null;
}

export async function addHospital(
  db: EntityManager,
  hospital: Pick<Hospital, 'id' | 'name' | 'timeZone' | 'isDemo'>,
): Promise<void> {
  await db.insert(Hospital, hospital);
}
