import type { Procedure } from '../../../shared/contract/procedure';
import { formatInstant } from '../../lib/clock';
import { MarginNote } from '../../ui/margin-note';

type ReportsNoteProps = {
  reports: Procedure['reports'];
  timeZone: string;
  /** Address of the original bytes; null for readers who may not download. */
  originalHref: ((doseReportId: string) => string) | null;
};

/** The files this procedure was made of; the newest whole one gives the totals. */
export const ReportsNote = ({ reports, timeZone, originalHref }: ReportsNoteProps) => (
  <MarginNote title="Dose reports">
    {reports.length === 0 && <p className="text-sm text-ink-2">None.</p>}
    <ul>
      {reports.map((report) => (
        <li key={report.id} className="border-b border-rule py-1.5 text-sm">
          {report.isManual ? 'Entered by hand' : 'Received'} {formatInstant(report.receivedAt, timeZone)}
          <span className="block text-ink-2">
            {report.counts ? 'its totals count' : 'superseded: its totals do not count'}
            {report.isGenerated && '; generated for the demo, no file behind it'}
          </span>
          {report.hasOriginal && originalHref && (
            <a className="link-line" href={originalHref(report.id)} download>
              Download the original
            </a>
          )}
        </li>
      ))}
    </ul>
  </MarginNote>
);
