import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { Attachment } from './attachment.entity';

export async function addAttachment(
  db: EntityManager,
  attachment: Omit<Attachment, 'id' | 'createdAt'>,
): Promise<string> {
  const id = newId();
  await db.insert(Attachment, { ...attachment, id });
  return id;
}

export const findAttachment = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<Attachment | null> => db.findOneBy(Attachment, { hospitalId, id });

/** Is it a picture of a dose screen that no entry of another report refers to? */
export async function isFreePicture(
  db: EntityManager,
  hospitalId: string,
  id: string,
  doseReportId: string | null,
): Promise<boolean> {
  const rows: unknown[] = await db.query(
    `select 1 from attachment
      where hospital_id = $1 and id = $2 and purpose = 'dose-screen'
        and not exists (select 1 from manual_entry entry
          where entry.photo_id = attachment.id and entry.dose_report_id is distinct from $3)`,
    [hospitalId, id, doseReportId],
  );
  return rows.length === 1;
}

/** Pictures may show a name: those that were taken and never used do not stay. */
export async function dropUnusedPictures(
  db: EntityManager,
  hospitalId: string,
  olderThanDays: number,
): Promise<void> {
  await db.query(
    `delete from attachment
      where hospital_id = $1 and purpose = 'dose-screen' and created_at < now() - make_interval(days => $2)
        and not exists (select 1 from manual_entry entry where entry.photo_id = attachment.id)`,
    [hospitalId, olderThanDays],
  );
}
