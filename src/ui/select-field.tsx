import type { ComponentProps } from 'react';
import { joinClassNames } from '../lib/class-names';
import { Chevron } from './chevron';
import { controlLook, Field, type FieldFrameProps } from './field';

export type Choice = { value: string; label: string; isDisabled?: boolean };

type SelectFieldProps = FieldFrameProps &
  Omit<ComponentProps<'select'>, 'id' | 'className' | 'children'> & {
    choices: readonly Choice[];
    /** Shown for the empty value; without it there is no empty choice. */
    emptyLabel?: string;
  };

/** One of a few. For long lists of people take the combobox field. */
export const SelectField = ({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  choices,
  emptyLabel,
  ...select
}: SelectFieldProps) => (
  <Field {...{ label, hint, error, isOptional, origin, className }}>
    {(control) => (
      <span className="relative">
        <select {...select} {...control} className={joinClassNames(controlLook, 'appearance-none pr-8')}>
          {emptyLabel !== undefined && <option value="">{emptyLabel}</option>}
          {choices.map(({ value, label: text, isDisabled }) => (
            <option key={value} value={value} disabled={isDisabled}>
              {text}
            </option>
          ))}
        </select>
        <Chevron className="pointer-events-none absolute right-3 top-1/2 -translate-y-1/2 text-ink-2" />
      </span>
    )}
  </Field>
);
