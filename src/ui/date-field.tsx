import type { ComponentProps } from 'react';
import { controlLook, Field, type FieldFrameProps } from './field';

type DateFieldProps = FieldFrameProps & Omit<ComponentProps<'input'>, 'id' | 'className' | 'type'>;

/** A calendar day; its value is ISO (2026-11-30) or the empty string. */
export const DateField = ({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  ...input
}: DateFieldProps) => (
  <Field {...{ label, hint, error, isOptional, origin, className }}>
    {(control) => <input type="date" {...input} {...control} className={controlLook} />}
  </Field>
);
