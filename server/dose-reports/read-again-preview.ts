import type { ReadAgainPreview, ReadingSummary, ValueChange } from '../../shared/contract/read-again';
import { sentenceOfReason } from '../../shared/contract/outcome';
import type { Report } from '../../shared/contract/report';
import type { Db } from '../db/db';
import type { DoseReportReading } from '../dicom/read-dose-report';
import { readerVersion } from '../dicom/reader-version';
import { findHospital } from '../hospital/hospital.store';
import { Problem } from '../kernel/problem';
import type { NewEvent } from '../procedures/irradiation-event.store';
import { findProcedure } from '../procedures/procedure.store';
import { compareReadings } from './compare-readings';
import type { DoseReport } from './dose-report.entity';
import { findDoseReport, findInstance, readOriginal } from './dose-report.store';
import { toEventRows } from './event-rows';
import { contextOf } from './import-dose-report';
import { readInBounds } from './read-in-bounds';
import { reasonInWords } from './reason-in-words';
import { listEventsOfReport, listKeysOfOthers } from './read-again.store';

/** So many changed values are named; the rest is counted. */
const namedChanges = 5;

export type ReadReading = Extract<DoseReportReading, { outcome: 'read' }>;

/** What reading a kept file now gives beside what is stored, all of it: the preview shows a part. */
export type SecondReading = {
  report: DoseReport;
  bytes: Buffer | null;
  read: DoseReportReading | null;
  /** Events as the new reading has them, without those that another report brought. */
  events: NewEvent[];
  changes: ValueChange[];
};

const sum = (
  planes: Report['planes'],
  field: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy' | 'fluoroscopyTimeS',
) => {
  const all = planes.find(({ plane }) => plane === 'all')?.[field];
  const values = planes.flatMap((plane) => (plane.plane === 'all' ? [] : (plane[field] ?? [])));
  return all ?? (values.length === 0 ? null : values.reduce((total, value) => total + value, 0));
};

const totalsOf = (planes: Report['planes']) => ({
  kermaAreaProductGyCm2: sum(planes, 'kermaAreaProductGyCm2'),
  referenceAirKermaGy: sum(planes, 'referenceAirKermaGy'),
  fluoroscopyTimeS: sum(planes, 'fluoroscopyTimeS'),
});

export const summaryOfStored = (report: DoseReport): ReadingSummary => ({
  outcome: report.outcome,
  reasonCode: report.reasonCode,
  readerVersion: report.readerVersion,
  eventCount: report.eventCount,
  ...totalsOf(report.reportedPlanes),
});

export const summaryOfRead = ({ report }: ReadReading): ReadingSummary => ({
  outcome: 'stored',
  reasonCode: null,
  readerVersion,
  eventCount: report.events.length,
  ...totalsOf(report.planes),
});

/** Reads the kept bytes and compares; changes nothing. */
export async function readSecondTime(db: Db, hospitalId: string, id: string): Promise<SecondReading> {
  const report = await findDoseReport(db, hospitalId, id);
  if (!report) throw new Problem('not-found');
  const bytes = report.originalFileId ? await readOriginal(db, hospitalId, report.originalFileId) : null;
  if (!bytes) return { report, bytes, read: null, events: [], changes: [] };
  const read = await readInBounds(bytes);
  if (read.outcome !== 'read' || report.outcome !== 'stored')
    return { report, bytes, read, events: [], changes: [] };
  return { report, bytes, read, ...(await compareWithStored(db, report, read)) };
}

/** The stored values of a report beside those of a new reading. */
export async function compareWithStored(
  db: Db,
  report: DoseReport,
  read: ReadReading,
): Promise<Pick<SecondReading, 'events' | 'changes'> & { eventKeys: string[] }> {
  const hospital = await findHospital(db, report.hospitalId);
  const procedure = report.procedureId && (await findProcedure(db, report.hospitalId, report.procedureId));
  if (!procedure) throw new Problem('not-found', 'The procedure of this report is not there any more.');
  const stored = await listEventsOfReport(db, report.id);
  const times = new Map(stored.map((event) => [event.eventKey, event.startedAt]));
  const ofOthers = await listKeysOfOthers(db, procedure.id, report.id);
  const all = await toEventRows(read.report, report.id, hospital.timeZone, procedure.startedAt);
  const events = all
    .filter(({ eventKey }) => !ofOthers.has(eventKey))
    // An event without a time of its own keeps the one it was given when it came.
    .map((event) =>
      event.startedAt === procedure.startedAt
        ? { ...event, startedAt: times.get(event.eventKey) ?? event.startedAt }
        : event,
    );
  const changes = compareReadings(
    {
      context: report.context,
      planes: report.reportedPlanes,
      warnings: report.warnings,
      events: stored.map(({ procedureId: _, ...event }) => event),
    },
    { context: contextOf(read.report), planes: read.report.planes, warnings: read.warnings, events },
  );
  return { events, changes, eventKeys: all.map(({ eventKey }) => eventKey) };
}

/** What would change if a kept file were read by the reader of today. */
export async function previewReadAgain(db: Db, hospitalId: string, id: string): Promise<ReadAgainPreview> {
  const second = await readSecondTime(db, hospitalId, id);
  const { report, bytes, read, changes } = second;
  const before = summaryOfStored(report);
  const base = {
    doseReportId: id,
    fileName: report.fileName,
    before,
    changedCount: 0,
    changes: [],
    reason: null,
  };
  if (!bytes || !read) return { ...base, verdict: 'not-kept', after: null };
  if (read.outcome !== 'read') {
    const { code, detail } = read.reason;
    const after = { ...before, outcome: read.outcome, reasonCode: code, readerVersion };
    const verdict = report.outcome === 'stored' ? 'fails' : 'still-unread';
    return { ...base, verdict, after, reason: reasonInWords(code, detail, bytes) };
  }
  if (report.outcome === 'duplicate') return { ...base, verdict: 'same', after: before };
  const after = summaryOfRead(read);
  if (report.outcome === 'stored')
    return {
      ...base,
      verdict: changes.length === 0 ? 'same' : 'changes',
      after,
      changedCount: changes.length,
      changes: changes.slice(0, namedChanges),
    };
  return { ...base, ...(await foresee(db, report, read)) };
}

/** A file that gave no report before and gives one now meets what is stored already. */
async function foresee(
  db: Db,
  report: DoseReport,
  read: ReadReading,
): Promise<Pick<ReadAgainPreview, 'verdict' | 'after' | 'reason'>> {
  const after = summaryOfRead(read);
  const uid = read.report.sopInstanceUid;
  const stored = uid ? await findInstance(db, report.hospitalId, uid) : null;
  if (!stored || stored.id === report.id) return { verdict: 'becomes-readable', after, reason: null };
  if (stored.contentHash === read.contentHash)
    return { verdict: 'becomes-readable', after: { ...after, outcome: 'duplicate' }, reason: null };
  const reasonCode = 'sop-instance-conflict';
  return {
    verdict: 'still-unread',
    after: { ...after, outcome: 'held', reasonCode },
    reason: sentenceOfReason(reasonCode),
  };
}
