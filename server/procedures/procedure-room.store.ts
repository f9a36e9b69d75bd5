import { IsNull, type EntityManager } from 'typeorm';
import { Procedure } from './procedure.entity';

/** Puts the machine's procedures that have no room yet into this one; tells how many. */
export async function giveRoomToProcedures(
  db: EntityManager,
  hospitalId: string,
  equipmentId: string,
  roomId: string,
): Promise<number> {
  const result = await db.update(Procedure, { hospitalId, equipmentId, roomId: IsNull() }, { roomId });
  return result.affected ?? 0;
}
