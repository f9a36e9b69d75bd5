import type { ReactNode } from 'react';
import { joinClassNames } from '../lib/class-names';
import { usePageTitle } from '../lib/page-title';

type PageProps = {
  /** Names the tab and, unless `heading` is given, heads the page. */
  title: string;
  /** A filter sentence in place of the printed title. */
  heading?: ReactNode;
  /** Small line above the title: room, time, case number. */
  eyebrow?: ReactNode;
  /** Small line below: counts, what is waiting. */
  lead?: ReactNode;
  /** Buttons at the end of the title row. */
  deeds?: ReactNode;
  /** The margin column: explanations and provenance. Below 1152 px it follows the content. */
  margin?: ReactNode;
  children: ReactNode;
};

/** A page: title row, one wide column, margin column. */
export function Page({ title, heading, eyebrow, lead, deeds, margin, children }: PageProps) {
  usePageTitle(title);
  return (
    <div
      className={joinClassNames(
        'mx-auto grid max-w-[96rem] grid-cols-[minmax(0,1fr)] gap-x-8 gap-y-8 px-4 pt-6 pb-16 md:px-8',
        margin !== undefined && 'margin:grid-cols-[minmax(0,1fr)_16rem] 2xl:grid-cols-[minmax(0,1fr)_18rem]',
      )}
    >
      <div className="flex min-w-0 flex-col gap-6">
        <div className="flex flex-wrap items-start justify-between gap-x-8 gap-y-3">
          <div className="flex min-w-0 grow basis-80 flex-col gap-1">
            {eyebrow && <p className="text-sm text-ink-2">{eyebrow}</p>}
            <h1 className={heading ? 'sr-only' : 'text-2xl font-normal'}>{title}</h1>
            {heading}
            {lead && <div className="text-sm text-ink-2">{lead}</div>}
          </div>
          {deeds && <div className="flex flex-wrap gap-3">{deeds}</div>}
        </div>
        {children}
      </div>
      {margin !== undefined && (
        <aside
          aria-label="Explanations and provenance"
          className="flex min-w-0 flex-col gap-7 border-rule max-margin:border-t max-margin:pt-6 margin:border-l margin:pl-6"
        >
          {margin}
        </aside>
      )}
    </div>
  );
}
