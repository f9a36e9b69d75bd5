import { joinClassNames } from '../lib/class-names';
import { DataTableHead } from './data-table-head';
import { DataTableRow } from './data-table-row';
import type { DataTableProps } from './data-table.types';
import { moveAlongRows } from './row-keys';

/**
 * A dense table: right-aligned figures, units in the head, sortable columns. Row links are walked with
 * the arrow keys, Home and End. Below 768 px every row folds into labelled lines; explicit roles keep the
 * table's meaning, which `display: block` would take away.
 */
export function DataTable<Row>({
  caption,
  isCaptionShown,
  columns,
  rows,
  rowKey,
  rowHref,
  sort,
  onSort,
  empty,
  isMarked,
  footer,
  hasStickyHead = true,
}: DataTableProps<Row>) {
  if (rows.length === 0 && empty) return <>{empty}</>;
  return (
    <table role="table" className="w-full border-collapse text-left max-md:block">
      <caption className={isCaptionShown ? 'pb-2 text-left text-sm text-ink-2 max-md:block' : 'sr-only'}>
        {caption}
      </caption>
      <DataTableHead {...{ columns, sort, onSort, hasStickyHead }} />
      <tbody role="rowgroup" className="max-md:block" onKeyDown={moveAlongRows}>
        {rows.map((row) => (
          <DataTableRow
            key={rowKey(row)}
            row={row}
            columns={columns}
            href={rowHref?.(row) ?? null}
            isMarked={isMarked?.(row) ?? false}
          />
        ))}
      </tbody>
      {footer && (
        <tfoot role="rowgroup" className="max-md:block">
          <tr role="row" className="max-md:block">
            <td
              role="cell"
              colSpan={columns.length}
              className={joinClassNames('pt-2 text-sm text-ink-2', 'max-md:block')}
            >
              {footer}
            </td>
          </tr>
        </tfoot>
      )}
    </table>
  );
}
