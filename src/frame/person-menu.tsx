import { useLocation, useNavigate } from 'react-router-dom';
import type { User } from '../../shared/contract/session';
import { roleNames } from '../../shared/permissions';
import { useSignOut } from '../features/session/mutations';
import { buildSignInPath, paths } from '../paths';
import { Button } from '../ui/button';
import { Chevron } from '../ui/chevron';
import { ProblemNote } from '../ui/problem-note';
import { dropBelow } from './drop-below';
import { ThemeSwitch } from './theme-switch';

/** Who is signed in; theme, change of person at a shared computer, sign out. */
export function PersonMenu({ user }: { user: User }) {
  const signOut = useSignOut();
  const navigate = useNavigate();
  const location = useLocation();
  const leave = (to: string) =>
    signOut.mutate(undefined, { onSuccess: () => void navigate(to, { replace: true }) });
  const here = location.pathname + location.search;

  return (
    <>
      <button
        type="button"
        popoverTarget="person-menu"
        className="ml-auto flex min-h-9 min-w-0 items-center gap-2 text-ink-2 hover:text-ink"
      >
        <span className="truncate">{user.name}</span>
        <Chevron />
      </button>
      <div
        id="person-menu"
        popover="auto"
        onBeforeToggle={dropBelow}
        className="fixed right-2 bottom-auto left-auto m-0 w-72 max-w-[calc(100vw-1rem)] border border-edge bg-surface p-4 text-ink shadow-lg md:right-6"
      >
        <p className="font-semibold break-words">{user.name}</p>
        <p className="text-sm text-ink-2">
          {user.roles.length === 0
            ? 'monitored person'
            : user.roles.map((role) => roleNames[role]).join(', ')}
        </p>
        <div className="my-3 border-y border-rule py-3">
          <ThemeSwitch />
        </div>
        <ProblemNote error={signOut.error} />
        <div className="flex flex-col gap-2">
          <Button onClick={() => leave(buildSignInPath(here))} isBusy={signOut.isPending}>
            Change person, stay here
          </Button>
          <Button onClick={() => leave(paths.signIn)} isBusy={signOut.isPending}>
            Sign out
          </Button>
        </div>
      </div>
    </>
  );
}
