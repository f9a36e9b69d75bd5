import type { Db } from '../db/db';
import { noteAudit } from '../audit/audit.store';
import type { Actor } from './actor';
import { newId } from './new-id';
import { Problem } from './problem';

type Saving<T> = {
  subject: string;
  /** Null: a new one. */
  id: string | null;
  /** The version that the person saw. */
  version: number | undefined;
  find: (tx: Db, id: string) => Promise<T | null>;
  add: (tx: Db, id: string) => Promise<void>;
  /** False when the version has moved on. */
  update: (tx: Db, id: string, version: number) => Promise<boolean>;
  /** The field that may be held by one record only, and what to say when another holds it. */
  uniqueField?: { pointer: string; detail: string };
};

const isUniqueViolation = (error: unknown) => (error as { code?: string }).code === '23505';

/** Adds or edits one record with its audit line in one transaction; a conflict shows the other's version. */
export async function saveVersioned<T>(db: Db, actor: Actor, saving: Saving<T>): Promise<T> {
  const { subject, version, find } = saving;
  const id = saving.id ?? newId();
  try {
    return await db.transaction(async (tx) => {
      const before = saving.id === null ? null : await find(tx, id);
      if (saving.id === null) await saving.add(tx, id);
      else if (!before) throw new Problem('not-found');
      else if (!(await saving.update(tx, id, version ?? 0)))
        throw new Problem('conflict', 'Somebody saved this after you opened it. Compare, then save again.', {
          current: await find(tx, id),
        });
      const after = await find(tx, id);
      if (!after) throw new Problem('not-found');
      const action = before ? 'edited' : 'added';
      await noteAudit(tx, {
        hospitalId: actor.hospitalId,
        actorId: actor.id,
        action,
        subject,
        subjectId: id,
        before,
        after,
      });
      return after;
    });
  } catch (error) {
    if (isUniqueViolation(error))
      throw new Problem('already-exists', 'Another one has this code or name already; nothing was changed.', {
        issues: saving.uniqueField ? [saving.uniqueField] : [],
      });
    throw error;
  }
}
