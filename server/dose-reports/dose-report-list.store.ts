import type { EntityManager } from 'typeorm';
import type { Remark } from '../../shared/contract/common';
import type { DoseReport } from '../../shared/contract/dose-report';
import type { Cursor } from '../kernel/cursor';
import { isHopeless } from './read-again.store';

export type ListedReport = Required<Omit<DoseReport, 'warnings'>> & {
  warnings: Remark[];
  receivedKey: string;
};

/** What narrows the list and its counts alike. */
export type ReportSelection = { text: string; archive: string };

type Listing = ReportSelection & {
  outcome: string;
  cursor: Cursor | null;
  limit: number;
  refusedKeepDays: number;
};

/** Any part of a name, with the letters that LIKE would take for wildcards meant as they are. */
const toPattern = (text: string) => (text === '' ? null : `%${text.replace(/[\\%_]/g, '\\$&')}%`);
const toId = (id: string) => (id === '' ? null : id);

const selected = `report.hospital_id = $1
        and ($2::text is null or report.file_name ilike $2 or report.archive_name ilike $2)
        and ($3::uuid is null or report.archive_id = $3)`;

/** Newest first; one row more than asked for tells whether there is a next page. */
export async function listReports(
  db: EntityManager,
  hospitalId: string,
  { text, archive, outcome, cursor, limit, refusedKeepDays }: Listing,
): Promise<ListedReport[]> {
  const rows: (Omit<ListedReport, 'receivedAt' | 'keptUntil' | 'purgedAt'> & {
    receivedAt: Date;
    keptUntil: Date | null;
    purgedAt: Date | null;
  })[] = await db.query(
    `select report.id, report.received_at as "receivedAt", person."name" as "receivedBy", report.channel,
            report."outcome", report.reason_code as "reasonCode", report.reason_detail as "reasonDetail",
            file.byte_count as "byteCount", report.file_name as "fileName", report.procedure_id as "procedureId",
            report.archive_id as "archiveId", report.archive_name as "archiveName",
            report.original_file_id is not null and not coalesce(${isHopeless}, false) as "canReadAgain", held."inArchive" or report.original_file_id is not null as "hasOriginal",
            case when $8 > 0 and report."outcome" = 'refused' and (report.original_file_id is not null or held."inArchive")
              then report.settled_at + make_interval(days => $8) end as "keptUntil",
            report.purged_at as "purgedAt",
            report.event_count as "eventCount", report.warnings,
            report.received_at::text as "receivedKey"
       from dose_report report
       left join person on person.id = report.received_by_id
       left join original_file file on file.id = report.original_file_id
       left join received_archive archive on archive.id = report.archive_id
       cross join lateral (select report."outcome" = 'refused' and archive.id is not null and archive.purged_at is null
                             and report.original_file_id is null and report.purged_at is null as "inArchive") held
      where ${selected}
        and ($4 = 'any' or report."outcome" = $4)
        and ($5::timestamptz is null or (report.received_at, report.id) < ($5::timestamptz, $6::uuid))
      order by report.received_at desc, report.id desc
      limit $7`,
    [
      hospitalId,
      toPattern(text),
      toId(archive),
      outcome,
      cursor?.value ?? null,
      cursor?.id ?? null,
      limit + 1,
      refusedKeepDays,
    ],
  );
  return rows.map((row) => ({
    ...row,
    receivedAt: row.receivedAt.toISOString(),
    keptUntil: row.keptUntil?.toISOString() ?? null,
    purgedAt: row.purgedAt?.toISOString() ?? null,
  }));
}

export async function countOutcomes(
  db: EntityManager,
  hospitalId: string,
  { text, archive }: ReportSelection,
): Promise<Record<string, number>> {
  const rows: { outcome: string; count: number }[] = await db.query(
    `select report."outcome", count(*)::int as count from dose_report report where ${selected} group by report."outcome"`,
    [hospitalId, toPattern(text), toId(archive)],
  );
  return Object.fromEntries(rows.map(({ outcome, count }) => [outcome, count]));
}
