import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { signInLinkQueries } from '../features/session/sign-in-links';
import { WelcomeForm } from '../features/session/welcome-form';
import { DoorPage } from '../frame/door-page';
import { paths } from '../paths';

/** Where a one-time link leads. */
export function Component() {
  const { token = '' } = useParams();
  const { data: link } = useSuspenseQuery(signInLinkQueries.one(token));
  const navigate = useNavigate();
  const isFirst = link.purpose === 'first-administrator';
  return (
    <DoorPage
      title={isFirst ? 'Make the first administrator' : `Welcome, ${link.name ?? 'colleague'}`}
      lead={
        isFirst
          ? 'People, rooms and machines can be added afterwards.'
          : `Choose a password for ${link.email ?? 'your account'}.`
      }
    >
      <WelcomeForm token={token} link={link} onDone={() => void navigate(paths.home, { replace: true })} />
    </DoorPage>
  );
}
