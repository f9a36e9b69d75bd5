import type { ReactNode } from 'react';

/** Text for screen readers only. */
export const VisuallyHidden = ({ children }: { children: ReactNode }) => (
  <span className="sr-only">{children}</span>
);
