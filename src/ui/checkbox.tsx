import { useId, type ComponentProps, type ReactNode } from 'react';
import { joinClassNames } from '../lib/class-names';
import { FieldError } from './field';

type CheckboxProps = Omit<ComponentProps<'input'>, 'type' | 'id'> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
};

export function Checkbox({ label, hint, error, className, ...input }: CheckboxProps) {
  const id = useId();
  const described = joinClassNames(hint ? `${id}-hint` : null, error ? `${id}-error` : null);
  return (
    <div className={className}>
      <label htmlFor={id} className="flex min-h-7 items-start gap-2.5">
        <input
          type="checkbox"
          {...input}
          id={id}
          aria-describedby={described || undefined}
          aria-invalid={error ? true : undefined}
          className="mt-[0.2rem] size-4.5 flex-none accent-lee"
        />
        <span>{label}</span>
      </label>
      {hint && (
        <p id={`${id}-hint`} className="pl-7 text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}
