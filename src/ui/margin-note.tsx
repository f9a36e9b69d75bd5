import { useId, type ReactNode } from 'react';

/** A headed part of the margin column: provenance, checks, explanations. */
export function MarginNote({ title, children }: { title: ReactNode; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex flex-col gap-2">
      <h2 id={id} className="condensed border-b border-ink pb-1 text-sm font-semibold">
        {title}
      </h2>
      <div className="flex flex-col gap-2">{children}</div>
    </section>
  );
}

type SectionProps = { title: ReactNode; note?: ReactNode; aside?: ReactNode; children: ReactNode };

/** A headed part of the wide column; the note follows the title in small type. */
export function Section({ title, note, aside, children }: SectionProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex min-w-0 flex-col gap-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <h2 id={id} className="text-lg font-semibold">
          {title}
          {note && <span className="ml-2 text-sm font-normal text-ink-2">{note}</span>}
        </h2>
        {aside && <div className="text-sm">{aside}</div>}
      </div>
      {children}
    </section>
  );
}
