import type { z } from 'zod';
import type { procedureMarkSchema } from '../../shared/contract/procedure';
import { can } from '../../shared/permissions';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findProcedure, lockProcedure, updateProcedure } from './procedure.store';
import type { Procedure } from './procedure.entity';
import { recomputeProcedure } from './recompute-procedure';

/** Class and overlap of fields are a physicist's to say; a withdrawal is visible and can be taken back. */
export const markProcedure = (
  db: Db,
  actor: Actor,
  id: string,
  { version, reason, ...marks }: z.output<typeof procedureMarkSchema>,
  now: Date,
): Promise<Procedure> =>
  db.transaction(async (tx) => {
    const isJudged = marks.procedureClass !== undefined || marks.fieldsOverlap !== undefined;
    if (isJudged && !can(actor, 'procedure.classify')) throw new Problem('not-permitted');
    const procedure = await lockProcedure(tx, actor.hospitalId, id);
    if (!procedure) throw new Problem('not-found');
    const { procedureClass, fieldsOverlap, isWithdrawn } = procedure;
    const before = { procedureClass, fieldsOverlap, isWithdrawn };
    if (procedure.version !== version)
      throw new Problem(
        'conflict',
        'Somebody changed this procedure after you opened it. Look at it again.',
        {
          current: before,
        },
      );
    if (marks.isWithdrawn === false && procedure.mergedIntoId !== null)
      throw new Problem(
        'conflict',
        'Its reports are in another procedure, so there is nothing to restore here. Take the merge back: then it counts again.',
        { current: before },
      );
    const changes = Object.fromEntries(Object.entries(marks).filter(([, value]) => value !== undefined));
    await updateProcedure(tx, actor.hospitalId, id, changes);
    await recomputeProcedure(
      tx,
      await findHospital(tx, actor.hospitalId),
      { ...procedure, ...changes },
      null,
      now,
    );
    const action =
      marks.isWithdrawn === undefined
        ? 'marked'
        : marks.isWithdrawn
          ? 'procedure withdrawn'
          : 'procedure restored';
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action,
      subject: 'procedure',
      subjectId: id,
      before,
      after: changes,
      reason,
    });
    const marked = await findProcedure(tx, actor.hospitalId, id);
    if (!marked) throw new Problem('not-found');
    return marked;
  });
