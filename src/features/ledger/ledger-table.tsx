import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ProcedureFilter, ProcedureFilterInput } from '../../../shared/contract/procedure-row';
import { paths } from '../../paths';
import { DataTable } from '../../ui/data-table';
import { MoreButton } from '../../ui/more-button';
import { ledgerColumns } from './ledger-columns';
import { ledgerQueries } from './queries';

type LedgerTableProps = {
  filter: ProcedureFilter;
  onChange: (change: Partial<ProcedureFilterInput>) => void;
  /** How many the filter finds in all. */
  total: number;
  empty: ReactNode;
};

/** The rows of the ledger, a page at a time. */
export function LedgerTable({ filter, onChange, total, empty }: LedgerTableProps) {
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = useSuspenseInfiniteQuery(
    ledgerQueries.pages(filter),
  );
  const rows = data.pages.flatMap((page) => page.items);
  const sort = { key: filter.sort, order: filter.order };
  return (
    <div>
      <DataTable
        caption="Procedures, each a link to its page"
        columns={ledgerColumns}
        rows={rows}
        rowKey={(row) => row.id}
        rowHref={(row) => paths.procedure(row.id)}
        sort={sort}
        onSort={({ key, order }) => onChange({ sort: key as ProcedureFilter['sort'], order })}
        isMarked={(row) => row.attention?.level === 'act'}
        empty={empty}
      />
      {rows.length > 0 && (
        <MoreButton
          hasMore={hasNextPage}
          isBusy={isFetchingNextPage}
          onMore={() => void fetchNextPage()}
          shownText={`${rows.length} of ${Math.max(total, rows.length)} shown`}
        />
      )}
    </div>
  );
}
