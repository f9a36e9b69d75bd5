import type { Action } from '../../shared/permissions';
import { can } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findProcedure } from './procedure.store';
import type { Procedure } from './procedure.entity';

/** A procedure is one's own when it names the person as operator, second operator or trainee. */
export const isOwnProcedure = (procedure: Procedure, actor: Actor): boolean =>
  [procedure.primaryOperatorId, procedure.secondOperatorId, procedure.traineeId].includes(actor.id);

/** The procedure, for one who may do this with it; one that is not theirs is answered like one that does not exist. */
export async function openProcedure(db: Db, actor: Actor, id: string, action: Action): Promise<Procedure> {
  const procedure = await findProcedure(db, actor.hospitalId, id);
  if (!procedure || !can(actor, action, { isOwn: isOwnProcedure(procedure, actor) }))
    throw new Problem('not-found');
  return procedure;
}
