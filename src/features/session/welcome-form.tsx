import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useLinkSchema, type SignInLink, type UseLink } from '../../../shared/contract/session';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { TextField } from '../../ui/text-field';
import { useSpendSignInLink } from './sign-in-links';

type WelcomeFormProps = { token: string; link: SignInLink; onDone: () => void };

/** Chooses a password; the first administrator also names the hospital. */
export function WelcomeForm({ token, link, onDone }: WelcomeFormProps) {
  const spend = useSpendSignInLink();
  const isFirst = link.purpose === 'first-administrator';
  const form = useForm<UseLink>({
    resolver: zodResolver(useLinkSchema),
    defaultValues: {
      token,
      password: '',
      ...(isFirst && { timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone }),
    },
  });
  const { errors } = form.formState;
  return (
    <form
      noValidate
      onSubmit={(event) =>
        void form.handleSubmit((values) =>
          spend.mutate(values, {
            onSuccess: onDone,
            onError: (error) => placeIssues(error, form.setError),
          }),
        )(event)
      }
      className="flex flex-col gap-4"
    >
      <ProblemNote error={spend.error} kept="Your entries are still in the form." />
      {isFirst && (
        <>
          <TextField
            label="Hospital or department"
            autoComplete="organization"
            {...form.register('hospitalName')}
            error={errors.hospitalName?.message}
          />
          <TextField
            label="Time zone"
            hint="Decides days and months, for example Europe/Vienna."
            {...form.register('timeZone')}
            error={errors.timeZone?.message}
          />
          <TextField
            label="Your name"
            autoComplete="name"
            {...form.register('name')}
            error={errors.name?.message}
          />
          <TextField
            label="Your e-mail"
            type="email"
            autoComplete="username"
            {...form.register('email')}
            error={errors.email?.message}
          />
        </>
      )}
      <TextField
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters; a sentence is easier to keep than a riddle."
        {...form.register('password')}
        error={errors.password?.message}
      />
      <Button variant="primary" type="submit" isBusy={spend.isPending} className="self-start px-8">
        {isFirst ? 'Make the first administrator' : 'Choose this password'}
      </Button>
    </form>
  );
}
