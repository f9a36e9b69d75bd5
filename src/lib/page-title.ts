import { useEffect } from 'react';

/** Names the browser's tab and history entry after the page. */
export function usePageTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} · Leeward`;
  }, [title]);
}
