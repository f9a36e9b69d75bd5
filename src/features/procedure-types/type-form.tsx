import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { ProcedureType } from '../../../shared/contract/procedure-type';
import { parseDecimal } from '../../lib/parse-decimal';
import { Checkbox } from '../../ui/checkbox';
import { FieldGroup } from '../../ui/field-group';
import { NumberField } from '../../ui/number-field';
import { RecordForm } from '../../ui/record-form';
import { SelectField } from '../../ui/select-field';
import { TextArea, TextField } from '../../ui/text-field';
import { useSaveProcedureType } from './mutations';
import {
  describeType,
  newProcedureType,
  procedureTypeFormSchema,
  readCurrentType,
  regionChoices,
  toProcedureTypeValues,
} from './type-values';

type TypeFormProps = { type: ProcedureType | null; backTo: string; onSaved: (type: ProcedureType) => void };

export function TypeForm({ type, backTo, onSaved }: TypeFormProps) {
  const form = useForm({
    resolver: zodResolver(procedureTypeFormSchema),
    defaultValues: type ? toProcedureTypeValues(type) : newProcedureType,
  });
  const { register } = form;
  const { errors } = form.formState;
  return (
    <RecordForm
      form={form}
      save={useSaveProcedureType(type?.id ?? null)}
      onSaved={onSaved}
      saveText={type ? 'Save' : 'Add this procedure type'}
      backTo={backTo}
      readCurrent={readCurrentType}
      describe={describeType}
    >
      <FieldGroup>
        <TextField
          label="Code"
          hint="Short; stands where there is little room."
          autoComplete="off"
          {...register('key')}
          error={errors.key?.message}
        />
        <TextField label="Name" autoComplete="off" {...register('name')} error={errors.name?.message} />
        <SelectField
          label="Body region"
          choices={regionChoices}
          {...register('bodyRegion')}
          error={errors.bodyRegion?.message}
        />
        <NumberField
          label="Typical tube voltage"
          unit="kV"
          isOptional
          {...register('typicalKvp', { setValueAs: parseDecimal })}
          error={errors.typicalKvp?.message}
        />
        <TextArea
          label="Recognised by"
          isOptional
          hint="One word or phrase a line. A report whose study description or protocol holds one of them is offered this type; a person confirms it."
          className="sm:col-span-2"
          {...register('recognisedBy')}
          error={errors.recognisedBy?.message}
        />
        <Checkbox
          label="In use"
          hint="A type that is no longer used keeps its procedures and is no longer offered."
          className="sm:col-span-2"
          {...register('isActive')}
        />
      </FieldGroup>
    </RecordForm>
  );
}
