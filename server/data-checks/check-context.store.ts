import type { EntityManager } from 'typeorm';
import type { PlaneTotals } from '../../shared/contract/procedure';
import type { Procedure } from '../procedures/procedure.entity';
import type { CheckContext, DisplayedTotals } from './check-context';
import { sumDisplayed } from './sum-displayed';

type Subject = Pick<Procedure, 'id' | 'hospitalId' | 'procedureTypeId' | 'startedAt'>;

/** So many of a type, the newest before it, tell what is usual; the index ends the search there. */
const newestOfType = 200;

async function findTypeFieldArea(
  db: EntityManager,
  subject: Subject,
): Promise<CheckContext['typeFieldArea']> {
  if (subject.procedureTypeId === null) return null;
  const [row] = await db.query(
    `select percentile_cont(0.5) within group (order by area_cm2) as "medianCm2", count(*)::int as count
       from (select displayed_kerma_area_product_gy_cm2 / displayed_reference_air_kerma_gy as area_cm2
               from procedure
              where procedure_type_id = $1 and hospital_id = $2 and id <> $3 and started_at <= $4
                and not is_withdrawn and not is_quarantined
                and procedure_class = 'clinical' and device_class = 'fluoroscopy'
                and displayed_kerma_area_product_gy_cm2 > 0 and displayed_reference_air_kerma_gy > 0
              order by started_at desc limit ${newestOfType}) newest`,
    [subject.procedureTypeId, subject.hospitalId, subject.id, subject.startedAt],
  );
  return row.count === 0 ? null : row;
}

/** What a machine displayed at its procedure before, no more than a week earlier. */
async function findPreviousTotals(
  db: EntityManager,
  subject: Subject,
  equipmentId: string,
): Promise<DisplayedTotals | null> {
  const [row]: { planes: PlaneTotals[] }[] = await db.query(
    `select planes from procedure
      where equipment_id = $1 and hospital_id = $2 and id <> $3 and not is_withdrawn
        and started_at < $4 and started_at > $4::timestamptz - interval '7 days'
      order by started_at desc limit 1`,
    [equipmentId, subject.hospitalId, subject.id, subject.startedAt],
  );
  return row ? sumDisplayed(row.planes.filter((plane) => plane.equipmentId === equipmentId)) : null;
}

async function findSharedEvents(db: EntityManager, subject: Subject): Promise<CheckContext['sharedEvents']> {
  const rows: { caseNumber: string; count: number }[] = await db.query(
    `select other.case_number as "caseNumber", count(*)::int as count
       from irradiation_event event
       join irradiation_event twin
         on twin.irradiation_event_uid = event.irradiation_event_uid and twin.procedure_id <> event.procedure_id
        and twin.plane is not distinct from event.plane
       join procedure other on other.id = twin.procedure_id
      where event.procedure_id = $1 and other.hospital_id = $2 and not other.is_withdrawn
      group by other.case_number order by other.case_number limit 5`,
    [subject.id, subject.hospitalId],
  );
  return {
    count: Math.max(0, ...rows.map(({ count }) => count)),
    caseNumbers: rows.map(({ caseNumber }) => caseNumber),
  };
}

/** What the hospital's other procedures say about one. */
export async function findCheckContext(
  db: EntityManager,
  subject: Subject,
  equipmentIds: readonly string[],
): Promise<CheckContext> {
  const previousTotals = new Map<string, DisplayedTotals>();
  for (const equipmentId of equipmentIds) {
    const previous = await findPreviousTotals(db, subject, equipmentId);
    if (previous) previousTotals.set(equipmentId, previous);
  }
  return {
    typeFieldArea: await findTypeFieldArea(db, subject),
    previousTotals,
    sharedEvents: await findSharedEvents(db, subject),
  };
}
