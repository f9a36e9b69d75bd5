import type { Db } from '../db/db';
import type { Hospital } from '../hospital/hospital.entity';
import { Problem } from '../kernel/problem';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';
import { findProcedure } from './procedure.store';
import type { Procedure } from './procedure.entity';
import { recomputeProcedure } from './recompute-procedure';

const kermaAreaProductOf = ({ settledFigures }: Procedure) => settledFigures?.kermaAreaProductGyCm2 ?? null;

/**
 * Recomputes a procedure after a decision or a setting changed. Estimates of a complete record are made anew only where
 * the P KA that counts is another one.
 */
export async function recomputeWithEstimates(
  tx: Db,
  hospital: Pick<Hospital, 'id' | 'timeZone'>,
  procedure: Procedure,
  reason: string,
  now: Date,
): Promise<Procedure> {
  await recomputeProcedure(tx, hospital, procedure, null, now);
  const recomputed = await findProcedure(tx, hospital.id, procedure.id);
  if (!recomputed) throw new Problem('not-found');
  const isOther = kermaAreaProductOf(procedure) !== kermaAreaProductOf(recomputed);
  if (isOther && recomputed.recordState === 'complete') await refreshEstimates(tx, recomputed, reason);
  return recomputed;
}
