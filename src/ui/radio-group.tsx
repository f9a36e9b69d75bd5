import { useId, type ComponentProps, type ReactNode } from 'react';
import { joinClassNames } from '../lib/class-names';
import { FieldError } from './field';

type RadioGroupProps = {
  legend: ReactNode;
  choices: readonly { value: string; label: ReactNode; hint?: ReactNode }[];
  /** Spread onto every radio: `{...register('accessSide')}`, or name, value and onChange of your own. */
  radio: Omit<ComponentProps<'input'>, 'type' | 'id' | 'value' | 'checked'>;
  /** Leave out when a form library keeps the value. */
  value?: string | null;
  hint?: ReactNode;
  error?: string;
  isInline?: boolean;
  className?: string;
};

/** One of a few, all of them in sight. */
export function RadioGroup({
  legend,
  choices,
  radio,
  value,
  hint,
  error,
  isInline,
  className,
}: RadioGroupProps) {
  const id = useId();
  const described = joinClassNames(hint ? `${id}-hint` : null, error ? `${id}-error` : null);
  return (
    <fieldset className={className} aria-describedby={described || undefined}>
      <legend className="mb-1 text-sm font-semibold">{legend}</legend>
      <div className={isInline ? 'flex flex-wrap gap-x-5 gap-y-1' : 'flex flex-col gap-1'}>
        {choices.map((choice) => (
          <label key={choice.value} className="flex min-h-7 items-start gap-2">
            <input
              type="radio"
              {...radio}
              value={choice.value}
              checked={value === undefined ? undefined : value === choice.value}
              className="mt-[0.2rem] size-4.5 flex-none accent-lee"
            />
            <span>
              {choice.label}
              {choice.hint && <span className="block text-sm text-ink-2">{choice.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}
