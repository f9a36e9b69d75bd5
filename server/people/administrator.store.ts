import type { EntityManager } from 'typeorm';

/**
 * Who can administer the hospital today: active, with the role and a chosen password. The rows stay locked
 * to the end of the transaction, so that two administrators cannot remove each other at the same moment.
 */
export async function lockAdministrators(db: EntityManager, hospitalId: string): Promise<string[]> {
  const rows: { id: string }[] = await db.query(
    `select person.id
       from person join account on account.person_id = person.id
      where person.hospital_id = $1 and person.is_active and account.password_hash is not null
        and 'administrator' = any(account.roles)
      order by person.id
        for update`,
    [hospitalId],
  );
  return rows.map((row) => row.id);
}
