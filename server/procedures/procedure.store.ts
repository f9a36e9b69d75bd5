import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { Procedure } from './procedure.entity';

export const findProcedure = (db: EntityManager, hospitalId: string, id: string): Promise<Procedure | null> =>
  db.findOneBy(Procedure, { hospitalId, id });

/** Serialises everything that recomputes one study of one patient, until the transaction ends. */
export async function lockStudy(
  db: EntityManager,
  hospitalId: string,
  studyInstanceUid: string,
  patientKey: string,
): Promise<void> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 0))', [
    `${hospitalId}|${studyInstanceUid}|${patientKey}`,
  ]);
}

export const findByStudy = (
  db: EntityManager,
  hospitalId: string,
  studyInstanceUid: string,
  patientKey: string,
): Promise<Procedure | null> => db.findOneBy(Procedure, { hospitalId, studyInstanceUid, patientKey });

/** "26-00412": the year of the procedure and a number that counts up. */
export async function nextCaseNumber(db: EntityManager, year: number): Promise<string> {
  const [{ number }] = await db.query(`select nextval('case_number') as number`);
  return `${String(year % 100).padStart(2, '0')}-${String(number).padStart(5, '0')}`;
}

export type NewProcedure = Omit<Partial<Procedure>, 'id'> &
  Pick<
    Procedure,
    | 'hospitalId'
    | 'caseNumber'
    | 'studyInstanceUid'
    | 'patientKey'
    | 'startedAt'
    | 'localStartedAt'
    | 'localDate'
    | 'timeBasis'
  >;

export async function addProcedure(db: EntityManager, procedure: NewProcedure): Promise<string> {
  const id = newId();
  await db.insert(Procedure, { ...procedure, id } as never);
  return id;
}

/** Writes columns and counts the version up. */
export async function updateProcedure(
  db: EntityManager,
  hospitalId: string,
  id: string,
  changes: Partial<Procedure>,
): Promise<void> {
  await db
    .createQueryBuilder()
    .update(Procedure)
    .set({ ...(changes as object), version: () => '"version" + 1' })
    .where({ hospitalId, id })
    .execute();
}

/** Waits for others who change this procedure, then reads it. */
export const lockProcedure = (db: EntityManager, hospitalId: string, id: string): Promise<Procedure | null> =>
  db.findOne(Procedure, { where: { hospitalId, id }, lock: { mode: 'pessimistic_write' } });
