import type { EntityManager } from 'typeorm';

// An open finding is among the reasons for attention, which few rows have: an index leads to them.
const flagged = `procedure.hospital_id = $1 and procedure.attention_level is not null and not procedure.is_withdrawn`;

/** Rule → in how many procedures it found something that nobody settled. */
export async function countOpenFindings(
  db: EntityManager,
  hospitalId: string,
): Promise<ReadonlyMap<string, number>> {
  const rows: { code: string; count: number }[] = await db.query(
    `select reason->>'code' as code, count(distinct procedure.id)::int as count
       from procedure, jsonb_array_elements(procedure.attention_reasons) reason
      where ${flagged} and reason->>'level' = 'note'
      group by 1`,
    [hospitalId],
  );
  return new Map(rows.map(({ code, count }) => [code, count]));
}

/** Procedures in which a rule found something that nobody settled, the newest first. */
export async function listIdsWithOpenFinding(
  db: EntityManager,
  hospitalId: string,
  ruleCode: string,
): Promise<string[]> {
  const rows: { id: string }[] = await db.query(
    `select procedure.id from procedure
      where ${flagged} and procedure.attention_reasons @> $2::jsonb
      order by procedure.started_at desc`,
    [hospitalId, JSON.stringify([{ level: 'note', code: ruleCode }])],
  );
  return rows.map(({ id }) => id);
}
