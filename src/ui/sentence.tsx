import type { ReactNode } from 'react';

/**
 * The filter as a sentence that is edited in place. It is the page's heading; a screen reader hears the
 * words and reaches each emphasised part as a select of its own.
 */
export const Sentence = ({ children, label }: { children: ReactNode; label: string }) => (
  <div role="group" aria-label={label} className="max-w-[62rem] text-xl font-light text-ink text-pretty">
    {children}
  </div>
);
