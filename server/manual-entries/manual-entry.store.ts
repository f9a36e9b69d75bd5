import type { EntityManager } from 'typeorm';
import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { newId } from '../kernel/new-id';
import { ManualEntry } from './manual-entry.entity';

export async function addManualEntry(db: EntityManager, entry: Omit<ManualEntry, 'id'>): Promise<string> {
  const id = newId();
  await db.insert(ManualEntry, { ...entry, id });
  return id;
}

export const findManualEntry = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<ManualEntry | null> => db.findOneBy(ManualEntry, { hospitalId, id });

/** The newest entry of a report: the one whose figures the report bears. */
export const findNewestEntry = (
  db: EntityManager,
  hospitalId: string,
  doseReportId: string,
): Promise<ManualEntry | null> =>
  db.findOne(ManualEntry, { where: { hospitalId, doseReportId }, order: { enteredAt: 'DESC', id: 'DESC' } });

/** Has a procedure figures that were typed? */
export async function hasTypedReport(
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<boolean> {
  const rows: unknown[] = await db.query(
    `select 1 from dose_report where hospital_id = $1 and procedure_id = $2 and channel = 'manual' and outcome = 'stored'`,
    [hospitalId, procedureId],
  );
  return rows.length > 0;
}

export type ListedEntry = {
  id: string;
  equipmentId: string | null;
  localStartedAt: string;
  quantities: TypedQuantity[];
  photoId: string | null;
  comment: string | null;
  reason: string | null;
  replacesId: string | null;
  enteredBy: string;
  enteredAt: Date;
  isCurrent: boolean;
};

/** Every entry of a procedure, the newest first, with those that were replaced. */
export const listManualEntries = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<ListedEntry[]> =>
  db.query(
    `select entry.id, report.equipment_id as "equipmentId", entry.local_started_at as "localStartedAt", entry.quantities,
            entry.photo_id as "photoId", entry."comment", entry."reason", entry.replaces_id as "replacesId",
            person."name" as "enteredBy", entry.entered_at as "enteredAt",
            not exists (select 1 from manual_entry later where later.replaces_id = entry.id) as "isCurrent"
       from manual_entry entry
       join dose_report report on report.id = entry.dose_report_id
       join person on person.id = entry.entered_by_id
      where entry.hospital_id = $1 and report.procedure_id = $2 and report.outcome = 'stored'
      order by entry.entered_at desc, entry.id desc`,
    [hospitalId, procedureId],
  );
