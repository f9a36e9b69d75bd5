import { useSuspenseQuery } from '@tanstack/react-query';
import { can, scopeOf } from '../../shared/permissions';
import { findGarments, garmentFilterSchema } from '../features/garments/garment-filter';
import { GarmentSentence } from '../features/garments/garment-sentence';
import { GarmentsTable } from '../features/garments/garments-table';
import { garmentQueries } from '../features/garments/queries';
import { useUser } from '../features/session/queries';
import { Page } from '../frame/page';
import { useUrlFilter } from '../lib/url-filter';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';
import { EmptyState } from '../ui/empty-state';

export function Component() {
  const user = useUser();
  const { data: garments } = useSuspenseQuery(garmentQueries.list());
  const [filter, changeFilter] = useUrlFilter(garmentFilterSchema);
  const isEditor = can(user, 'garment.edit');
  const scope = scopeOf(user, 'garment.list');
  const inService = garments.filter((garment) => garment.state === 'in-service').length;
  const overdue = garments.filter((garment) => garment.isOverdue).length;
  return (
    <Page
      title="Garments"
      heading={
        <GarmentSentence
          start={scope === 'own' ? 'My garments' : 'Garments and screens'}
          filter={filter}
          onChange={changeFilter}
        />
      }
      lead={`${garments.length} registered, ${inService} in service, ${overdue} overdue for inspection`}
      deeds={
        isEditor && (
          <ButtonLink variant="primary" to={paths.garment(newId)}>
            Add a garment
          </ButtonLink>
        )
      }
    >
      <GarmentsTable
        garments={findGarments(garments, filter)}
        hrefOf={isEditor ? paths.garment : null}
        hasOwners={scope === 'all'}
        empty={<NoGarments hasAny={garments.length > 0} isEditor={isEditor} />}
      />
    </Page>
  );
}

function NoGarments({ hasAny, isEditor }: { hasAny: boolean; isEditor: boolean }) {
  if (hasAny) return <EmptyState title="No garment fits this sentence.">Widen it above.</EmptyState>;
  return isEditor ? (
    <EmptyState title="No garment is registered yet.">
      Add aprons, collars, glasses and screens by the codes written on them.
    </EmptyState>
  ) : (
    <EmptyState title="No garment is registered in your name.">
      If you wear one, tell a technologist or the physicist its code.
    </EmptyState>
  );
}
