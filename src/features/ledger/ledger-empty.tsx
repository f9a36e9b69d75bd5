import { EmptyState } from '../../ui/empty-state';

/** No row: why, and what to do next. */
export const LedgerEmpty = ({ canReceive, isFiltered }: { canReceive: boolean; isFiltered: boolean }) => (
  <EmptyState title="No procedure here">
    {isFiltered ? (
      <p>
        Nothing begins with what you looked for. Clear the search, or widen the period in the sentence above.
      </p>
    ) : (
      <p>
        {canReceive
          ? 'Drop a dose report on this page, or widen the sentence above: a longer period, any type, any room.'
          : 'Widen the sentence above: a longer period, any type, any room. Procedures that name you appear here once their record is complete.'}
      </p>
    )}
  </EmptyState>
);
