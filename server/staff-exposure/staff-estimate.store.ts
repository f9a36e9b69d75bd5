import type { EntityManager } from 'typeorm';
import { StaffEstimate } from './staff-estimate.entity';

export async function appendEstimates(db: EntityManager, rows: StaffEstimate[]): Promise<void> {
  if (rows.length > 0) await db.insert(StaffEstimate, rows as never[]);
}

/** The estimates of one revision, in the order of the record. */
export const listEstimates = (
  db: EntityManager,
  procedureId: string,
  revision: number,
): Promise<StaffEstimate[]> =>
  db
    .createQueryBuilder(StaffEstimate, 'estimate')
    .innerJoin('presence', 'presence', 'presence.id = estimate.presence_id')
    .where('estimate.procedure_id = :procedureId and estimate.revision = :revision', {
      procedureId,
      revision,
    })
    .orderBy('presence.position')
    .getMany();
