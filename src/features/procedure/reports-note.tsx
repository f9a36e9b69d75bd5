import type { ReactNode } from 'react';
import type { Procedure, ProcedureReport } from '../../../shared/contract/procedure';
import { formatDateTime, formatInstant } from '../../lib/clock';
import { MarginNote } from '../../ui/margin-note';
import { describeOrigin, describeStanding } from './report-standing';

type ReportsNoteProps = {
  reports: Procedure['reports'];
  timeZone: string;
  /** Address of the original bytes; null for readers who may not download. */
  originalHref: ((doseReportId: string) => string) | null;
  /** What may be done with them. */
  deeds?: ReactNode;
};

/** The files this procedure was made of, each with what it is worth beside the others and why it is here. */
export const ReportsNote = ({ reports, timeZone, originalHref, deeds }: ReportsNoteProps) => (
  <MarginNote title="Dose reports">
    {reports.length === 0 && <p className="text-sm text-ink-2">None.</p>}
    <ol>
      {reports.map((report, index) => (
        <li key={report.id} className="border-b border-rule py-1.5 text-sm">
          <p>
            {reports.length > 1 && <span className="font-semibold">Report {index + 1}: </span>}
            {describeContent(report)}
          </p>
          <p className={report.standing === 'counts' || report.standing === 'adds' ? '' : 'text-ink-2'}>
            {describeStanding(report, reports)}
          </p>
          <p className="text-ink-2">
            Received {formatInstant(report.receivedAt, timeZone)}
            {reports.length > 1 || report.origin !== 'study' ? `; ${describeOrigin(report)}` : ''}
            {report.isGenerated && '; generated for the demo, no file behind it'}
          </p>
          {report.hasOriginal && originalHref && (
            <a className="link-line" href={originalHref(report.id)} download>
              Download the original
            </a>
          )}
        </li>
      ))}
    </ol>
    {deeds}
  </MarginNote>
);

/** "52 exposures, partial, written 2026-11-24 14:12, Aster F2". */
function describeContent(report: ProcedureReport): string {
  const { eventCount, isManual, isPartial, contentAt, machine } = report;
  const content = isManual
    ? 'typed by hand'
    : !eventCount
      ? 'totals only'
      : `${eventCount} ${eventCount === 1 ? 'exposure' : 'exposures'}`;
  return [content, isPartial && 'partial', contentAt && `written ${formatDateTime(contentAt)}`, machine]
    .filter(Boolean)
    .join(', ');
}
