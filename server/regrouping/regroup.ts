import type { RegroupingKind } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import type { Procedure } from '../procedures/procedure.entity';
import { addSplitProcedure } from './add-split-procedure';
import { findRefusal } from './find-refusal';
import { findSpanOfReports } from './grouped-reports.store';
import { moveReports, type Evidence } from './move-reports';
import { openPair, type Seen } from './open-pair';

export type RegroupPlan = {
  kind: RegroupingKind;
  source: Seen;
  /** Null for a split: the new procedure is made. */
  target: Seen | null;
  /** Ignored for a merge, which takes all. */
  doseReportIds: string[];
  /** Given for a try that is taken back at once, so that no number is used up. */
  caseNumber: string | null;
};

export type Regrouped = { source: Procedure; target: Procedure; doseReportIds: string[]; evidence: Evidence };

const refuse = (sentence: string) => new Problem('cannot-regroup', sentence);

/** The reports that are to go, checked against those that are there. */
function chooseReports(plan: RegroupPlan, reports: DoseReport[]): DoseReport[] {
  if (reports.length === 0) throw refuse('This procedure has no dose report.');
  if (plan.kind === 'merge') return reports;
  const chosen = reports.filter(({ id }) => plan.doseReportIds.includes(id));
  if (chosen.length === 0 || chosen.length < new Set(plan.doseReportIds).size)
    throw refuse('Choose reports of this procedure. One that you chose is not here any more.');
  if (plan.kind === 'split' && chosen.length === reports.length)
    throw refuse('At least one report has to stay, else nothing is split.');
  return chosen;
}

/** Merges, splits or moves in the caller's transaction; refused with a sentence where that would mix what is apart. */
export async function regroup(tx: Db, actor: Actor, plan: RegroupPlan, now: Date): Promise<Regrouped> {
  const hospital = await findHospital(tx, actor.hospitalId);
  const opened = await openPair(tx, actor, plan.source, plan.target);
  const { source } = opened;
  const chosen = chooseReports(plan, await listReportsOf(tx, hospital.id, source.id));
  const doseReportIds = chosen.map(({ id }) => id);
  if (opened.target) {
    const span = await findSpanOfReports(tx, source.id, doseReportIds);
    const refusal = findRefusal(source, opened.target, span ?? source);
    if (refusal) throw refuse(refusal);
  } else if (source.isWithdrawn)
    throw refuse(`${source.caseNumber} is withdrawn. Restore it first, if it is meant to count.`);
  const target = opened.target ?? (await addSplitProcedure(tx, hospital, source, chosen, plan.caseNumber));
  const isNewTarget = opened.target === null;
  const evidence = await moveReports(
    tx,
    hospital,
    { source, target, doseReportIds, isNewTarget, back: null },
    now,
  );
  return { source, target, doseReportIds, evidence };
}
