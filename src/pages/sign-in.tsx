import { useNavigate, useSearchParams } from 'react-router-dom';
import { useSession } from '../features/session/queries';
import { SignInForm } from '../features/session/sign-in-form';
import { DoorPage } from '../frame/door-page';
import { readNextPath } from '../paths';

export function Component() {
  const { hospital } = useSession();
  const [query] = useSearchParams();
  const navigate = useNavigate();
  return (
    <DoorPage
      title="Sign in"
      lead={hospital?.name}
      demoHospitalName={hospital?.isDemo ? hospital.name : null}
    >
      <SignInForm
        isDemo={hospital?.isDemo ?? false}
        onSignedIn={() => void navigate(readNextPath(query.get('next')), { replace: true })}
      />
    </DoorPage>
  );
}
