import type { ReactNode } from 'react';

/** Name and value, line by line, with hairlines. */
export const DefinitionList = ({ children }: { children: ReactNode }) => (
  <dl className="border-t border-rule">{children}</dl>
);

type DefinitionRowProps = { name: ReactNode; children: ReactNode; note?: ReactNode };

export const DefinitionRow = ({ name, children, note }: DefinitionRowProps) => (
  <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-1.5">
    <dt className="text-ink-2">{name}</dt>
    <dd className="ml-auto text-right">
      {children}
      {note && <span className="block text-sm text-ink-2">{note}</span>}
    </dd>
  </div>
);
