import type { EntityManager } from 'typeorm';

/** Procedures that hold a report of a machine, from a day in the hospital's zone on; the newest first. */
export async function listIdsOfEquipmentSince(
  db: EntityManager,
  hospitalId: string,
  equipmentId: string,
  day: string,
): Promise<string[]> {
  const rows: { id: string }[] = await db.query(
    `select procedure.id from procedure
      where procedure.hospital_id = $1 and procedure.local_date >= $3
        and exists (select 1 from dose_report report
                     where report.procedure_id = procedure.id and report.equipment_id = $2)
      order by procedure.started_at desc`,
    [hospitalId, equipmentId, day],
  );
  return rows.map(({ id }) => id);
}
