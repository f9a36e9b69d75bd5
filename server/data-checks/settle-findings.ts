import type { z } from 'zod';
import type { endSettlementSchema, settlementInputSchema } from '../../shared/contract/data-check';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import { lockProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { recomputeWithEstimates } from '../procedures/recompute-with-estimates';
import { addSettlements, endSettlements, findSettlement } from './check-settlement.store';
import { isOpen } from './check-data';

/** What a decision changes about a procedure, for the audit trail. */
const standingOf = (procedure: Procedure) => ({
  isQuarantined: procedure.isQuarantined,
  settledFigures: procedure.settledFigures,
  referenceAirKermaGy: procedure.referenceAirKermaGy,
  kermaAreaProductGyCm2: procedure.kermaAreaProductGyCm2,
  fluoroscopyTimeS: procedure.fluoroscopyTimeS,
  openFindings: procedure.dataChecks.filter(isOpen).map(({ code, detail }) => ({ code, detail })),
});

const actions = {
  right: 'finding settled: the value is right',
  corrected: 'finding settled: totals corrected',
  'left-out': 'finding settled: left out of statistics',
} as const;

/** A physicist decides about findings of a procedure; decisions are appended, and the newest about a rule stands. */
export const settleFindings = (
  db: Db,
  actor: Actor,
  procedureId: string,
  { findings, decision, corrected, reason }: z.output<typeof settlementInputSchema>,
  now: Date,
): Promise<Procedure> =>
  db.transaction(async (tx) => {
    const procedure = await lockProcedure(tx, actor.hospitalId, procedureId);
    if (!procedure) throw new Problem('not-found');
    const isCurrent = findings.every(({ ruleCode, finding }) =>
      procedure.dataChecks.some((check) => check.code === ruleCode && check.finding === finding),
    );
    if (!isCurrent)
      throw new Problem(
        'conflict',
        'What was found has changed since you opened the procedure. Look at it again, then decide.',
        { current: procedure.dataChecks.filter(isOpen) },
      );
    const ruleCodes = findings.map(({ ruleCode }) => ruleCode);
    await endSettlements(tx, procedureId, { ruleCodes }, actor.id, now);
    await addSettlements(
      tx,
      findings.map(({ ruleCode, finding }) => ({
        id: newId(),
        hospitalId: actor.hospitalId,
        procedureId,
        ruleCode,
        finding,
        decision,
        corrected,
        reason,
        decidedById: actor.id,
        decidedAt: now,
        endedAt: null,
        endedById: null,
      })),
    );
    return recomputeAndNote(tx, actor, procedure, actions[decision], { ruleCodes, corrected, reason }, now);
  });

/** Takes a decision back: the finding is open again. */
export const takeSettlementBack = (
  db: Db,
  actor: Actor,
  procedureId: string,
  settlementId: string,
  { reason }: z.output<typeof endSettlementSchema>,
  now: Date,
): Promise<Procedure> =>
  db.transaction(async (tx) => {
    const procedure = await lockProcedure(tx, actor.hospitalId, procedureId);
    const settlement = await findSettlement(tx, actor.hospitalId, procedureId, settlementId);
    if (!procedure || !settlement) throw new Problem('not-found');
    if (settlement.endedAt !== null)
      throw new Problem('conflict', 'This decision was taken back or replaced already. Look at it again.', {
        current: procedure.dataChecks.filter(isOpen),
      });
    await endSettlements(tx, procedureId, { id: settlementId }, actor.id, now);
    const change = { ruleCodes: [settlement.ruleCode], corrected: settlement.corrected, reason };
    return recomputeAndNote(tx, actor, procedure, 'decision about a finding taken back', change, now);
  });

type Change = { ruleCodes: string[]; corrected: unknown; reason: string };

async function recomputeAndNote(
  tx: Db,
  actor: Actor,
  procedure: Procedure,
  action: string,
  { ruleCodes, corrected, reason }: Change,
  now: Date,
): Promise<Procedure> {
  const hospital = await findHospital(tx, actor.hospitalId);
  const recomputed = await recomputeWithEstimates(tx, hospital, procedure, action, now);
  await noteAudit(tx, {
    hospitalId: actor.hospitalId,
    actorId: actor.id,
    action,
    subject: 'procedure',
    subjectId: procedure.id,
    before: standingOf(procedure),
    after: { ruleCodes, corrected, ...standingOf(recomputed) },
    reason,
  });
  return recomputed;
}
