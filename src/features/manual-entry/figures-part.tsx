import { useId } from 'react';
import { get, useFormContext, useFormState, useWatch } from 'react-hook-form';
import { typedQuantityNames, type TypedQuantityName } from '../../../shared/contract/manual-entry';
import { Field, FieldError } from '../../ui/field';
import { FieldGroup } from '../../ui/field-group';
import { QuantitySign } from '../../ui/quantity-sign';
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

type PlaneFiguresProps = { index: 0 | 1; legend: string; note?: string };

const PlaneFigures = ({ index, legend, note }: PlaneFiguresProps) => (
  <FieldGroup legend={legend} note={note}>
    {typedQuantityNames.map((quantity) => (
      <FigureField key={quantity} quantity={quantity} index={index} />
    ))}
  </FieldGroup>
);

/** The figures with the unit chosen beside each, and what they are in the units of the lists. */
export function FiguresPart() {
  const { control, formState } = useFormContext<EntryValues>();
  const hasTwoPlanes = useWatch({ control, name: 'hasTwoPlanes' });
  const none = formState.errors.root?.['figures'];
  const errorId = useId();
  return (
    <>
      <PlaneFigures
        index={0}
        legend={hasTwoPlanes ? 'What the screen showed for plane A' : 'What the screen showed'}
        note="Type it in the screen’s own units. A field left empty stays unknown; it never counts as zero."
      />
      {none && <FieldError id={errorId}>{none.message}</FieldError>}
      {hasTwoPlanes && <PlaneFigures index={1} legend="What the screen showed for plane B" />}
    </>
  );
}
