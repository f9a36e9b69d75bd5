import type { ReactNode } from 'react';

/** Fields that belong together, in two columns where there is room. */
export const FieldGroup = ({
  legend,
  note,
  children,
}: {
  legend?: string;
  note?: ReactNode;
  children: ReactNode;
}) => (
  <fieldset className="flex min-w-0 flex-col gap-3">
    {legend && <legend className="mb-3 w-full border-b border-rule pb-1 font-semibold">{legend}</legend>}
    {note && <p className="text-sm text-ink-2">{note}</p>}
    <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-6 gap-y-4 sm:grid-cols-2">
      {children}
    </div>
  </fieldset>
);
