import type { EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Room, roomInputSchema } from '../../shared/contract/room';
import { saveVersioned } from '../kernel/save-versioned';
import type { Actor } from '../kernel/actor';
import { addRoom, findRoom, updateRoom } from './room.store';

/** Adds a room (no id) or edits it, in one transaction with its audit line. */
export const saveRoom = (
  db: EntityManager,
  actor: Actor,
  id: string | null,
  { version, ...room }: z.output<typeof roomInputSchema>,
): Promise<Room> =>
  saveVersioned(db, actor, {
    subject: 'room',
    id,
    version,
    find: (tx, roomId) => findRoom(tx, actor.hospitalId, roomId),
    add: (tx, roomId) => addRoom(tx, actor.hospitalId, { ...room, id: roomId }),
    update: (tx, roomId, seen) => updateRoom(tx, actor.hospitalId, { ...room, id: roomId }, seen),
  });
