import type { Db } from '../db/db';
import { writeDoseReport } from '../dicom-writer/write-dose-report';
import { receiveDoseReport } from '../dose-reports/receive-dose-report';
import type { Actor } from '../kernel/actor';
import { findActor } from '../people/account.store';
import { findProcedure } from '../procedures/procedure.store';
import { saveRecord } from '../procedures/save-record';
import { confusedWith } from './audit-rows';
import type { DemoProcedure } from './demo-types';
import { describeDoseReport } from './describe-dose-report';
import { describePresences } from './presence-rows';
import { completionOf, describeAnswers } from './procedure-row';
import { arrivalOf } from './report-rows';
import { type DemoIds, idOf } from './seed-hospital';
import { splitIntoReports } from './split-into-reports';

/** Who does what a person does here. */
interface Crew {
  ids: DemoIds;
  technologist: Actor;
  physicist: Actor;
}

async function findCrewMember(db: Db, ids: DemoIds, code: string): Promise<Actor> {
  const actor = await findActor(db, idOf(ids.people, code));
  if (!actor) throw new Error(`${code} can't sign in.`);
  return actor;
}

/** Sends a procedure's files through the intake, as a technologist would; returns the procedure's id. */
async function receiveFiles(db: Db, procedure: DemoProcedure, ids: DemoIds): Promise<string> {
  let procedureId: string | null = null;
  for (const part of splitIntoReports(procedure)) {
    const file = {
      hospitalId: ids.hospitalId,
      fileName: `${procedure.accessionNumber}-${part.number}.dcm`,
      channel: 'page' as const,
      receivedById: idOf(ids.people, 'T-04'),
      bytes: Buffer.from(writeDoseReport(describeDoseReport(procedure, part))),
    };
    const received = await receiveDoseReport(db, file, arrivalOf(procedure));
    if (received.procedureId === null)
      throw new Error(`The demo's own file was ${received.outcome}: ${received.reason?.detail}`);
    procedureId = received.procedureId;
  }
  if (procedureId === null) throw new Error('A procedure without a file.');
  return procedureId;
}

/** The record as the form sends it, with the given operator. */
function fillIn(procedure: DemoProcedure, operatorCode: string, ids: DemoIds) {
  const primaryOperatorId = idOf(ids.people, operatorCode);
  const presences = describePresences(procedure, ids).map((presence) =>
    presence.duty === 'primary-operator' ? { ...presence, personId: primaryOperatorId } : presence,
  );
  return { ...describeAnswers(procedure, ids), primaryOperatorId, presences };
}

/** Completes the record as a technologist; where the operator was wrong at first, the physicist corrects it. */
async function completeRecord(
  db: Db,
  procedureId: string,
  procedure: DemoProcedure,
  { ids, technologist, physicist }: Crew,
): Promise<void> {
  const received = await findProcedure(db, ids.hospitalId, procedureId);
  if (!received) throw new Error('A received procedure is gone.');
  const { operatorCode } = procedure;
  const wrongCode = procedure.defect === 'wrong-operator-corrected' ? confusedWith(procedure) : null;
  const first = {
    ...fillIn(procedure, wrongCode ?? operatorCode, ids),
    version: received.version,
    reason: null,
  };
  const saved = await saveRecord(db, technologist, procedureId, first, completionOf(procedure));
  if (wrongCode === null) return;
  const second = {
    ...fillIn(procedure, operatorCode, ids),
    version: saved.version,
    reason: `The operator was ${operatorCode}, not ${wrongCode}`,
  };
  await saveRecord(db, physicist, procedureId, second, completionOf(procedure));
}

/** Of the last cases some wait for a person: every fifth of the forty newest. */
const isLeftOpen = (index: number, count: number): boolean =>
  count - index <= 40 && (count - index) % 5 === 0;

/**
 * The procedures of the last 30 days: real files through the real intake. The cases still open are
 * those that a technologist finds in the list in the morning.
 */
export async function seedNewest(
  db: Db,
  procedures: readonly DemoProcedure[],
  ids: DemoIds,
  report: (line: string) => void,
): Promise<void> {
  const crew: Crew = {
    ids,
    technologist: await findCrewMember(db, ids, 'T-04'),
    physicist: await findCrewMember(db, ids, 'P-01'),
  };
  for (const [index, procedure] of procedures.entries()) {
    const procedureId = await receiveFiles(db, procedure, ids);
    if (!isLeftOpen(index, procedures.length)) await completeRecord(db, procedureId, procedure, crew);
    if ((index + 1) % 100 === 0)
      report(`Demo: ${index + 1} of ${procedures.length} newest procedures received`);
  }
}
