import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { isScreenLocking } from '../lib/screen-lock';
import { Button } from './button';
import { Dialog } from './dialog';

/** Asks before a change of page or a closed tab takes unsaved entries along. */
export function LeaveGuard({ isGuarding }: { isGuarding: () => boolean }) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      !isScreenLocking() && currentLocation.pathname !== nextLocation.pathname && isGuarding(),
  );
  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => {
      if (isGuarding()) event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [isGuarding]);

  const stay = () => blocker.state === 'blocked' && blocker.reset();
  return (
    <Dialog
      isOpen={blocker.state === 'blocked'}
      onClose={stay}
      title="Leave without saving?"
      deeds={
        <>
          <Button onClick={() => blocker.state === 'blocked' && blocker.proceed()}>
            Leave, drop my entries
          </Button>
          <Button variant="primary" onClick={stay}>
            Stay here
          </Button>
        </>
      }
    >
      <p>What you entered here has not been saved.</p>
    </Dialog>
  );
}
