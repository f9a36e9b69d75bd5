import { joinClassNames } from '../lib/class-names';
import type { Column, DataTableProps, Sort } from './data-table.types';

type HeadProps<Row> = Pick<DataTableProps<Row>, 'columns' | 'sort' | 'onSort' | 'hasStickyHead'>;

export function DataTableHead<Row>({ columns, sort, onSort, hasStickyHead }: HeadProps<Row>) {
  return (
    <thead role="rowgroup" className="max-md:sr-only">
      <tr role="row">
        {columns.map((column) => (
          <th
            key={column.key}
            role="columnheader"
            scope="col"
            aria-sort={findAriaSort(column, sort)}
            className={joinClassNames(
              'condensed bg-paper px-2 pb-1.5 pt-2 align-bottom text-sm font-semibold shadow-[inset_0_-1px_0_var(--color-ink)] first:pl-0 last:pr-0',
              hasStickyHead && 'sticky top-0 z-10',
              column.align === 'end' && 'text-right',
              column.className,
            )}
          >
            {column.sortKey && onSort ? (
              <SortButton column={column} sort={sort} onSort={onSort} />
            ) : (
              <HeadText column={column} />
            )}
          </th>
        ))}
      </tr>
    </thead>
  );
}

const HeadText = <Row,>({ column }: { column: Column<Row> }) => (
  <>
    {column.head}
    {column.unit && <span className="block font-normal text-ink-2">{column.unit}</span>}
  </>
);

function SortButton<Row>({
  column,
  sort,
  onSort,
}: {
  column: Column<Row>;
  sort: Sort | undefined;
  onSort: (sort: Sort) => void;
}) {
  const key = column.sortKey ?? column.key;
  const isSorted = sort?.key === key;
  const first = column.firstOrder ?? (column.align === 'end' ? 'descending' : 'ascending');
  const opposite = sort?.order === 'ascending' ? 'descending' : 'ascending';
  return (
    <button
      type="button"
      onClick={() => onSort({ key, order: isSorted ? opposite : first })}
      className={joinClassNames(
        'target group relative hover:text-lee',
        isSorted && 'text-lee',
        column.align === 'end' ? 'text-right' : 'text-left',
      )}
    >
      <HeadText column={column} />
      <svg
        viewBox="0 0 10 4"
        width="10"
        height="4"
        aria-hidden="true"
        className={joinClassNames(
          'absolute -bottom-1',
          column.align === 'end' ? 'right-0' : 'left-0',
          isSorted ? 'text-lee' : 'text-transparent group-hover:text-edge group-focus-visible:text-edge',
        )}
      >
        <path
          d={isSorted && sort.order === 'ascending' ? 'M0 4L5 0l5 4z' : 'M0 0l5 4 5-4z'}
          fill="currentColor"
        />
      </svg>
    </button>
  );
}

function findAriaSort<Row>(column: Column<Row>, sort: Sort | undefined) {
  if (!column.sortKey) return undefined;
  return sort?.key === column.sortKey ? sort.order : 'none';
}
