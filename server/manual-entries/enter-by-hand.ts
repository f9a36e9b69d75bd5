import type { z } from 'zod';
import type { Entered, newManualEntrySchema } from '../../shared/contract/manual-entry';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { addTypedProcedure } from './add-typed-procedure';
import { checkEntry } from './check-entry';
import { hashEntry } from './hash-entry';
import { addManualEntry, findNewestEntry } from './manual-entry.store';
import { addTypedReport, findByKey } from './manual-report.store';
import { openUnreported } from './open-unreported';
import { settleProcedure } from './settle-procedure';
import { toReportPlanes } from './to-report-planes';

type Input = z.output<typeof newManualEntrySchema>;

/** Stores what a machine's screen showed: procedure, report, entry, totals and audit line, all or nothing. */
export const enterByHand = (db: Db, actor: Actor, input: Input, now: Date): Promise<Entered> =>
  db.transaction(async (tx) => {
    const { hospitalId } = actor;
    const { key, confirmation: _, ...content } = input;
    const contentHash = hashEntry(content);
    const known = await findByKey(tx, hospitalId, key);
    if (known) return answerAgain(tx, known, contentHash);

    const hospital = await findHospital(tx, hospitalId);
    const { roomId } = await checkEntry(tx, hospital, input, null, now);
    const { equipmentId, localStartedAt, quantities } = input;
    const procedure =
      input.procedureId === null
        ? await addTypedProcedure(tx, hospital, { ...input, roomId })
        : await openUnreported(tx, actor, input.procedureId, { equipmentId, roomId });
    const doseReportId = await addTypedReport(tx, {
      hospitalId,
      key,
      contentHash,
      procedureId: procedure.id,
      equipmentId: procedure.equipmentId,
      reportedPlanes: toReportPlanes(quantities),
      typedById: actor.id,
      now,
    });
    const id = await addManualEntry(tx, {
      hospitalId,
      doseReportId,
      localStartedAt,
      quantities,
      photoId: input.photoId,
      comment: input.comment,
      reason: null,
      replacesId: null,
      enteredById: actor.id,
      enteredAt: now,
    });
    await settleProcedure(tx, hospital, procedure, {
      localStartedAt,
      reason: 'figures were entered by hand',
      now,
    });
    await noteAudit(tx, {
      hospitalId,
      actorId: actor.id,
      action: 'figures entered by hand',
      subject: 'procedure',
      subjectId: procedure.id,
      after: { entryId: id, doseReportId, localStartedAt, quantities },
    });
    return { id, procedureId: procedure.id };
  });

/** A double click or a lost answer: the first entry is the answer, unless something else came under its key. */
async function answerAgain(tx: Db, known: DoseReport, contentHash: string): Promise<Entered> {
  const entry = await findNewestEntry(tx, known.hospitalId, known.id);
  if (!entry || known.procedureId === null || known.contentHash !== contentHash)
    throw new Problem(
      'already-exists',
      'This entry was stored already, with other contents. Open it and correct it there.',
      { current: { procedureId: known.procedureId } },
    );
  return { id: entry.id, procedureId: known.procedureId };
}
