import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { TypeForm } from '../features/procedure-types/type-form';
import { AdminPage } from '../frame/admin-page';
import { NotFound } from '../frame/not-found';
import { newId, paths } from '../paths';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = newId } = useParams();
  const navigate = useNavigate();
  const { data: types } = useSuspenseQuery(procedureTypeQueries.list());
  const type = types.find((one) => one.id === id) ?? null;
  if (id !== newId && !type) return <NotFound />;
  return (
    <AdminPage title={type?.name ?? 'Add a procedure type'}>
      <TypeForm
        key={id}
        type={type}
        backTo={paths.procedureTypes}
        onSaved={(saved) => {
          showToast({ text: `${saved.name} saved.` });
          void navigate(paths.procedureTypes);
        }}
      />
    </AdminPage>
  );
}
