import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import type { Person, SavedPerson } from '../../shared/contract/person';
import { InvitationPanel } from '../features/people/invitation-panel';
import { InvitePart } from '../features/people/invite-part';
import { PersonForm } from '../features/people/person-form';
import { personQueries } from '../features/people/queries';
import { AdminPage } from '../frame/admin-page';
import { NotFound } from '../frame/not-found';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = newId } = useParams();
  const { data: people } = useSuspenseQuery(personQueries.list());
  const person = people.find((one) => one.id === id) ?? null;
  // A new key: another person's page never keeps this one's entries.
  if (id !== newId && !person) return <NotFound />;
  return <PersonPage key={id} person={person} />;
}

function PersonPage({ person }: { person: Person | null }) {
  const navigate = useNavigate();
  const [invited, setInvited] = useState<SavedPerson | null>(null);
  const finish = (saved: SavedPerson) => {
    if (saved.invitationUrl) return setInvited(saved);
    showToast({ text: `${saved.person.name} saved.` });
    void navigate(paths.people);
  };
  const title = person?.name ?? 'Add a person';
  if (invited?.invitationUrl)
    return (
      <AdminPage title={`${invited.person.name} is invited`}>
        <InvitationPanel
          name={invited.person.name}
          email={invited.person.email}
          url={invited.invitationUrl}
        />
        <ButtonLink to={paths.people} className="self-start">
          Back to the people
        </ButtonLink>
      </AdminPage>
    );
  return (
    <AdminPage
      title={title}
      margin={
        person?.email && person.isActive ? <InvitePart person={person} onInvited={setInvited} /> : undefined
      }
    >
      <PersonForm person={person} backTo={paths.people} onSaved={finish} />
    </AdminPage>
  );
}
