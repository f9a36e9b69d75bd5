import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import { addJob } from '../jobs/job.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { lockProcedure } from '../procedures/procedure.store';
import { recomputeWithEstimates } from '../procedures/recompute-with-estimates';
import { findRule } from './check-rules';
import { listIdsWithOpenFinding } from './open-findings.store';

export const keyOfRecomputing = (hospitalId: string, ruleCode: string): string =>
  `recompute-findings:${hospitalId}:${ruleCode}`;

/** Asks for every procedure with an open finding of a rule to be computed again, by the settings of then. */
export async function askToRecompute(
  db: Db,
  actor: Actor,
  ruleCode: string,
): Promise<{ procedures: number }> {
  const rule = findRule(ruleCode);
  if (!rule) throw new Problem('not-found');
  const { hospitalId } = actor;
  const ids = await listIdsWithOpenFinding(db, hospitalId, ruleCode);
  await db.transaction(async (tx) => {
    await addJob(tx, 'recompute-findings', { hospitalId, ruleCode }, keyOfRecomputing(hospitalId, ruleCode));
    await noteAudit(tx, {
      hospitalId,
      actorId: actor.id,
      action: 'recomputing asked for',
      subject: 'data check',
      after: { ruleCode, procedures: ids.length },
    });
  });
  return { procedures: ids.length };
}

/** Recomputes the procedures with an open finding of a rule, each in a transaction of its own; may be repeated. */
export async function recomputeFindings(
  db: Db,
  hospitalId: string,
  ruleCode: string,
  now: Date,
): Promise<void> {
  const hospital = await findHospital(db, hospitalId);
  for (const id of await listIdsWithOpenFinding(db, hospitalId, ruleCode))
    await db.transaction(async (tx) => {
      const procedure = await lockProcedure(tx, hospitalId, id);
      if (procedure)
        await recomputeWithEstimates(tx, hospital, procedure, `data check ${ruleCode} set anew`, now);
    });
}
