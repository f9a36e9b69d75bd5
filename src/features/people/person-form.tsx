import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { personInputSchema, type Person, type SavedPerson } from '../../../shared/contract/person';
import { roleNames, roles } from '../../../shared/permissions';
import { parseDecimal } from '../../lib/parse-decimal';
import { Checkbox } from '../../ui/checkbox';
import { FieldError } from '../../ui/field';
import { FieldGroup } from '../../ui/field-group';
import { NumberField } from '../../ui/number-field';
import { RecordForm } from '../../ui/record-form';
import { SelectField } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import { useSavePerson } from './mutations';
import {
  describePerson,
  jobChoices,
  newPerson,
  readCurrentPerson,
  roleHints,
  toPersonInput,
} from './person-values';

type PersonFormProps = {
  /** Null: somebody new. */
  person: Person | null;
  backTo: string;
  onSaved: (saved: SavedPerson) => void;
};

/** A person, and the sign-in and roles that go with the e-mail address. */
export function PersonForm({ person, backTo, onSaved }: PersonFormProps) {
  const form = useForm({
    resolver: zodResolver(personInputSchema),
    defaultValues: person ? toPersonInput(person) : newPerson,
  });
  const { register, control } = form;
  const { errors } = form.formState;
  const hasEmail = Boolean(useWatch({ control, name: 'email' }));
  return (
    <RecordForm
      form={form}
      save={useSavePerson(person?.id ?? null)}
      onSaved={onSaved}
      saveText={person ? 'Save' : 'Add this person'}
      backTo={backTo}
      readCurrent={readCurrentPerson}
      describe={describePerson}
    >
      <FieldGroup>
        <TextField
          label="Name"
          hint="As it should stand in lists: a name or a role code."
          autoComplete="off"
          {...register('name')}
          error={errors.name?.message}
        />
        <SelectField label="Job" choices={jobChoices} {...register('job')} error={errors.job?.message} />
        <NumberField
          label="Stature"
          unit="m"
          isOptional
          hint="Sets how high eyes, collar and waist are in the estimate."
          {...register('statureM', { setValueAs: parseDecimal })}
          error={errors.statureM?.message}
        />
        <div className="flex flex-col gap-2 sm:pt-6">
          <Checkbox label="Wears a dosimeter" {...register('isMonitored')} />
          <Checkbox
            label="Works here"
            hint="Whoever leaves is signed out and no longer offered in forms; the record stays."
            {...register('isActive')}
            error={errors.isActive?.message}
          />
        </div>
      </FieldGroup>
      <FieldGroup
        legend="Sign-in"
        note="Staff without a sign-in need no e-mail. Everyone who signs in sees their own exposure and garments; a role opens more."
      >
        <TextField
          label="E-mail"
          type="email"
          isOptional
          autoComplete="off"
          className="sm:col-span-2"
          {...register('email')}
          error={errors.email?.message}
        />
        <fieldset className="flex flex-col gap-2 sm:col-span-2">
          <legend className="mb-1 text-sm font-semibold">
            Roles <span className="font-normal text-ink-2">(optional)</span>
          </legend>
          {roles.map((role) => (
            <Checkbox
              key={role}
              value={role}
              label={roleNames[role]}
              hint={roleHints[role]}
              {...register('roles')}
            />
          ))}
          {errors.roles?.message && <FieldError id="roles-error">{errors.roles.message}</FieldError>}
          {!hasEmail && <p className="text-sm text-ink-2">A role needs an e-mail address to sign in with.</p>}
        </fieldset>
      </FieldGroup>
    </RecordForm>
  );
}
