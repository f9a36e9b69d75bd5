import type { z } from 'zod';
import type { DoseReport, DoseReportPage, doseReportFilterSchema } from '../../shared/contract/dose-report';
import { scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { readCursor, writeCursor } from '../kernel/cursor';
import { countOutcomes, listReports, type ListedReport } from './dose-report-list.store';

/** File names, reasons and warnings may carry a patient's name: absent for those who see outcomes only. */
function mask({ receivedKey: _, ...report }: ListedReport, isMasked: boolean): DoseReport {
  if (!isMasked) return report;
  const { id, receivedAt, receivedBy, channel, outcome, reasonCode, byteCount, eventCount } = report;
  return {
    id,
    receivedAt,
    receivedBy,
    channel,
    outcome,
    reasonCode,
    byteCount,
    eventCount,
    hasOriginal: false,
  };
}

export async function listDoseReports(
  db: Db,
  actor: Actor,
  filter: z.output<typeof doseReportFilterSchema>,
): Promise<DoseReportPage> {
  const isMasked = scopeOf(actor, 'dose-report.list') !== 'all';
  const rows = await listReports(db, actor.hospitalId, { ...filter, cursor: readCursor(filter.cursor) });
  const items = rows.slice(0, filter.limit);
  const last = rows.length > filter.limit ? items.at(-1) : undefined;
  return {
    items: items.map((row) => mask(row, isMasked)),
    nextCursor: last ? writeCursor({ value: last.receivedKey, id: last.id }) : null,
    counts: await countOutcomes(db, actor.hospitalId),
  };
}
