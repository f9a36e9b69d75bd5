import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';
import { listIdsOfEquipmentSince } from './equipment-procedures.store';
import { findProcedure, lockProcedure } from './procedure.store';
import { recomputeProcedure } from './recompute-procedure';

/**
 * Recomputes every procedure of a machine from a day on, each in a transaction of its own: totals, levels and the
 * estimates of complete records. Repeating it changes nothing but the estimates' revision.
 */
export async function recomputeSince(
  db: Db,
  hospitalId: string,
  equipmentId: string,
  day: string,
  reason: string,
  now: Date,
): Promise<number> {
  const hospital = await findHospital(db, hospitalId);
  const ids = await listIdsOfEquipmentSince(db, hospitalId, equipmentId, day);
  for (const id of ids)
    await db.transaction(async (tx) => {
      const procedure = await lockProcedure(tx, hospitalId, id);
      if (!procedure) return;
      await recomputeProcedure(tx, hospital, procedure, null, now);
      const recomputed = await findProcedure(tx, hospitalId, id);
      if (recomputed?.recordState === 'complete') await refreshEstimates(tx, recomputed, reason);
    });
  return ids.length;
}
