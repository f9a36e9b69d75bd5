import type { ComponentProps, ReactNode } from 'react';
import { controlLook, Field, type FieldFrameProps } from './field';
import { joinClassNames } from '../lib/class-names';

type NumberFieldProps = FieldFrameProps &
  Omit<ComponentProps<'input'>, 'id' | 'className' | 'type'> & {
    /** Stands beside the number and is read out after the label. */
    unit?: ReactNode;
  };

/**
 * A number as text, so that a wheel never changes it and a comma is no error. Read it with
 * `parseDecimal`: `register('weightKg', { setValueAs: parseDecimal })`.
 */
export const NumberField = ({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  unit,
  ...input
}: NumberFieldProps) => (
  <Field {...{ label, hint, error, isOptional, origin, className }}>
    {(control) => (
      <span className="flex items-center gap-2">
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          {...input}
          {...control}
          aria-describedby={joinClassNames(unit ? `${control.id}-unit` : null, control['aria-describedby'])}
          className={joinClassNames(controlLook, 'max-w-32 text-right')}
        />
        {unit && (
          <span id={`${control.id}-unit`} className="whitespace-nowrap text-ink-2">
            {unit}
          </span>
        )}
      </span>
    )}
  </Field>
);
