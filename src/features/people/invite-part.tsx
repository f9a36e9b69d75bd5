import type { Person, SavedPerson } from '../../../shared/contract/person';
import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { useInvitePerson } from './mutations';
import { describeSignIn } from './person-values';

type InvitePartProps = { person: Person; onInvited: (saved: SavedPerson) => void };

/** A new one-time link: the first was lost, or the password was forgotten. */
export function InvitePart({ person, onInvited }: InvitePartProps) {
  const invite = useInvitePerson(person.id);
  return (
    <MarginNote title="One-time link">
      <p className="text-sm">Sign-in: {describeSignIn(person)}.</p>
      <p className="text-sm text-ink-2">
        A new link lets its holder choose a new password; links made before end. Entries in the form that are
        not saved are dropped.
      </p>
      <ProblemNote error={invite.error} />
      <Button
        isSmall
        className="self-start"
        isBusy={invite.isPending}
        onClick={() => invite.mutate(undefined, { onSuccess: onInvited })}
      >
        Make a new link
      </Button>
    </MarginNote>
  );
}
