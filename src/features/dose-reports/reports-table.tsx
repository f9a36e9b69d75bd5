import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import type { DoseReport, DoseReportFilter } from '../../../shared/contract/dose-report';
import { formatInteger } from '../../../shared/units';
import { formatInstant } from '../../lib/clock';
import { paths } from '../../paths';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { TextLink } from '../../ui/text-link';
import { doseReportQueries } from './queries';
import { ReportDeeds } from './report-deeds';
import { outcomeWords } from './report-words';

type ReportsTableProps = { filter: DoseReportFilter; timeZone: string; canHandle: boolean };

const listColumns = (timeZone: string, canHandle: boolean, isNamed: boolean): Column<DoseReport>[] => [
  {
    key: 'received',
    head: 'Received',
    cell: (report) => <span className="whitespace-nowrap">{formatInstant(report.receivedAt, timeZone)}</span>,
  },
  {
    key: 'file',
    head: 'File',
    phone: 'title',
    className: 'md:min-w-44',
    cell: (report) => (
      <span className="wrap-anywhere">
        {report.fileName ?? `File ${report.id.slice(-6)}`}
        {report.channel === 'generated' && (
          <span className="block text-sm font-normal text-ink-2">generated, no original</span>
        )}
      </span>
    ),
  },
  { key: 'by', head: 'From', cell: (report) => report.receivedBy ?? <span className="text-ink-2">–</span> },
  {
    key: 'outcome',
    head: 'Outcome',
    cell: ({ outcome }) => (
      <span className={outcome === 'held' || outcome === 'refused' ? 'font-semibold text-beacon' : undefined}>
        {outcomeWords[outcome]}
      </span>
    ),
  },
  { key: 'events', head: 'Events', align: 'end', cell: (report) => formatInteger(report.eventCount) },
  {
    key: 'reason',
    head: isNamed ? 'Reason and warnings' : 'Reason',
    phone: 'wide',
    className: 'md:min-w-72',
    cell: (report) => <Reason report={report} />,
  },
  ...(canHandle
    ? [
        {
          key: 'deeds',
          head: <span className="sr-only">Deeds</span>,
          phone: 'wide',
          cell: (report: DoseReport) => <ReportDeeds report={report} />,
        } as const,
      ]
    : []),
];

function Reason({
  report: { reasonDetail, reasonCode, warnings = [], procedureId },
}: {
  report: DoseReport;
}) {
  return (
    <div className="flex flex-col gap-1 text-sm">
      {(reasonDetail ?? reasonCode) && <p>{reasonDetail ?? reasonCode}</p>}
      {procedureId && (
        <TextLink to={paths.procedure(procedureId)} className="self-start">
          Open the procedure
        </TextLink>
      )}
      {warnings.length > 0 && (
        <details>
          <summary className="cursor-pointer text-ink-2">
            {warnings.length === 1 ? '1 warning of the reader' : `${warnings.length} warnings of the reader`}
          </summary>
          <ul className="ml-4 list-disc text-ink-2">
            {warnings.map((warning, index) => (
              <li key={index}>{warning.detail}</li>
            ))}
          </ul>
        </details>
      )}
    </div>
  );
}

/** Every file that ever came, newest first. */
export function ReportsTable({ filter, timeZone, canHandle }: ReportsTableProps) {
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = useSuspenseInfiniteQuery(
    doseReportQueries.pages(filter),
  );
  const rows = data.pages.flatMap((page) => page.items);
  const isNamed = rows.some((row) => row.fileName !== undefined);
  return (
    <div>
      <DataTable
        caption="Files that were received"
        columns={listColumns(timeZone, canHandle, isNamed)}
        rows={rows}
        rowKey={(row) => row.id}
        empty={
          <EmptyState title="No such file">
            <p>
              Choose another outcome in the sentence above. Dose reports are handed over on the page
              Procedures.
            </p>
          </EmptyState>
        }
      />
      {rows.length > 0 && (
        <MoreButton
          hasMore={hasNextPage}
          isBusy={isFetchingNextPage}
          onMore={() => void fetchNextPage()}
          shownText={`${formatInteger(rows.length)} shown`}
        />
      )}
    </div>
  );
}
