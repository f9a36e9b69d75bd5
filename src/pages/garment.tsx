import { useSuspenseQueries } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { jobNames } from '../../shared/contract/person';
import { GarmentForm } from '../features/garments/garment-form';
import { garmentQueries } from '../features/garments/queries';
import { personQueries } from '../features/people/queries';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { newId, paths } from '../paths';
import { Caution } from '../ui/caution';
import { MarginNote } from '../ui/margin-note';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = newId } = useParams();
  const navigate = useNavigate();
  const [{ data: garments }, { data: people }] = useSuspenseQueries({
    queries: [garmentQueries.list(), personQueries.choices()],
  });
  const garment = garments.find((one) => one.id === id) ?? null;
  if (id !== newId && !garment) return <NotFound />;
  const choices = people
    .filter((person) => person.isActive || person.id === garment?.owner?.id)
    .map((person) => ({ value: person.id, label: person.name, detail: jobNames[person.job] }));
  return (
    <Page
      title={garment ? `Garment ${garment.code}` : 'Add a garment'}
      margin={
        garment ? (
          <MarginNote title="Where it counts">
            <Caution of="garment-condition" values={{ date: garment.lastInspectedOn ?? 'on no known day' }} />
          </MarginNote>
        ) : undefined
      }
    >
      <GarmentForm
        key={id}
        garment={garment}
        people={choices}
        backTo={paths.garments}
        onSaved={(saved) => {
          showToast({ text: `Garment ${saved.code} saved.` });
          void navigate(paths.garments);
        }}
      />
    </Page>
  );
}
