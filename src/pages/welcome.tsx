import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams, useRouteError } from 'react-router-dom';
import { signInLinkQueries } from '../features/session/sign-in-links';
import { WelcomeForm } from '../features/session/welcome-form';
import { DoorPage } from '../frame/door-page';
import { RouteError } from '../frame/route-error';
import { ApiProblem } from '../lib/api-problem';
import { paths } from '../paths';
import { TextLink } from '../ui/text-link';

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

/** A link opens once; whoever comes again is told what to do. */
export function ErrorBoundary() {
  const error = useRouteError();
  if (!(error instanceof ApiProblem) || error.code !== 'link-spent') return <RouteError />;
  return (
    <DoorPage
      title="This link has been used or has expired"
      lead="A one-time link opens once, within 7 days."
    >
      <p>
        If you have chosen your password already, <TextLink to={paths.signIn}>sign in with it</TextLink>.
        Otherwise ask an administrator for a new link. The first administrator’s link is printed anew when the
        server is started again.
      </p>
    </DoorPage>
  );
}
