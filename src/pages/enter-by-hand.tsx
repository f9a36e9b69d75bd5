import { useSuspenseQueries, useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { idSchema } from '../../shared/contract/common';
import type { Entered } from '../../shared/contract/manual-entry';
import type { Procedure } from '../../shared/contract/procedure';
import { can } from '../../shared/permissions';
import { EntryForm } from '../features/manual-entry/entry-form';
import { EntryHelp } from '../features/manual-entry/entry-help';
import { emptyEntry, unlistedMachine } from '../features/manual-entry/entry-values';
import { manualEntryQueries } from '../features/manual-entry/queries';
import { useSendNew } from '../features/manual-entry/use-send-entry';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { describePlace, nameProcedure } from '../features/procedure/procedure-words';
import { procedureQueries } from '../features/procedure/queries';
import { roomQueries } from '../features/rooms/queries';
import { useUser } from '../features/session/queries';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { paths } from '../paths';
import { showToast } from '../ui/toast-store';

/** With an id in the address: figures for a procedure that has none. */
export function Component() {
  const { id } = useParams();
  const user = useUser();
  if (!can(user, 'procedure.enter-by-hand')) return <NotFound />;
  if (id === undefined) return <EnterPage procedure={null} />;
  return idSchema.safeParse(id).success ? <EnterForProcedure key={id} id={id} /> : <NotFound />;
}

function EnterForProcedure({ id }: { id: string }) {
  const { data: procedure } = useSuspenseQuery(procedureQueries.detail(id));
  return <EnterPage procedure={procedure} />;
}

function EnterPage({ procedure }: { procedure: Procedure | null }) {
  const navigate = useNavigate();
  const [{ data: machines }, { data: rooms }, { data: types }] = useSuspenseQueries({
    queries: [manualEntryQueries.machines(), roomQueries.list(), procedureTypeQueries.list()],
  });
  const finish = ({ procedureId }: Entered) => {
    showToast({ text: 'The entry is stored. The record still needs the people who were there.' });
    void navigate(paths.procedure(procedureId));
  };
  return (
    <Page
      title="Enter by hand"
      eyebrow={
        procedure
          ? `${nameProcedure(procedure)} · ${describePlace(procedure)}`
          : 'A procedure whose machine sent no dose report'
      }
      margin={<EntryHelp />}
    >
      <EntryForm
        kind={procedure ? 'attached' : 'new'}
        draftName={procedure?.id ?? 'new'}
        opened={
          procedure
            ? emptyEntry({
                equipmentId: procedure.planes[0]?.equipmentId ?? unlistedMachine,
                localStartedAt: procedure.startedAt.slice(0, 16),
              })
            : emptyEntry()
        }
        choices={{
          machines,
          rooms: rooms
            .filter(({ isActive }) => isActive)
            .map(({ id, code, name }) => ({ value: id, label: `${code}, ${name}` })),
          types: types.filter(({ isActive }) => isActive).map(({ id, name }) => ({ value: id, label: name })),
        }}
        send={useSendNew(procedure?.id ?? null)}
        backTo={procedure ? paths.procedure(procedure.id) : paths.procedures}
        onEntered={finish}
      />
    </Page>
  );
}
