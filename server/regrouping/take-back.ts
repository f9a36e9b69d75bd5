import type { z } from 'zod';
import type { Regrouped, takeBackInputSchema } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import type { Procedure } from '../procedures/procedure.entity';
import { listGroupedReports } from './grouped-reports.store';
import { moveReports, type Evidence } from './move-reports';
import { noteRegrouping } from './note-regrouping';
import { openPair } from './open-pair';
import { findRegrouping, noteUndone } from './regrouping.store';
import type { Regrouping } from './regrouping.entity';

const studyOf = (procedure: Procedure) => procedure.studyInstanceUid.split('#', 1)[0];

/** Reports that came after a merge and went where their study's reports had gone: they go back with them. */
async function listFollowers(tx: Db, source: Procedure, regrouping: Regrouping): Promise<string[]> {
  if (source.mergedIntoId !== regrouping.targetId) return [];
  const reports = await listReportsOf(tx, source.hospitalId, regrouping.targetId);
  return reports
    .filter(
      ({ receivedAt, context }) =>
        receivedAt > regrouping.doneAt && context?.studyInstanceUid === studyOf(source),
    )
    .map(({ id }) => id);
}

/** Undoes a merge, split or move: the reports go back with their events, and both procedures are as before. */
export const takeBack = (
  db: Db,
  actor: Actor,
  id: string,
  { sourceVersion, targetVersion, reason }: z.output<typeof takeBackInputSchema>,
  now: Date,
): Promise<Regrouped> =>
  db.transaction(async (tx) => {
    const found = await findRegrouping(tx, actor.hospitalId, id);
    if (!found) throw new Problem('not-found');
    const { source, target } = await openPair(
      tx,
      actor,
      { id: found.sourceId, version: sourceVersion },
      { id: found.targetId, version: targetVersion },
    );
    const regrouping = (await findRegrouping(tx, actor.hospitalId, id)) as Regrouping;
    if (regrouping.undoneAt) throw new Problem('cannot-regroup', 'This was taken back already.');
    const reports = await listGroupedReports(tx, actor.hospitalId, regrouping.doseReportIds);
    if (reports.length === 0 || reports.some(({ procedureId }) => procedureId !== target.id))
      throw new Problem(
        'cannot-regroup',
        'A later regrouping took these reports on. Take that one back first.',
      );
    const doseReportIds = [
      ...new Set([...reports.map((report) => report.id), ...(await listFollowers(tx, source, regrouping))]),
    ];
    const evidence = await moveReports(
      tx,
      await findHospital(tx, actor.hospitalId),
      {
        source: target,
        target: source,
        doseReportIds,
        isNewTarget: false,
        back: regrouping.evidence as Evidence,
      },
      now,
    );
    await noteUndone(tx, id, actor.id);
    await noteRegrouping(tx, actor, {
      kind: regrouping.kind,
      source,
      target,
      reportCount: regrouping.doseReportIds.length,
      isTakenBack: true,
      evidence,
      reason,
    });
    return { regroupingId: id, procedureId: source.id, caseNumber: source.caseNumber };
  });
