import type { ReportEvent } from '../../shared/contract/report-event';
import type { DoseReportReading } from '../dicom/read-dose-report';

/** What the server asks of the worker that reads large files: to read, then for the events, some at a time. */
export type ReadingQuestion = { bytes: Uint8Array } | 'next events';

/**
 * What the worker answers. A reading comes without its events: taking in thousands of them at once would hold up
 * every other request.
 */
export type ReadingAnswer =
  | { kind: 'ready' }
  | { kind: 'reading'; reading: DoseReportReading; eventCount: number }
  | { kind: 'events'; events: ReportEvent[] };
