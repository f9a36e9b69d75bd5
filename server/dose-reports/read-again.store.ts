import type { EntityManager } from 'typeorm';
import type { ReadAgainCandidate, ReadAgainList } from '../../shared/contract/read-again';
import { IrradiationEvent } from '../procedures/irradiation-event.entity';

/** Nothing that a better reader of DICOM could help; for a query that calls the row `report`. */
export const isHopeless = `report.reason_code in ('empty', 'not-dicom') or report.reason_code like 'archive-%'`;

/**
 * Kept files that may be read again: read by another version of the reader, or held. Where two reports of one identity
 * differ, a person decides; reading does not help.
 */
const candidates = `
  from dose_report report
 where report.hospital_id = $1 and report.original_file_id is not null and report.channel = 'page'
   and report."outcome" in ('stored', 'held', 'refused')
   and coalesce(report.reason_code, '') not like 'sop-instance-%'
   and (report."outcome" = 'held' or report.reader_version is distinct from $2)
   and not coalesce(${isHopeless}, false)`;

export const listCandidates = (
  db: EntityManager,
  hospitalId: string,
  readerVersion: string,
  after: string | null,
  limit: number,
): Promise<ReadAgainCandidate[]> =>
  db.query(
    `select report.id, report.file_name as "fileName", report."outcome", report.reader_version as "readerVersion"
     ${candidates} and ($3::uuid is null or report.id > $3::uuid)
     order by report.id limit $4`,
    [hospitalId, readerVersion, after, limit],
  );

export async function countCandidates(
  db: EntityManager,
  hospitalId: string,
  readerVersion: string,
): Promise<ReadAgainList['counts']> {
  const rows: { outcome: 'stored' | 'held' | 'refused'; count: number }[] = await db.query(
    `select report."outcome", count(*)::int as count ${candidates} group by report."outcome"`,
    [hospitalId, readerVersion],
  );
  const [{ count: withoutBytes }] = await db.query(
    `select count(*)::int as count from dose_report
      where hospital_id = $1 and original_file_id is null and "outcome" in ('stored', 'held', 'refused')`,
    [hospitalId],
  );
  const countOf = (outcome: string) => rows.find((row) => row.outcome === outcome)?.count ?? 0;
  return { stored: countOf('stored'), held: countOf('held'), refused: countOf('refused'), withoutBytes };
}

/** Keys of the procedure's events that another report brought. */
export async function listKeysOfOthers(
  db: EntityManager,
  procedureId: string,
  doseReportId: string,
): Promise<Set<string>> {
  const rows: { key: string }[] = await db.query(
    `select event_key as key from irradiation_event where procedure_id = $1 and dose_report_id is distinct from $2`,
    [procedureId, doseReportId],
  );
  return new Set(rows.map(({ key }) => key));
}

export const listEventsOfReport = (db: EntityManager, doseReportId: string): Promise<IrradiationEvent[]> =>
  db.find(IrradiationEvent, {
    where: { doseReportId },
    order: { startedAt: 'ASC', plane: 'ASC', id: 'ASC' },
  });

/**
 * Takes a report's events away, ready to be written anew. One that the new reading lacks but another stored report of
 * the procedure holds too goes over to that report.
 */
export async function releaseEvents(
  db: EntityManager,
  procedureId: string,
  doseReportId: string,
  keptKeys: string[],
): Promise<void> {
  await db.query(
    `update irradiation_event event set dose_report_id = other.id
       from dose_report other
      where event.procedure_id = $1 and event.dose_report_id = $2 and event.event_key <> all($3::text[])
        and other.procedure_id = $1 and other.id <> $2 and other."outcome" = 'stored'
        and event.event_key = any(other.event_keys)`,
    [procedureId, doseReportId, keptKeys],
  );
  await db.query(`delete from irradiation_event where procedure_id = $1 and dose_report_id = $2`, [
    procedureId,
    doseReportId,
  ]);
}
