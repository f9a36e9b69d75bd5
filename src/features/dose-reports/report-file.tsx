import { Link } from 'react-router-dom';
import type { DoseReport } from '../../../shared/contract/dose-report';
import { formatInteger } from '../../../shared/units';

/** Path from the folder down to the name, which alone stands out. */
function FileName({ path }: { path: string }) {
  const at = path.lastIndexOf('/') + 1;
  return (
    <>
      {at > 0 && <span className="font-normal text-ink-2">{path.slice(0, at)}</span>}
      {path.slice(at)}
    </>
  );
}

const sizeOf = (byteCount: number) =>
  byteCount < 1_048_576
    ? `${formatInteger(Math.max(1, Math.round(byteCount / 1024)))} kB`
    : `${(byteCount / 1_048_576).toFixed(1)} MB`;

/** A file's name, the archive that it came in, and its size; that it has no bytes, where it never had any. */
export const ReportFile = ({ report }: { report: DoseReport }) => (
  <span className="wrap-anywhere">
    {report.fileName === undefined ? `File ${report.id.slice(-6)}` : <FileName path={report.fileName} />}
    <span className="block text-sm font-normal text-ink-2">
      {report.archiveId && report.archiveName && (
        <>
          in{' '}
          <Link to={`?archive=${report.archiveId}`} className="link-line">
            {report.archiveName}
          </Link>
          {report.byteCount !== null && ', '}
        </>
      )}
      {report.channel === 'generated' && 'generated, no original'}
      {report.channel === 'manual' && 'entered by hand, no original'}
      {report.channel === 'page' && report.byteCount !== null && sizeOf(report.byteCount)}
    </span>
  </span>
);
