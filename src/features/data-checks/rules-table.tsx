import type { CheckRule } from '../../../shared/contract/data-check';
import { formatInteger } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { describeBounds, ownerNames, severityNames } from './check-words';

const columns: Column<CheckRule>[] = [
  {
    key: 'name',
    head: 'Rule',
    phone: 'title',
    cell: ({ name, settings }) => (
      <>
        {name}
        {settings.length > 0 && (
          <span className="block text-sm font-normal text-ink-2">set by the department</span>
        )}
      </>
    ),
  },
  {
    key: 'looks-at',
    head: 'Looks at',
    phone: 'wide',
    cell: ({ looksAt }) => <span className="text-sm text-ink-2">{looksAt}</span>,
  },
  {
    key: 'bounds',
    head: 'Passes',
    cell: ({ inForce, unit }) => <span className="whitespace-nowrap">{describeBounds(inForce, unit)}</span>,
  },
  {
    key: 'severity',
    head: 'Severity',
    cell: ({ inForce: { severity } }) => (
      <span className={severity === 'hard' ? 'font-semibold' : undefined}>{severityNames[severity]}</span>
    ),
  },
  { key: 'owner', head: 'For the', cell: ({ inForce }) => ownerNames[inForce.owner] },
  {
    key: 'open',
    head: 'Open',
    unit: 'procedures',
    align: 'end',
    cell: ({ openCount }) => formatInteger(openCount),
  },
];

type RulesTableProps = { rules: readonly CheckRule[]; hrefOf: (code: string) => string };

/** Every rule with what holds today and how many procedures wait because of it. */
export const RulesTable = ({ rules, hrefOf }: RulesTableProps) => (
  <DataTable
    caption="Rules of the data checks"
    columns={columns}
    rows={rules}
    rowKey={({ code }) => code}
    rowHref={({ code }) => hrefOf(code)}
  />
);
