import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';

export type AuditNote = {
  hospitalId: string;
  actorId: string | null;
  action: string;
  subject: string;
  subjectId?: string | null;
  before?: unknown;
  after?: unknown;
  reason?: string | null;
};

/** Adds one line to the audit trail, in the caller's transaction. */
export async function noteAudit(db: EntityManager, note: AuditNote): Promise<void> {
  const json = (value: unknown) => (value === undefined || value === null ? null : JSON.stringify(value));
  await db.query(
    `insert into audit_entry (id, hospital_id, actor_id, "action", subject, subject_id, "before", "after", "reason")
     values ($1, $2, $3, $4, $5, $6, $7, $8, $9)`,
    [
      newId(),
      note.hospitalId,
      note.actorId,
      note.action,
      note.subject,
      note.subjectId ?? null,
      json(note.before),
      json(note.after),
      note.reason ?? null,
    ],
  );
}

export type HistoryLine = { at: Date; by: string | null; action: string; reason: string | null };

export const listHistory = (
  db: EntityManager,
  hospitalId: string,
  subjectId: string,
): Promise<HistoryLine[]> =>
  db.query(
    `select entry."at", person."name" as by, entry."action", entry."reason"
       from audit_entry entry left join person on person.id = entry.actor_id
      where entry.hospital_id = $1 and entry.subject_id = $2
      order by entry."at" desc limit 100`,
    [hospitalId, subjectId],
  );
