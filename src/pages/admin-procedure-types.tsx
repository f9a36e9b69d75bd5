import { useSuspenseQuery } from '@tanstack/react-query';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { TypesTable } from '../features/procedure-types/types-table';
import { AdminPage } from '../frame/admin-page';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';

export function Component() {
  const { data: types } = useSuspenseQuery(procedureTypeQueries.list());
  return (
    <AdminPage
      title="Procedure types"
      deeds={
        <ButtonLink variant="primary" to={paths.procedureType(newId)}>
          Add a procedure type
        </ButtonLink>
      }
    >
      <TypesTable types={types} hrefOf={paths.procedureType} />
    </AdminPage>
  );
}
