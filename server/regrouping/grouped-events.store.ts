import type { EntityManager } from 'typeorm';

/** A row of the table of events as JSON, to be put back to the letter. */
export type EventRow = { event_key: string; [column: string]: unknown };

export type EventMove = {
  sourceId: string;
  targetId: string;
  doseReportIds: string[];
  /** Rows that an earlier move took from the target because the other procedure held the same events. */
  keptRows: EventRow[];
};

/** Which rows of the source go along, and which stay because a report that stays holds them too. */
const placed = `
  with going as (select distinct unnest(event_keys) as key from dose_report where id = any($3::uuid[])),
       rest as (select id, event_keys from dose_report
                 where procedure_id = $1 and "outcome" = 'stored' and not id = any($3::uuid[])),
       staying as (select distinct unnest(event_keys) as key from rest),
       placed as (
         select event.id, event.started_at, event.event_key,
                (event.event_key in (select key from going) or event.dose_report_id = any($3::uuid[])
                  or not exists (select 1 from rest)) as is_going,
                event.event_key in (select key from staying) as is_staying,
                exists (select 1 from irradiation_event other
                         where other.procedure_id = $2 and other.event_key = event.event_key) as is_known
           from irradiation_event event where event.procedure_id = $1)`;

/**
 * Takes the events of reports from one procedure to another; called before the reports themselves move. An event that
 * a staying report holds too is copied; one that the target knows already counts there once, and its row is handed
 * back so that the way back can restore it.
 */
export async function moveEvents(
  db: EntityManager,
  { sourceId, targetId, doseReportIds, keptRows }: EventMove,
): Promise<EventRow[]> {
  const parameters = [sourceId, targetId, doseReportIds];
  if (keptRows.length > 0)
    await db.query(
      `insert into irradiation_event
       select kept.* from jsonb_populate_recordset(null::irradiation_event, $1::jsonb) kept
        where exists (select 1 from dose_report report
                       where report.id = any($3::uuid[]) and kept.event_key = any(report.event_keys))
          and not exists (select 1 from irradiation_event known
                           where known.procedure_id = $2 and known.event_key = kept.event_key)`,
      [JSON.stringify(keptRows.map((row) => ({ ...row, procedure_id: targetId }))), targetId, doseReportIds],
    );
  const dropped: [{ row: EventRow }[], number] = await db.query(
    `${placed}
     delete from irradiation_event event using placed
      where event.id = placed.id and event.started_at = placed.started_at
        and is_going and not is_staying and is_known
     returning to_jsonb(event) as row`,
    parameters,
  );
  await db.query(
    `${placed}
     update irradiation_event event set procedure_id = $2 from placed
      where event.id = placed.id and event.started_at = placed.started_at
        and is_going and not is_staying and not is_known`,
    parameters,
  );
  await db.query(
    `${placed}
     insert into irradiation_event
     select copy.* from placed
       join irradiation_event event on event.id = placed.id and event.started_at = placed.started_at
      cross join lateral jsonb_populate_record(null::irradiation_event, to_jsonb(event)
              || jsonb_build_object('id', gen_random_uuid(), 'procedure_id', $2::uuid)) copy
      where is_going and is_staying and not is_known`,
    parameters,
  );
  return dropped[0].map(({ row }) => row);
}

/** Lets every event of a procedure point to a report of that procedure which holds it. */
export async function pointEventsHome(db: EntityManager, procedureIds: string[]): Promise<void> {
  await db.query(
    `with holder as (
       select distinct on (report.procedure_id, key) report.procedure_id, key, report.id
         from dose_report report cross join lateral unnest(report.event_keys) key
        where report.procedure_id = any($1::uuid[]) and report."outcome" = 'stored'
        order by report.procedure_id, key, report.received_at, report.id)
     update irradiation_event event set dose_report_id = holder.id
       from holder, dose_report pointed
      where event.procedure_id = any($1::uuid[]) and holder.procedure_id = event.procedure_id
        and holder.key = event.event_key and pointed.id = event.dose_report_id
        and (pointed.procedure_id is distinct from event.procedure_id or pointed."outcome" <> 'stored')`,
    [procedureIds],
  );
}

/** Takes away the events that only reports hold which are not stored any more; copies are not made. */
export async function dropUnheldEvents(
  db: EntityManager,
  procedureId: string,
  formerIds: string[],
): Promise<void> {
  await db.query(
    `delete from irradiation_event event
      where event.procedure_id = $1
        and (event.dose_report_id = any($2::uuid[]) or event.event_key in (
              select unnest(event_keys) from dose_report where id = any($2::uuid[])))
        and not exists (select 1 from dose_report report
                         where report.procedure_id = $1 and report."outcome" = 'stored'
                           and event.event_key = any(report.event_keys))`,
    [procedureId, formerIds],
  );
}

/** Stands for a procedure's events to the last figure, whichever report and row they stand in. */
export async function checksumOf(db: EntityManager, procedureId: string): Promise<string> {
  const [{ checksum }] = await db.query(
    `select md5(coalesce(string_agg(concat_ws('|', event_key, local_started_at, plane, "type",
              coalesce(kerma_area_product_gy_cm2::text, '-'), coalesce(reference_air_kerma_gy::text, '-'),
              coalesce(irradiation_duration_s::text, '-'), coalesce(exposure_time_s::text, '-'),
              coalesce(kvp_mean::text, '-')), E'\n' order by event_key), '')) as checksum
       from irradiation_event where procedure_id = $1`,
    [procedureId],
  );
  return checksum;
}
