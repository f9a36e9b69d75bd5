import type { EntityManager } from 'typeorm';
import type { Room as RoomContract } from '../../shared/contract/room';
import { Room } from './room.entity';

type RoomFields = Omit<RoomContract, 'version'>;

export const listRooms = (db: EntityManager, hospitalId: string): Promise<Room[]> =>
  db.find(Room, { where: { hospitalId }, order: { isActive: 'DESC', code: 'ASC' } });

export const findRoom = (db: EntityManager, hospitalId: string, id: string): Promise<Room | null> =>
  db.findOneBy(Room, { hospitalId, id });

export async function addRoom(db: EntityManager, hospitalId: string, room: RoomFields): Promise<void> {
  await db.insert(Room, { ...room, hospitalId });
}

/** False when somebody else saved a newer version meanwhile. */
export async function updateRoom(
  db: EntityManager,
  hospitalId: string,
  { id, ...room }: RoomFields,
  version: number,
): Promise<boolean> {
  const result = await db.update(Room, { id, hospitalId, version }, { ...room, version: version + 1 });
  return result.affected === 1;
}
