import type { ReactNode } from 'react';

export type AttentionStrength = 'note' | 'notify' | 'act';

const shapes: Record<AttentionStrength, ReactNode> = {
  note: <circle cx="7" cy="7" r="5" fill="none" strokeWidth="1.6" />,
  notify: (
    <>
      <circle cx="7" cy="7" r="5" fill="none" strokeWidth="1.6" />
      <path d="M7 2a5 5 0 0 1 0 10z" fill="currentColor" stroke="none" />
    </>
  ),
  act: <path d="M7 .8L13.2 7 7 13.2.8 7z" fill="currentColor" stroke="none" />,
};

/** The three strengths of attention: open ring, half-filled ring, filled lozenge; always with the word. */
export const AttentionMark = ({
  strength,
  children,
}: {
  strength: AttentionStrength;
  /** Stands after the word: the reason. */
  children?: ReactNode;
}) => (
  <span className="inline-flex items-baseline gap-1.5 font-semibold text-beacon">
    <svg
      viewBox="0 0 14 14"
      width="12"
      height="12"
      stroke="currentColor"
      aria-hidden="true"
      className="relative top-px flex-none"
    >
      {shapes[strength]}
    </svg>
    <span>
      {strength}
      {children && <>: {children}</>}
    </span>
  </span>
);
