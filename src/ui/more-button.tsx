import { Button } from './button';

/** The next part of a keyset-paged list; says when the end is reached. */
export const MoreButton = ({
  hasMore,
  isBusy,
  onMore,
  shownText,
}: {
  hasMore: boolean;
  isBusy: boolean;
  onMore: () => void;
  /** "50 of 918 shown". */
  shownText: string;
}) => (
  <div className="flex flex-wrap items-center gap-4 pt-3 text-sm text-ink-2">
    {hasMore && (
      <Button onClick={onMore} isBusy={isBusy} isSmall>
        Show more
      </Button>
    )}
    <p role="status">{shownText}</p>
  </div>
);
