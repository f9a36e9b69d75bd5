import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { Level } from './level.entity';

export type NewLevel = Pick<Level, 'quantity' | 'strength' | 'value' | 'source' | 'validFrom'>;

export async function insertLevels(db: EntityManager, hospitalId: string, levels: NewLevel[]): Promise<void> {
  await db.insert(
    Level,
    levels.map((level) => ({ ...level, id: newId(), hospitalId, procedureTypeId: null })),
  );
}

/** The newest level of each quantity and strength that was valid on a day; a type's own goes before the general. */
export const listLevels = (
  db: EntityManager,
  hospitalId: string,
  procedureTypeId: string | null,
  day: string,
): Promise<Level[]> =>
  db
    .createQueryBuilder(Level, 'level')
    .distinctOn(['level.quantity', 'level.strength'])
    .where('level.hospital_id = :hospitalId and level.valid_from <= :day', { hospitalId, day })
    .andWhere('(level.procedure_type_id is null or level.procedure_type_id = :procedureTypeId)', {
      procedureTypeId,
    })
    .orderBy('level.quantity')
    .addOrderBy('level.strength')
    .addOrderBy('level.procedure_type_id', 'ASC', 'NULLS LAST')
    .addOrderBy('level.valid_from', 'DESC')
    .getMany();
