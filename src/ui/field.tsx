import { useId, type ReactNode } from 'react';
import { joinClassNames } from '../lib/class-names';

/** What a control needs from its field: its name, its hint and its error, tied by id. */
export type ControlAttributes = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
};

export type FieldFrameProps = {
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
  /** Says that the field may stay empty; what is not marked must be filled. */
  isOptional?: boolean;
  /** Where a prefilled value comes from, beside the label: "from the file". */
  origin?: ReactNode;
  className?: string;
};

/** Borders and sizes that all controls share; 16 px on a phone, or its browser zooms in. */
export const controlLook =
  'w-full min-h-10 rounded-edge border border-edge bg-surface px-3 py-1.5 text-[1rem] md:text-base text-ink ' +
  'placeholder:text-ink-2 disabled:opacity-60 aria-invalid:border-beacon aria-invalid:border-2 hover:border-ink';

export function Field({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  children,
}: FieldFrameProps & { children: (control: ControlAttributes) => ReactNode }) {
  const id = useId();
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(' ');
  return (
    <div className={joinClassNames('flex min-w-0 flex-col gap-1', className)}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-3">
        <label htmlFor={id} className="text-sm font-semibold">
          {label}
          {isOptional && <span className="font-normal text-ink-2"> (optional)</span>}
        </label>
        {origin && <span className="text-xs text-ink-2">{origin}</span>}
      </div>
      {children({
        id,
        'aria-describedby': described === '' ? undefined : described,
        'aria-invalid': error ? true : undefined,
      })}
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}

export const FieldError = ({ id, children }: { id: string; children: ReactNode }) => (
  <p id={id} className="text-sm font-semibold text-beacon">
    {children}
  </p>
);
