import type { z } from 'zod';
import type { Garment, garmentInputSchema } from '../../shared/contract/garment';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { saveVersioned } from '../kernel/save-versioned';
import { findPerson } from '../people/person.store';
import { addGarment, findGarment, updateGarment } from './garment.store';
import { findToday, tellOverdue } from './show-garments';

/** Adds a garment (no id) or edits it, in one transaction with its audit line. */
export async function saveGarment(
  db: Db,
  actor: Actor,
  id: string | null,
  { version, ...garment }: z.output<typeof garmentInputSchema>,
  now: Date,
): Promise<Garment> {
  const { hospitalId } = actor;
  const today = await findToday(db, hospitalId, now);
  return saveVersioned(db, actor, {
    subject: 'garment',
    uniqueField: { pointer: '/code', detail: 'Another garment has this code.' },
    id,
    version,
    find: async (tx, garmentId) => {
      const found = await findGarment(tx, hospitalId, garmentId);
      return found && tellOverdue(found, today);
    },
    add: async (tx, garmentId) => {
      await requireOwner(tx, hospitalId, garment.ownerId);
      await addGarment(tx, hospitalId, { ...garment, id: garmentId });
    },
    update: async (tx, garmentId, seen) => {
      await requireOwner(tx, hospitalId, garment.ownerId);
      return updateGarment(tx, hospitalId, { ...garment, id: garmentId }, seen);
    },
  });
}

async function requireOwner(tx: Db, hospitalId: string, ownerId: string | null): Promise<void> {
  if (ownerId === null || (await findPerson(tx, hospitalId, ownerId))) return;
  throw fieldProblem({ pointer: '/ownerId', detail: 'There is no such person.' });
}
