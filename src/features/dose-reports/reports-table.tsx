import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import type { DoseReport, DoseReportFilter } from '../../../shared/contract/dose-report';
import { formatInteger } from '../../../shared/units';
import { formatInstant } from '../../lib/clock';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { doseReportQueries } from './queries';
import { ReportDeeds } from './report-deeds';
import { ReportFile } from './report-file';
import { ReportReason } from './report-reason';
import { outcomeWords } from './report-words';

type ReportsTableProps = {
  filter: DoseReportFilter;
  timeZone: string;
  canHandle: boolean;
  canDecide: boolean;
};

const listColumns = (
  timeZone: string,
  canHandle: boolean,
  canDecide: boolean,
  isNamed: boolean,
): Column<DoseReport>[] => [
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
    cell: (report) => <ReportFile report={report} />,
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
    cell: (report) => <ReportReason report={report} timeZone={timeZone} />,
  },
  ...(canHandle
    ? [
        {
          key: 'deeds',
          head: <span className="sr-only">Deeds</span>,
          phone: 'wide',
          cell: (report: DoseReport) => (
            <ReportDeeds report={report} decideIn={canDecide ? timeZone : null} />
          ),
        } as const,
      ]
    : []),
];

/** Every file that ever came, newest first. */
export function ReportsTable({ filter, timeZone, canHandle, canDecide }: ReportsTableProps) {
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = useSuspenseInfiniteQuery(
    doseReportQueries.pages(filter),
  );
  const rows = data.pages.flatMap((page) => page.items);
  const isNamed = rows.some((row) => row.fileName !== undefined);
  return (
    <div>
      <DataTable
        caption="Files that were received"
        columns={listColumns(timeZone, canHandle, canDecide, isNamed)}
        rows={rows}
        rowKey={(row) => row.id}
        empty={
          <EmptyState title="No such file">
            <p>
              Choose another outcome in the sentence above, or clear the search. Dose reports are handed over
              on the page Procedures.
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
