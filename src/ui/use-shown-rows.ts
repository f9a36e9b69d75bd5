import { useState } from 'react';

const step = 200;

/** The first rows of a long list, and more on demand: ten thousand table rows would freeze a phone. */
export function useShownRows<Row>(rows: readonly Row[], noun: string) {
  const [limit, setLimit] = useState(step);
  const shown = rows.length > limit ? rows.slice(0, limit) : rows;
  return {
    shown,
    more: {
      hasMore: rows.length > limit,
      isBusy: false,
      onMore: () => setLimit((current) => current + step),
      shownText:
        shown.length === rows.length ? `${rows.length} ${noun}` : `${shown.length} of ${rows.length} ${noun}`,
    },
  };
}
