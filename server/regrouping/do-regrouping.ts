import type { Regrouped } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { noteRegrouping } from './note-regrouping';
import { regroup, type RegroupPlan } from './regroup';
import { addRegrouping } from './regrouping.store';

/** Merges, splits or moves, all or nothing, with what the way back needs and a line in both histories. */
export const doRegrouping = (
  db: Db,
  actor: Actor,
  plan: Omit<RegroupPlan, 'caseNumber'>,
  reason: string,
  now: Date,
): Promise<Regrouped> =>
  db.transaction(async (tx) => {
    const { kind } = plan;
    const { source, target, doseReportIds, evidence } = await regroup(
      tx,
      actor,
      { ...plan, caseNumber: null },
      now,
    );
    const regroupingId = await addRegrouping(tx, {
      hospitalId: actor.hospitalId,
      kind,
      sourceId: source.id,
      targetId: target.id,
      doseReportIds,
      evidence,
      reason,
      doneById: actor.id,
    });
    const reportCount = doseReportIds.length;
    await noteRegrouping(tx, actor, {
      kind,
      source,
      target,
      reportCount,
      isTakenBack: false,
      evidence,
      reason,
    });
    return { regroupingId, procedureId: target.id, caseNumber: target.caseNumber };
  });
