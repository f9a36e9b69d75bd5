import type { z } from 'zod';
import type { recordInputSchema } from '../../shared/contract/record';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { dropEstimates, refreshEstimates } from '../staff-exposure/refresh-estimates';
import { checkRecordReferences } from './check-record-references';
import { describeRecord, findMissing } from './describe-record';
import { appendPresences } from './presence.store';
import { lockProcedure, updateProcedure } from './procedure.store';
import type { Procedure } from './procedure.entity';
import { recomputeProcedure } from './recompute-procedure';

type RecordInput = z.output<typeof recordInputSchema>;

/** What levels and data checks depend on. */
const checkedFields = ['procedureTypeId', 'patientHeightM', 'patientWeightKg'] as const;

/** What a person filled in or overruled is no longer "from the file". */
const stillFromFile = (procedure: Procedure, input: RecordInput) =>
  procedure.fromFile.filter(
    (field) => procedure[field as keyof Procedure] === input[field as keyof RecordInput],
  );

/** Saves the record, partial or whole; a whole one is estimated, a corrected one anew. Nothing earlier is overwritten. */
export const saveRecord = (
  db: Db,
  actor: Actor,
  id: string,
  input: RecordInput,
  now: Date,
): Promise<Procedure> =>
  db.transaction(async (tx) => {
    const procedure = await lockProcedure(tx, actor.hospitalId, id);
    if (!procedure) throw new Problem('not-found');
    const before = await describeRecord(tx, procedure);
    if (procedure.version !== input.version)
      throw new Problem(
        'conflict',
        'Somebody saved this record after you opened it. Compare, then save again.',
        {
          current: before,
        },
      );
    const wasComplete = procedure.recordState === 'complete';
    if (wasComplete && input.reason === null)
      throw new Problem(
        'invalid-input',
        'A complete record is corrected with a reason; nothing was changed.',
        {
          issues: [{ pointer: '/reason', detail: 'Say why in a few words.' }],
        },
      );
    await checkRecordReferences(tx, actor.hospitalId, input);

    const { presences, version: _, reason, ...answers } = input;
    const missing = findMissing(answers, presences);
    const isComplete = missing.length === 0;
    const recordRevision = procedure.recordRevision + 1;
    await appendPresences(tx, id, recordRevision, presences);
    await updateProcedure(tx, actor.hospitalId, id, {
      ...answers,
      missing,
      recordRevision,
      recordState: isComplete ? 'complete' : 'incomplete',
      fromFile: stillFromFile(procedure, input),
      completedAt: isComplete ? (procedure.completedAt ?? now) : null,
    });
    const saved = await reload(tx, actor, id);
    if (checkedFields.some((field) => answers[field] !== procedure[field]))
      await recomputeProcedure(tx, await findHospital(tx, actor.hospitalId), saved, null, now);
    const current = await reload(tx, actor, id);
    if (isComplete) await refreshEstimates(tx, current, reason);
    else if (wasComplete) await dropEstimates(tx, current);
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: wasComplete ? 'record corrected' : isComplete ? 'record completed' : 'record saved, incomplete',
      subject: 'procedure',
      subjectId: id,
      before,
      after: input,
      reason,
    });
    return reload(tx, actor, id);
  });

async function reload(tx: Db, actor: Actor, id: string): Promise<Procedure> {
  const procedure = await lockProcedure(tx, actor.hospitalId, id);
  if (!procedure) throw new Problem('not-found');
  return procedure;
}
