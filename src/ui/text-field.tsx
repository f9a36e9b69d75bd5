import type { ComponentProps } from 'react';
import { controlLook, Field, type FieldFrameProps } from './field';

type TextFieldProps = FieldFrameProps & Omit<ComponentProps<'input'>, 'id' | 'className'>;

/** One line of text; give `type` for e-mail, password, search. */
export const TextField = ({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  ...input
}: TextFieldProps) => (
  <Field {...{ label, hint, error, isOptional, origin, className }}>
    {(control) => <input type="text" {...input} {...control} className={controlLook} />}
  </Field>
);

type TextAreaProps = FieldFrameProps & Omit<ComponentProps<'textarea'>, 'id' | 'className'>;

/** Several lines of text. */
export const TextArea = ({ label, hint, error, isOptional, origin, className, ...area }: TextAreaProps) => (
  <Field {...{ label, hint, error, isOptional, origin, className }}>
    {(control) => <textarea rows={4} {...area} {...control} className={controlLook} />}
  </Field>
);
