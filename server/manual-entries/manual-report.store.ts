import type { EntityManager } from 'typeorm';
import type { ReportPlane } from '../../shared/contract/report';
import { DoseReport } from '../dose-reports/dose-report.entity';
import { newId } from '../kernel/new-id';

/** What the warning says of every entry: no exposure was told. */
const noEvents = {
  code: 'events-missing',
  detail: 'Typed from the machine’s screen: totals without exposures',
};

export type TypedReport = {
  hospitalId: string;
  key: string;
  contentHash: string;
  procedureId: string;
  equipmentId: string | null;
  reportedPlanes: ReportPlane[];
  typedById: string;
  now: Date;
};

/** The report that an entry stands for: totals without events and without a file. */
export async function addTypedReport(db: EntityManager, report: TypedReport): Promise<string> {
  const { key, typedById, now, ...fields } = report;
  const id = newId();
  await db.insert(DoseReport, {
    ...fields,
    id,
    fileName: 'entered by hand',
    channel: 'manual',
    uploadKey: key,
    receivedById: typedById,
    receivedAt: now,
    outcome: 'stored',
    settledAt: now,
    sopInstanceUid: `manual:${id}`,
    eventCount: 0,
    eventKeys: [],
    warnings: [noEvents],
  });
  return id;
}

/** The report of an earlier request with the same key; serialises requests that carry it. */
export async function findByKey(
  db: EntityManager,
  hospitalId: string,
  key: string,
): Promise<DoseReport | null> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 2))', [`${hospitalId}|${key}`]);
  return db.findOneBy(DoseReport, { hospitalId, uploadKey: key });
}

export async function changeTypedReport(
  db: EntityManager,
  id: string,
  changes: Pick<TypedReport, 'contentHash' | 'equipmentId' | 'reportedPlanes'>,
): Promise<void> {
  await db.update(DoseReport, { id }, changes as object);
}
