import type { CheckRule } from '../../../shared/contract/data-check';
import { formatInstant } from '../../lib/clock';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { describeBounds, ownerNames, severityNames } from './check-words';

type Setting = CheckRule['settings'][number];

/** Every setting of a rule, the newest first. */
export function SettingsTable({ rule, timeZone }: { rule: CheckRule; timeZone: string }) {
  const columns: Column<Setting>[] = [
    { key: 'from', head: 'Holds from', phone: 'title', cell: ({ validFrom }) => validFrom },
    { key: 'severity', head: 'Severity', cell: ({ severity }) => severityNames[severity] },
    { key: 'owner', head: 'For the', cell: ({ owner }) => ownerNames[owner] },
    { key: 'bounds', head: 'Passes', cell: (setting) => describeBounds(setting, rule.unit) },
    { key: 'reason', head: 'Reason', phone: 'wide', cell: ({ reason }) => reason },
    {
      key: 'entered',
      head: 'Set',
      cell: ({ setAt, setBy }) => `${formatInstant(setAt, timeZone)} by ${setBy}`,
    },
  ];
  return (
    <DataTable
      caption="Settings of this rule"
      columns={columns}
      rows={rule.settings}
      rowKey={({ id }) => id}
      hasStickyHead={false}
      empty={<EmptyState title="Never set here.">The rule is applied as it was delivered.</EmptyState>}
    />
  );
}
