import type { z } from 'zod';
import type { DoseReport, DoseReportPage, doseReportFilterSchema } from '../../shared/contract/dose-report';
import { scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { readCursor, writeCursor } from '../kernel/cursor';
import { findArchive } from './archive.store';
import { countOutcomes, listReports, type ListedReport } from './dose-report-list.store';

/** File names, reasons and warnings may carry a patient's name: absent for those who see outcomes only. */
function mask({ receivedKey: _, ...report }: ListedReport, isMasked: boolean): DoseReport {
  if (!isMasked) return report;
  const { id, receivedAt, receivedBy, channel, outcome, reasonCode, byteCount, eventCount } = report;
  const { keptUntil, purgedAt } = report;
  return {
    id,
    receivedAt,
    receivedBy,
    channel,
    outcome,
    reasonCode,
    byteCount,
    eventCount,
    keptUntil,
    purgedAt,
    hasOriginal: false,
    canReadAgain: false,
  };
}

export async function listDoseReports(
  db: Db,
  actor: Actor,
  filter: z.output<typeof doseReportFilterSchema>,
  refusedKeepDays: number,
): Promise<DoseReportPage> {
  const { hospitalId } = actor;
  const isMasked = scopeOf(actor, 'dose-report.list') !== 'all';
  // Whoever sees no names cannot find out by guessing them either.
  const selection = { text: isMasked ? '' : filter.text, archive: filter.archive };
  const rows = await listReports(db, hospitalId, {
    ...selection,
    outcome: filter.outcome,
    limit: filter.limit,
    cursor: readCursor(filter.cursor),
    refusedKeepDays,
  });
  const items = rows.slice(0, filter.limit);
  const last = rows.length > filter.limit ? items.at(-1) : undefined;
  const archive = filter.archive && !isMasked ? await findArchive(db, hospitalId, filter.archive) : null;
  return {
    items: items.map((row) => mask(row, isMasked)),
    nextCursor: last ? writeCursor({ value: last.receivedKey, id: last.id }) : null,
    counts: await countOutcomes(db, hospitalId, selection),
    refusedKeepDays,
    ...(archive && { archiveName: archive.fileName }),
  };
}
