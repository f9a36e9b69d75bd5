import type { z } from 'zod';
import type { Neighbour, neighbourQuerySchema } from '../../shared/contract/manual-entry';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { toInstant } from '../procedures/place-in-time';
import { listNeighbours } from './neighbour.store';

/** What is stored already of the same machine and hour, so that a case whose report did come is not typed once more. */
export async function findNeighbours(
  db: Db,
  actor: Actor,
  { equipment, at }: z.output<typeof neighbourQuerySchema>,
): Promise<Neighbour[]> {
  const { timeZone } = await findHospital(db, actor.hospitalId);
  const moment = toInstant(at, timeZone);
  return moment === null ? [] : listNeighbours(db, actor.hospitalId, equipment, moment);
}
