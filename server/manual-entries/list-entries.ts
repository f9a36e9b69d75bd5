import type { ManualEntry } from '../../shared/contract/manual-entry';
import { can, scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { isOwnProcedure } from '../procedures/open-procedure';
import type { Procedure } from '../procedures/procedure.entity';
import { listManualEntries } from './manual-entry.store';

/** What was typed, to the letter. A comment may name the patient; who typed is for those who see everybody's record. */
export async function listEntries(db: Db, actor: Actor, procedure: Procedure): Promise<ManualEntry[]> {
  const seesAll = scopeOf(actor, 'procedure.read') === 'all';
  const seesPatient = can(actor, 'procedure.read-patient', { isOwn: isOwnProcedure(procedure, actor) });
  const entries = await listManualEntries(db, procedure.hospitalId, procedure.id);
  return entries.map(({ comment, enteredBy, enteredAt, photoId, reason, ...entry }) => ({
    ...entry,
    ...(seesPatient ? { comment } : {}),
    photoId: seesPatient ? photoId : null,
    reason: seesAll ? reason : null,
    enteredBy: seesAll ? enteredBy : null,
    enteredAt: enteredAt.toISOString(),
  }));
}
