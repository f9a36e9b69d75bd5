import type { EntityManager } from 'typeorm';

/** Work that goes on after the answer, by name, with what it needs to know. */
export type Jobs = {
  'recompute-machine': { hospitalId: string; equipmentId: string; day: string; reason: string };
  'recompute-findings': { hospitalId: string; ruleCode: string };
  'purge-refused': Record<string, never>;
  'settle-received': Record<string, never>;
};

/**
 * Puts work into the queue, in the caller's transaction: it starts only if that is committed. Work of one key that
 * still waits is replaced, so that asking twice does it once.
 */
export async function addJob<Name extends keyof Jobs>(
  db: EntityManager,
  name: Name,
  payload: Jobs[Name],
  key: string,
): Promise<void> {
  await db.query(
    `select graphile_worker.add_job($1, payload := $2::json, job_key := $3, max_attempts := 5, queue_name := $1)`,
    [name, JSON.stringify(payload), key],
  );
}

/** Which of these keys still wait or run. */
export async function listPendingKeys(db: EntityManager, keys: string[]): Promise<Set<string>> {
  const rows: { key: string }[] = await db.query(
    'select key from graphile_worker.jobs where key = any($1) and attempts < max_attempts',
    [keys],
  );
  return new Set(rows.map(({ key }) => key));
}
