import type { EntityManager } from 'typeorm';
import type { ConflictCode } from '../../shared/contract/decide-report';

/** What was decided about the same content of the same identity when it came before; null where nothing was. */
export async function findDecision(
  db: EntityManager,
  hospitalId: string,
  sopInstanceUid: string,
  contentHash: string,
): Promise<Exclude<ConflictCode, 'sop-instance-conflict'> | null> {
  const [row] = await db.query(
    `select reason_code as code from dose_report
      where hospital_id = $1 and sop_instance_uid = $2 and content_hash = $3 and "outcome" = 'held'
        and reason_code in ('sop-instance-declined', 'sop-instance-replaced')
      order by settled_at desc limit 1`,
    [hospitalId, sopInstanceUid, contentHash],
  );
  return row?.code ?? null;
}
