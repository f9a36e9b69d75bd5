import type { Db } from '../db/db';
import type { Hospital } from '../hospital/hospital.entity';
import { findProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { recomputeProcedure } from '../procedures/recompute-procedure';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';

/** Everything that follows from typed figures: totals, levels, checks, and the estimates of a complete record. */
export async function settleProcedure(
  tx: Db,
  hospital: Hospital,
  procedure: Procedure,
  { localStartedAt, reason, now }: { localStartedAt: string; reason: string; now: Date },
): Promise<void> {
  await recomputeProcedure(tx, hospital, procedure, localStartedAt, now);
  const recomputed = await findProcedure(tx, hospital.id, procedure.id);
  if (recomputed?.recordState === 'complete') await refreshEstimates(tx, recomputed, reason);
}
