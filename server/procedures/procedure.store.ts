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

/** Serialises the reports of one order, which may come under several studies; taken after the study's lock. */
export async function lockOrder(db: EntityManager, hospitalId: string, accessionKey: string): Promise<void> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 2))', [`${hospitalId}|${accessionKey}`]);
}

/**
 * True for a procedure whose reports have the same intent, or that has none: a phantom exposure under a patient's
 * study is no part of the patient's procedure.
 */
const hasIntent = (parameter: string) => `coalesce((
  select bool_or((report.context->>'isQualityControl')::boolean = ${parameter}) from dose_report report
   where report.procedure_id = procedure.id and report."outcome" = 'stored'), true)`;

/** The procedure that a study of a patient belongs to; the keys of those cut off from it end in "#" and a number. */
export async function findByStudy(
  db: EntityManager,
  hospitalId: string,
  studyInstanceUid: string,
  patientKey: string,
  isQualityControl: boolean,
): Promise<Procedure | null> {
  const [home] = await db.query(
    `select id from procedure
      where hospital_id = $1 and split_part(study_instance_uid, '#', 1) = $2 and patient_key = $3
        and study_instance_uid >= $2 and study_instance_uid < $2 || '$' and ${hasIntent('$4')}
      order by length(study_instance_uid), study_instance_uid limit 1`,
    [hospitalId, studyInstanceUid, patientKey, isQualityControl],
  );
  return home ? findProcedure(db, hospitalId, home.id) : null;
}

/** A key for a further procedure of the same study and patient: the study UID, or with the next free number. */
export async function freeStudyKey(
  db: EntityManager,
  hospitalId: string,
  studyInstanceUid: string,
  patientKey: string,
): Promise<string> {
  const study = studyInstanceUid.split('#', 1)[0] as string;
  const rows: { key: string }[] = await db.query(
    `select study_instance_uid as key from procedure
      where hospital_id = $1 and patient_key = $3 and study_instance_uid >= $2 and study_instance_uid < $2 || '$'`,
    [hospitalId, study, patientKey],
  );
  const taken = new Set(rows.map(({ key }) => key));
  if (!taken.has(study)) return study;
  let number = 2;
  while (taken.has(`${study}#${number}`)) number += 1;
  return `${study}#${number}`;
}

/** Procedures of one order of one patient that count, or whose reports went to another. */
export async function listByOrder(
  db: EntityManager,
  hospitalId: string,
  accessionKey: string,
  { isQualityControl, deviceClass }: { isQualityControl: boolean; deviceClass: string },
): Promise<string[]> {
  const rows: { id: string }[] = await db.query(
    `select id from procedure
      where hospital_id = $1 and accession_key = $2 and device_class = $4
        and (not is_withdrawn or merged_into_id is not null) and ${hasIntent('$3')}
      order by length(study_instance_uid), started_at, id`,
    [hospitalId, accessionKey, isQualityControl, deviceClass],
  );
  return rows.map(({ id }) => id);
}

/** Where the reports of a procedure are now: itself, or what took it over, and so on. */
export async function findHeir(db: EntityManager, hospitalId: string, id: string): Promise<Procedure | null> {
  let procedure = await findProcedure(db, hospitalId, id);
  const seen = new Set([id]);
  while (procedure?.mergedIntoId && !seen.has(procedure.mergedIntoId)) {
    seen.add(procedure.mergedIntoId);
    procedure = await findProcedure(db, hospitalId, procedure.mergedIntoId);
  }
  return procedure;
}

/** The same, locked: nobody may regroup meanwhile, so that the way there holds still. */
export async function lockHeir(db: EntityManager, hospitalId: string, id: string): Promise<Procedure | null> {
  const heir = await findHeir(db, hospitalId, id);
  return heir && lockProcedure(db, hospitalId, heir.id);
}

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
