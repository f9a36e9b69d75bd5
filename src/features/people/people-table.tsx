import { jobNames, type Person } from '../../../shared/contract/person';
import { formatMetres, MISSING } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { useShownRows } from '../../ui/use-shown-rows';
import { describeSignIn, listRoles } from './person-values';

const columns: Column<Person>[] = [
  { key: 'name', head: 'Name', phone: 'title', cell: (person) => person.name },
  { key: 'job', head: 'Job', cell: (person) => jobNames[person.job] },
  { key: 'roles', head: 'Roles', cell: (person) => listRoles(person.roles) || MISSING },
  {
    key: 'email',
    head: 'E-mail',
    className: 'wrap-anywhere',
    cell: (person) => person.email ?? MISSING,
  },
  { key: 'sign-in', head: 'Sign-in', cell: describeSignIn },
  {
    key: 'stature',
    head: 'Stature',
    unit: 'm',
    align: 'end',
    cell: (person) => formatMetres(person.statureM),
  },
  { key: 'monitored', head: 'Dosimeter', cell: (person) => (person.isMonitored ? 'yes' : 'no') },
  { key: 'active', head: 'Works here', cell: (person) => (person.isActive ? 'yes' : 'no longer') },
];

type PeopleTableProps = { people: readonly Person[]; hrefOf: (id: string) => string; isFiltered: boolean };

export function PeopleTable({ people, hrefOf, isFiltered }: PeopleTableProps) {
  const { shown, more } = useShownRows(people, people.length === 1 ? 'person' : 'people');
  return (
    <div>
      <DataTable
        caption="People"
        columns={columns}
        rows={shown}
        rowKey={(person) => person.id}
        rowHref={(person) => hrefOf(person.id)}
        empty={
          <EmptyState title={isFiltered ? 'Nobody fits this sentence.' : 'Nobody is registered yet.'}>
            {isFiltered
              ? 'Widen it above, or add the person.'
              : 'Add everyone who stands in the rooms, with or without a sign-in.'}
          </EmptyState>
        }
      />
      {people.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
