import type { ReactNode } from 'react';

export type SortOrder = 'ascending' | 'descending';
export type Sort = { key: string; order: SortOrder };

export type Column<Row> = {
  key: string;
  /** Head of the column; short, set condensed. */
  head: ReactNode;
  /** Second line of the head. */
  unit?: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Numbers stand at the end. */
  align?: 'start' | 'end';
  /** Given when the column can be sorted. */
  sortKey?: string;
  /** The order that a first press gives; numbers and dates start with the highest. */
  firstOrder?: SortOrder;
  /** On a phone: `title` heads the row, `wide` takes a whole line, `hidden` is left out. */
  phone?: 'title' | 'labelled' | 'wide' | 'hidden';
  /** Extra classes for head and cells: widths. */
  className?: string;
  /** The cell that names the row (row header); by default the column with phone: 'title'. */
  isRowHead?: boolean;
};

export type DataTableProps<Row> = {
  /** Names the table for screen readers; also printed when `isCaptionShown`. */
  caption: ReactNode;
  isCaptionShown?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** Makes the row-head cell a link, and the whole row a wider target for the pointer. */
  rowHref?: (row: Row) => string | null;
  sort?: Sort;
  onSort?: (sort: Sort) => void;
  /** Stands instead of rows. */
  empty?: ReactNode;
  /** Rows that need a stripe of attention at their edge. */
  isMarked?: (row: Row) => boolean;
  footer?: ReactNode;
  /** Where the head sticks; false inside a scrolling box that has its own. */
  hasStickyHead?: boolean;
};
