import type { EntityManager } from 'typeorm';
import type { ProcedureType as ProcedureTypeContract } from '../../shared/contract/procedure-type';
import { ProcedureType } from './procedure-type.entity';

type ProcedureTypeFields = Omit<ProcedureTypeContract, 'version'>;

export const listProcedureTypes = (db: EntityManager, hospitalId: string): Promise<ProcedureType[]> =>
  db.find(ProcedureType, { where: { hospitalId }, order: { isActive: 'DESC', name: 'ASC' } });

export const findProcedureType = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<ProcedureType | null> => db.findOneBy(ProcedureType, { hospitalId, id });

export async function addProcedureType(
  db: EntityManager,
  hospitalId: string,
  type: ProcedureTypeFields,
): Promise<void> {
  await db.insert(ProcedureType, { ...type, hospitalId });
}

/** False when somebody else saved a newer version meanwhile. */
export async function updateProcedureType(
  db: EntityManager,
  hospitalId: string,
  { id, ...type }: ProcedureTypeFields,
  version: number,
): Promise<boolean> {
  const result = await db.update(
    ProcedureType,
    { id, hospitalId, version },
    { ...type, version: version + 1 },
  );
  return result.affected === 1;
}
