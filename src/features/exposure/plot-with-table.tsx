import { useState } from 'react';
import { DataTable } from '../../ui/data-table';
import { LinePlot } from './line-plot';
import type { ComponentProps } from 'react';

type PlotWithTableProps = ComponentProps<typeof LinePlot> & {
  /** Where the table reads the curves. */
  rowsAt: readonly number[];
  valueAt: (line: number, x: number) => string;
  rowHead: string;
  unit?: string;
};

/** Curves, and the same figures as a table. */
export function PlotWithTable({ rowsAt, valueAt, rowHead, unit, ...plot }: PlotWithTableProps) {
  const [isTable, setIsTable] = useState(false);
  return (
    <div className="flex flex-col gap-2">
      {isTable ? (
        <DataTable
          caption={plot.label}
          rows={rowsAt}
          rowKey={String}
          hasStickyHead={false}
          columns={[
            { key: 'x', head: rowHead, phone: 'title' as const, cell: (at: number) => plot.x.format(at) },
            ...plot.lines.map(({ name }, line) => ({
              key: name,
              head: name,
              unit,
              align: 'end' as const,
              cell: (at: number) => valueAt(line, at),
            })),
          ]}
        />
      ) : (
        <LinePlot {...plot} />
      )}
      <button
        type="button"
        className="link-line target self-start text-sm"
        onClick={() => setIsTable(!isTable)}
      >
        {isTable ? 'As curves' : 'As a table'}
      </button>
    </div>
  );
}
