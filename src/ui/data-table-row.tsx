import type { MouseEvent, ReactNode } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { joinClassNames } from '../lib/class-names';
import type { Column } from './data-table.types';

type RowProps<Row> = { row: Row; columns: readonly Column<Row>[]; href: string | null; isMarked: boolean };

export function DataTableRow<Row>({ row, columns, href, isMarked }: RowProps<Row>) {
  const navigate = useNavigate();
  // A wider target for the pointer only; keyboards and screen readers use the link in the row's head.
  const openRow = (event: MouseEvent<HTMLTableRowElement>) => {
    if (!href || event.defaultPrevented || event.button !== 0 || isOwnTarget(event.target)) return;
    if (window.getSelection()?.toString()) return;
    if (event.metaKey || event.ctrlKey) window.open(href, '_blank', 'noopener');
    else void navigate(href);
  };
  return (
    <tr
      role="row"
      onClick={href ? openRow : undefined}
      className={joinClassNames(
        'border-b border-rule max-md:flex max-md:flex-wrap max-md:gap-x-5 max-md:gap-y-1 max-md:py-2.5',
        'has-[a[data-row-link]:focus-visible]:bg-surface',
        href && 'cursor-pointer hover:bg-surface',
        isMarked && 'shadow-[inset_3px_0_0_var(--color-beacon)] max-md:pl-3',
      )}
    >
      {columns.map((column) => {
        const content = column.cell(row);
        return (
          <Cell key={column.key} column={column} isMarked={isMarked} isEmpty={isNothing(content)}>
            {isRowHead(column) && href ? (
              <Link
                to={href}
                data-row-link=""
                className="target inline-block hover:underline hover:underline-offset-3"
              >
                {content}
              </Link>
            ) : (
              content
            )}
          </Cell>
        );
      })}
    </tr>
  );
}

const isNothing = (content: ReactNode): boolean =>
  content === null || content === undefined || content === false || content === '';

const isRowHead = <Row,>(column: Column<Row>): boolean => column.isRowHead ?? column.phone === 'title';

const isOwnTarget = (target: EventTarget): boolean =>
  target instanceof Element && target.closest('a, button, input, select, label, summary, dialog') !== null;

const phoneLooks = {
  title: 'max-md:order-first max-md:basis-full max-md:font-semibold',
  labelled: '',
  wide: 'max-md:basis-full',
  hidden: 'max-md:hidden',
};

function Cell<Row>({
  column,
  isMarked,
  isEmpty,
  children,
}: {
  column: Column<Row>;
  isMarked: boolean;
  /** On a phone a label without a value would only puzzle. */
  isEmpty: boolean;
  children: ReactNode;
}) {
  const Tag = isRowHead(column) ? 'th' : 'td';
  const phone = column.phone ?? 'labelled';
  return (
    <Tag
      role={Tag === 'th' ? 'rowheader' : 'cell'}
      scope={Tag === 'th' ? 'row' : undefined}
      className={joinClassNames(
        'px-2 py-1.5 align-middle font-normal last:pr-0 max-md:block max-md:p-0',
        isMarked ? 'first:pl-3 max-md:first:pl-0' : 'first:pl-0',
        column.align === 'end' && 'md:whitespace-nowrap md:text-right',
        phoneLooks[isEmpty ? 'hidden' : phone],
        column.className,
      )}
    >
      {phone === 'labelled' && (
        <span aria-hidden="true" className="condensed mr-1.5 text-sm text-ink-2 md:hidden">
          {column.head}
        </span>
      )}
      {children}
      {phone === 'labelled' && column.unit && (
        <span className="ml-1 text-sm text-ink-2 md:hidden">{column.unit}</span>
      )}
    </Tag>
  );
}
