import { In, type EntityManager } from 'typeorm';
import { DoseReport } from '../dose-reports/dose-report.entity';

export const listGroupedReports = (
  db: EntityManager,
  hospitalId: string,
  ids: string[],
): Promise<DoseReport[]> =>
  ids.length === 0
    ? Promise.resolve([])
    : db.find(DoseReport, {
        where: { hospitalId, id: In(ids), outcome: 'stored' },
        order: { receivedAt: 'ASC' },
      });

/** Puts reports into another procedure, and with them the copies of them that changed nothing. */
export async function moveReportRows(
  db: EntityManager,
  hospitalId: string,
  ids: string[],
  { sourceId, targetId }: { sourceId: string; targetId: string },
): Promise<void> {
  await db.query(
    `update dose_report set procedure_id = $3
      where hospital_id = $1 and procedure_id = $4
        and (id = any($2::uuid[]) or "outcome" = 'duplicate' and sop_instance_uid in (
              select sop_instance_uid from dose_report where id = any($2::uuid[])))`,
    [hospitalId, ids, targetId, sourceId],
  );
}

/** From the first to the last exposure of these reports, as they stand in their procedure; null without any. */
export async function findSpanOfReports(
  db: EntityManager,
  procedureId: string,
  ids: string[],
): Promise<{ startedAt: Date; endedAt: Date } | null> {
  const [span] = await db.query(
    `select min(event.started_at) as "startedAt",
            max(event.started_at + make_interval(secs => coalesce(event.irradiation_duration_s, event.exposure_time_s, 0)))
              as "endedAt"
       from irradiation_event event
      where event.procedure_id = $1 and event.local_started_at is not null
        and (event.dose_report_id = any($2::uuid[]) or event.event_key in (
              select unnest(event_keys) from dose_report where id = any($2::uuid[])))`,
    [procedureId, ids],
  );
  return span?.startedAt ? span : null;
}
