import { useSuspenseQueries } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { idSchema } from '../../shared/contract/common';
import type { Procedure } from '../../shared/contract/procedure';
import { garmentQueries } from '../features/garments/queries';
import { personQueries } from '../features/people/queries';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { describePlace, nameProcedure } from '../features/procedure/procedure-words';
import { procedureQueries } from '../features/procedure/queries';
import { ProcedureRecordForm } from '../features/procedure/record-form';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { paths } from '../paths';
import { Caution } from '../ui/caution';
import { MarginNote } from '../ui/margin-note';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = '' } = useParams();
  return idSchema.safeParse(id).success ? <OpenedRecord key={id} id={id} /> : <NotFound />;
}

function OpenedRecord({ id }: { id: string }) {
  const navigate = useNavigate();
  const [{ data: procedure }, { data: people }, { data: types }, { data: garments }] = useSuspenseQueries({
    queries: [
      procedureQueries.detail(id),
      personQueries.choices(),
      procedureTypeQueries.list(),
      garmentQueries.list(),
    ],
  });
  const isComplete = procedure.recordState === 'complete';
  const finish = (saved: Procedure) => {
    showToast({
      text:
        saved.recordState === 'complete'
          ? 'The record is complete; staff exposure is estimated.'
          : 'The record is saved; it is not complete yet.',
    });
    void navigate(paths.procedure(id));
  };
  return (
    <Page
      title={isComplete ? 'Correct the record' : 'Complete the record'}
      eyebrow={`${nameProcedure(procedure)} · ${describePlace(procedure)}`}
      margin={<Margin />}
    >
      <ProcedureRecordForm
        procedure={procedure}
        choices={{ people, types, garments }}
        backTo={paths.procedure(id)}
        onSaved={finish}
      />
    </Page>
  );
}

const Margin = () => (
  <>
    <MarginNote title="Places">
      <p className="text-sm">
        Usual places are drawn for access from the patient’s right and mirrored for the left. A place by
        coordinates counts from the isocentre in metres: to the patient’s left, toward the head.
      </p>
      <p className="text-sm">Behind the barrier of the control room nothing is counted.</p>
    </MarginNote>
    <MarginNote title="What rests on these answers">
      <Caution of="scatter-interval" />
      <Caution of="garment-condition" values={{ date: 'on the day in the register' }} />
    </MarginNote>
  </>
);
