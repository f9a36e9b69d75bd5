import { useId } from 'react';
import { get, useController, useFormContext, useFormState, useWatch } from 'react-hook-form';
import { typedQuantityNames, type TypedQuantityName } from '../../../shared/contract/manual-entry';
import { Field, FieldError } from '../../ui/field';
import { FieldGroup } from '../../ui/field-group';
import { QuantitySign } from '../../ui/quantity-sign';
import { RadioGroup } from '../../ui/radio-group';
import { describeTyped, quantityNames } from './conversion-words';
import type { EntryValues } from './entry-values';
import { FigureInputs } from './figure-inputs';

const signs = {
  'reference-air-kerma': <QuantitySign of="referenceAirKerma" />,
  'kerma-area-product': <QuantitySign of="kermaAreaProduct" />,
  'fluoroscopy-time': <QuantitySign of="fluoroscopyTime" />,
  'frame-count': null,
};

function FigureField({ quantity, index }: { quantity: TypedQuantityName; index: 0 | 1 }) {
  const path = `figures.${index}.${quantity}` as const;
  const { register, control } = useFormContext<EntryValues>();
  const figure = useWatch({ control, name: path });
  const hasTwoPlanes = useWatch({ control, name: 'hasTwoPlanes' });
  const { errors } = useFormState({ control, name: path });
  const fault = get(errors, path) as Partial<Record<'text' | 'unit', { message?: string }>> | undefined;
  return (
    <Field
      label={
        <>
          {quantityNames[quantity]} {signs[quantity]}
        </>
      }
      hint={describeTyped({ quantity, ...figure })}
      error={fault?.text?.message ?? fault?.unit?.message}
    >
      {(attributes) => (
        <FigureInputs
          quantity={quantity}
          control={attributes}
          unit={figure.unit}
          number={register(`${path}.text`)}
          select={register(`${path}.unit`)}
          planeName={hasTwoPlanes ? `, plane ${index === 0 ? 'A' : 'B'}` : ''}
        />
      )}
    </Field>
  );
}

const PlaneFigures = ({ index, legend }: { index: 0 | 1; legend: string }) => (
  <FieldGroup legend={legend}>
    {typedQuantityNames.map((quantity) => (
      <FigureField key={quantity} quantity={quantity} index={index} />
    ))}
  </FieldGroup>
);

/** The figures with the unit chosen beside each, and what they are in the units of the lists. */
export function FiguresPart() {
  const { control, formState } = useFormContext<EntryValues>();
  const { field } = useController({ control, name: 'hasTwoPlanes' });
  const none = formState.errors.root?.['figures'];
  const errorId = useId();
  return (
    <>
      <div className="flex flex-col gap-2">
        <RadioGroup
          legend="X-ray planes of the machine"
          isInline
          value={field.value ? 'two' : 'one'}
          choices={[
            { value: 'one', label: 'One plane' },
            { value: 'two', label: 'Planes A and B' },
          ]}
          radio={{
            name: field.name,
            onBlur: field.onBlur,
            onChange: ({ target }) => field.onChange(target.value === 'two'),
          }}
        />
        <p className="text-sm text-ink-2">
          Type what the screen shows, in its own units. A field left empty stays unknown; it never counts as
          zero.
        </p>
        {none && <FieldError id={errorId}>{none.message}</FieldError>}
      </div>
      <PlaneFigures index={0} legend={field.value ? 'Figures of plane A' : 'What the screen showed'} />
      {field.value && <PlaneFigures index={1} legend="Figures of plane B" />}
    </>
  );
}
