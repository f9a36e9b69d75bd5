import type { StaffExposures } from '../../shared/contract/staff-exposure';
import { can, scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { isOwnProcedure } from '../procedures/open-procedure';
import { findProcedure } from '../procedures/procedure.store';
import { describeExposures } from './describe-exposures';

/**
 * Exposures of a procedure: all of it for physicists; by job title for technologists and for the procedure's own
 * operators; for anybody else in the room only their own row.
 */
export async function openExposures(db: Db, actor: Actor, id: string): Promise<StaffExposures> {
  const procedure = await findProcedure(db, actor.hospitalId, id);
  if (!procedure) throw new Problem('not-found');
  const all = await describeExposures(db, actor, procedure);
  const scope = scopeOf(actor, 'procedure.read-exposure');
  const isOperator = isOwnProcedure(procedure, actor) && can(actor, 'procedure.read');
  if (scope !== 'own' || isOperator) return all;
  const own = all.items.filter((item) => item.isOwn);
  if (own.length === 0) throw new Problem('not-found');
  return { ...all, items: own };
}
