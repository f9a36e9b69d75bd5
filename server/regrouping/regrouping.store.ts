import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { Regrouping } from './regrouping.entity';

export type ListedRegrouping = Pick<
  Regrouping,
  'id' | 'kind' | 'sourceId' | 'targetId' | 'doseReportIds' | 'reason' | 'doneAt' | 'undoneAt'
> & {
  doneBy: string;
  sourceNumber: string;
  targetNumber: string;
  sourceVersion: number;
  targetVersion: number;
};

/** What was merged, split or moved to or from a procedure, newest first. */
export const listRegroupings = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<ListedRegrouping[]> =>
  db.query(
    `select regrouping.id, regrouping.kind, regrouping.source_id as "sourceId", regrouping.target_id as "targetId",
            regrouping.dose_report_ids as "doseReportIds", regrouping."reason", regrouping.done_at as "doneAt",
            regrouping.undone_at as "undoneAt", person."name" as "doneBy",
            source.case_number as "sourceNumber", target.case_number as "targetNumber",
            source."version" as "sourceVersion", target."version" as "targetVersion"
       from regrouping
       join person on person.id = regrouping.done_by_id
       join procedure source on source.id = regrouping.source_id
       join procedure target on target.id = regrouping.target_id
      where regrouping.hospital_id = $1 and $2 in (regrouping.source_id, regrouping.target_id)
      order by regrouping.done_at desc, regrouping.id desc`,
    [hospitalId, procedureId],
  );

export const findRegrouping = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<Regrouping | null> => db.findOneBy(Regrouping, { hospitalId, id });

/** Version 7 keys sort by the time they were made: the newest of one transaction is still the newest. */
export async function addRegrouping(
  db: EntityManager,
  regrouping: Omit<Regrouping, 'id' | 'doneAt' | 'undoneAt' | 'undoneById'>,
): Promise<string> {
  const id = newId();
  await db.insert(Regrouping, { ...(regrouping as object), id });
  return id;
}

export async function noteUndone(db: EntityManager, id: string, undoneById: string): Promise<void> {
  await db.update(Regrouping, { id }, { undoneAt: new Date(), undoneById });
}
