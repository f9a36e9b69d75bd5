import type { Db } from '../db/db';
import type { z } from 'zod';
import type { Room, roomInputSchema } from '../../shared/contract/room';
import { saveVersioned } from '../kernel/save-versioned';
import type { Actor } from '../kernel/actor';
import { addRoom, findRoom, updateRoom } from './room.store';

/** Adds a room (no id) or edits it, in one transaction with its audit line. */
export const saveRoom = (
  db: Db,
  actor: Actor,
  id: string | null,
  { version, ...room }: z.output<typeof roomInputSchema>,
): Promise<Room> =>
  saveVersioned(db, actor, {
    subject: 'room',
    uniqueField: { pointer: '/code', detail: 'Another room has this code.' },
    id,
    version,
    find: (tx, roomId) => findRoom(tx, actor.hospitalId, roomId),
    add: (tx, roomId) => addRoom(tx, actor.hospitalId, { ...room, id: roomId }),
    update: (tx, roomId, seen) => updateRoom(tx, actor.hospitalId, { ...room, id: roomId }, seen),
  });
