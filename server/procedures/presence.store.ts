import type { EntityManager } from 'typeorm';
import type { Presence as PresenceContract } from '../../shared/contract/record';
import { newId } from '../kernel/new-id';
import { Presence } from './presence.entity';

export const listPresences = (
  db: EntityManager,
  procedureId: string,
  revision: number,
): Promise<Presence[]> => db.find(Presence, { where: { procedureId, revision }, order: { position: 'ASC' } });

/** Appends the people of a record as a new revision; earlier ones stay readable. */
export async function appendPresences(
  db: EntityManager,
  procedureId: string,
  revision: number,
  presences: PresenceContract[],
): Promise<void> {
  if (presences.length === 0) return;
  await db.insert(
    Presence,
    presences.map((presence, position) => ({
      ...presence,
      id: newId(),
      procedureId,
      revision,
      position,
    })) as never[],
  );
}
