import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import { timeMedianMs } from './measure';
import { writeNewReport } from './written-report';

/** A report that our reader and other programs read in the same run. */
export interface ComparedReport {
  eventCount: number;
  bytes: Uint8Array;
  path: string;
}

const reports = new Map<number, ComparedReport>();
let folder: string | null = null;

/** The report of so many events: the same one for every figure of a run. Its file goes when the run ends. */
export function comparedReport(eventCount: number): ComparedReport {
  const known = reports.get(eventCount);
  if (known) return known;
  if (folder === null) {
    const made = mkdtempSync(join(tmpdir(), 'compared-reports-'));
    process.on('exit', () => rmSync(made, { recursive: true, force: true }));
    folder = made;
  }
  const bytes = writeNewReport(eventCount);
  const path = join(folder, `${eventCount}-events.dcm`);
  writeFileSync(path, bytes);
  const report = { eventCount, bytes, path };
  reports.set(eventCount, report);
  return report;
}

/** Reads once more; throws unless every event was found. */
export function readCompared({ bytes, eventCount }: Pick<ComparedReport, 'bytes' | 'eventCount'>): void {
  const reading = readDoseReport(bytes);
  if (reading.outcome !== 'read' || reading.report.events.length !== eventCount) throw new Error('Not read.');
}

/** How many times a large report is measured takes long enough; a small one is measured more often. */
export const countFor = (eventCount: number, ofSmall: number): number =>
  eventCount > 1000 ? Math.ceil(ofSmall / 3) : ofSmall;

/** Milliseconds from bytes to canonical report, median. */
export const timeReadingMs = (report: ComparedReport): Promise<number> =>
  timeMedianMs(countFor(report.eventCount, 15), () => readCompared(report), { warmUps: 3 });
