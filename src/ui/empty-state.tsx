import type { ReactNode } from 'react';

/** Nothing is here: why, and what to do next. */
export const EmptyState = ({ title, children }: { title: ReactNode; children?: ReactNode }) => (
  <div className="flex flex-col items-start gap-2 border-y border-rule px-1 py-8">
    <p className="text-lg font-medium">{title}</p>
    {children && <div className="max-w-[38rem] text-ink-2">{children}</div>}
  </div>
);
