import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { signInSchema, type SignIn } from '../../../shared/contract/session';
import { Button } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { TextField } from '../../ui/text-field';
import { useSignIn } from './mutations';

const demoAccounts = ['technologist', 'physicist', 'interventionalist', 'committee', 'administrator'];

/** E-mail and password; in the demo the accounts can be picked, the password was printed by the start. */
export function SignInForm({ isDemo, onSignedIn }: { isDemo: boolean; onSignedIn: () => void }) {
  const signIn = useSignIn();
  const form = useForm<SignIn>({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' },
  });
  const { errors } = form.formState;
  const pickAccount = (account: string) => {
    form.setValue('email', `${account}@marrowcreek.example`);
    form.setFocus('password');
  };

  return (
    <form
      noValidate
      onSubmit={(event) =>
        void form.handleSubmit((values) => signIn.mutate(values, { onSuccess: onSignedIn }))(event)
      }
      className="flex flex-col gap-4"
    >
      <ProblemNote error={signIn.error} />
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        {...form.register('email')}
        error={errors.email?.message}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        {...form.register('password')}
        error={errors.password?.message}
      />
      <Button variant="primary" type="submit" isBusy={signIn.isPending} className="self-start px-8">
        Sign in
      </Button>
      {isDemo && (
        <div className="border-t border-rule pt-4 text-sm text-ink-2">
          <p>Demo accounts; their one password was printed when the server started:</p>
          <ul className="mt-1 flex flex-wrap gap-x-4">
            {demoAccounts.map((account) => (
              <li key={account}>
                <button type="button" className="link-line target" onClick={() => pickAccount(account)}>
                  {account}
                </button>
              </li>
            ))}
          </ul>
        </div>
      )}
    </form>
  );
}
