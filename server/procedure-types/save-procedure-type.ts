import type { z } from 'zod';
import type { ProcedureType, procedureTypeInputSchema } from '../../shared/contract/procedure-type';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { saveVersioned } from '../kernel/save-versioned';
import { addProcedureType, findProcedureType, updateProcedureType } from './procedure-type.store';

/** Adds a procedure type (no id) or edits it, in one transaction with its audit line. */
export const saveProcedureType = (
  db: Db,
  actor: Actor,
  id: string | null,
  { version, ...type }: z.output<typeof procedureTypeInputSchema>,
): Promise<ProcedureType> =>
  saveVersioned(db, actor, {
    subject: 'procedure type',
    uniqueField: { pointer: '/key', detail: 'Another procedure type has this code.' },
    id,
    version,
    find: (tx, typeId) => findProcedureType(tx, actor.hospitalId, typeId),
    add: (tx, typeId) => addProcedureType(tx, actor.hospitalId, { ...type, id: typeId }),
    update: (tx, typeId, seen) => updateProcedureType(tx, actor.hospitalId, { ...type, id: typeId }, seen),
  });
