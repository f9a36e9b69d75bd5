import type { EntityManager } from 'typeorm';
import type { Remark } from '../../shared/contract/common';
import type { DoseReport } from '../../shared/contract/dose-report';
import type { Cursor } from '../kernel/cursor';

export type ListedReport = Required<Omit<DoseReport, 'warnings'>> & {
  warnings: Remark[];
  receivedKey: string;
};

type Listing = { outcome: string; cursor: Cursor | null; limit: number };

/** Newest first; one row more than asked for tells whether there is a next page. */
export async function listReports(
  db: EntityManager,
  hospitalId: string,
  { outcome, cursor, limit }: Listing,
): Promise<ListedReport[]> {
  const rows: (Omit<ListedReport, 'receivedAt'> & { receivedAt: Date })[] = await db.query(
    `select report.id, report.received_at as "receivedAt", person."name" as "receivedBy", report.channel,
            report."outcome", report.reason_code as "reasonCode", report.reason_detail as "reasonDetail",
            file.byte_count as "byteCount", report.original_file_id is not null as "hasOriginal",
            report.file_name as "fileName", report.procedure_id as "procedureId",
            report.event_count as "eventCount", report.warnings,
            report.received_at::text as "receivedKey"
       from dose_report report
       left join person on person.id = report.received_by_id
       left join original_file file on file.id = report.original_file_id
      where report.hospital_id = $1
        and ($2 = 'any' or report."outcome" = $2)
        and ($3::timestamptz is null or (report.received_at, report.id) < ($3::timestamptz, $4::uuid))
      order by report.received_at desc, report.id desc
      limit $5`,
    [hospitalId, outcome, cursor?.value ?? null, cursor?.id ?? null, limit + 1],
  );
  return rows.map((row) => ({ ...row, receivedAt: row.receivedAt.toISOString() }));
}

export async function countOutcomes(db: EntityManager, hospitalId: string): Promise<Record<string, number>> {
  const rows: { outcome: string; count: number }[] = await db.query(
    `select "outcome", count(*)::int as count from dose_report where hospital_id = $1 group by "outcome"`,
    [hospitalId],
  );
  return Object.fromEntries(rows.map(({ outcome, count }) => [outcome, count]));
}
