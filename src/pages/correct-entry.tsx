import { useSuspenseQueries } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { idSchema } from '../../shared/contract/common';
import { can } from '../../shared/permissions';
import { EntryForm } from '../features/manual-entry/entry-form';
import { EntryHelp } from '../features/manual-entry/entry-help';
import { toEntryValues } from '../features/manual-entry/entry-values';
import { manualEntryQueries } from '../features/manual-entry/queries';
import { useSendCorrection } from '../features/manual-entry/use-send-entry';
import { describePlace, nameProcedure } from '../features/procedure/procedure-words';
import { procedureQueries } from '../features/procedure/queries';
import { useUser } from '../features/session/queries';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { paths } from '../paths';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = '', entryId = '' } = useParams();
  const user = useUser();
  const isOpen = can(user, 'procedure.enter-by-hand') && idSchema.safeParse(id).success;
  return isOpen ? <CorrectPage key={entryId} id={id} entryId={entryId} /> : <NotFound />;
}

function CorrectPage({ id, entryId }: { id: string; entryId: string }) {
  const navigate = useNavigate();
  const [{ data: procedure }, { data: machines }, { data: entries }] = useSuspenseQueries({
    queries: [procedureQueries.detail(id), manualEntryQueries.machines(), manualEntryQueries.ofProcedure(id)],
  });
  const send = useSendCorrection(entryId, procedure.record.version);
  const entry = entries.find((one) => one.id === entryId);
  if (!entry) return <NotFound />;
  const finish = () => {
    showToast({ text: 'The correction is stored; the earlier entry stays readable.' });
    void navigate(paths.procedure(id));
  };
  return (
    <Page
      title="Correct what was entered by hand"
      eyebrow={`${nameProcedure(procedure)} · ${describePlace(procedure)}`}
      margin={<EntryHelp />}
    >
      <EntryForm
        kind="correction"
        draftName={entryId}
        opened={toEntryValues(entry)}
        choices={{ machines, rooms: [], types: [] }}
        send={send}
        backTo={paths.procedure(id)}
        onEntered={finish}
      />
    </Page>
  );
}
