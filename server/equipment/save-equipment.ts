import type { z } from 'zod';
import type { Equipment, equipmentInputSchema, newEquipmentSchema } from '../../shared/contract/equipment';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { saveVersioned } from '../kernel/save-versioned';
import { giveRoomToProcedures } from '../procedures/procedure-room.store';
import { findRoom } from '../rooms/room.store';
import { addEquipment, findEquipment, updateEquipment } from './equipment.store';
import { identityKeyOf } from './equipment-identity.store';

const uniqueField = {
  pointer: '/serialNumber',
  detail: 'A machine of this manufacturer and model with this serial number is known already.',
};

/** Adds a machine by hand, before its first report; that report will recognise it. */
export const addKnownEquipment = (
  db: Db,
  actor: Actor,
  input: z.output<typeof newEquipmentSchema>,
): Promise<Equipment> =>
  saveVersioned(db, actor, {
    subject: 'equipment',
    uniqueField,
    id: null,
    version: undefined,
    find: (tx, id) => findEquipment(tx, actor.hospitalId, id),
    add: async (tx, id) => {
      await requireRoom(tx, actor.hospitalId, input.roomId);
      await addEquipment(tx, actor.hospitalId, { ...input, id, identityKey: identityKeyOf(input) });
    },
    update: () => Promise.resolve(false),
  });

/** Edits a machine. Given a room, its procedures that have none yet go there too. */
export const saveEquipment = (
  db: Db,
  actor: Actor,
  equipmentId: string,
  { version, ...equipment }: z.output<typeof equipmentInputSchema>,
): Promise<Equipment> =>
  saveVersioned(db, actor, {
    subject: 'equipment',
    id: equipmentId,
    version,
    find: (tx, id) => findEquipment(tx, actor.hospitalId, id),
    add: () => Promise.resolve(),
    update: async (tx, id, seen) => {
      await requireRoom(tx, actor.hospitalId, equipment.roomId);
      if (!(await updateEquipment(tx, actor.hospitalId, { ...equipment, id }, seen))) return false;
      if (equipment.roomId) await giveRoomToProcedures(tx, actor.hospitalId, id, equipment.roomId);
      return true;
    },
  });

async function requireRoom(tx: Db, hospitalId: string, roomId: string | null): Promise<void> {
  if (roomId === null || (await findRoom(tx, hospitalId, roomId))) return;
  throw fieldProblem({ pointer: '/roomId', detail: 'There is no such room.' });
}
