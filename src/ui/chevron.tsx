import { joinClassNames } from '../lib/class-names';

const turns = { down: '', up: 'rotate-180', right: '-rotate-90', left: 'rotate-90' };

/** A drawn arrow head; the type has no such sign in its shipped subset. */
export const Chevron = ({
  className,
  to = 'down',
}: {
  className?: string;
  to?: 'down' | 'up' | 'right' | 'left';
}) => (
  <svg
    viewBox="0 0 10 6"
    width="10"
    height="6"
    aria-hidden="true"
    className={joinClassNames('inline-block flex-none', turns[to], className)}
  >
    <path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.5" />
  </svg>
);
