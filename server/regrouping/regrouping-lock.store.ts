import type { EntityManager } from 'typeorm';

/**
 * Reports that arrive share this lock, a regrouping holds it alone: no report is matched to a procedure whose reports
 * are just going elsewhere. Taken before the locks of study, order and procedure.
 */
export async function lockGrouping(
  db: EntityManager,
  hospitalId: string,
  mode: 'arriving' | 'regrouping',
): Promise<void> {
  const lock = mode === 'arriving' ? 'pg_advisory_xact_lock_shared' : 'pg_advisory_xact_lock';
  await db.query(`select ${lock}(hashtextextended($1, 3))`, [`${hospitalId}|grouping`]);
}
