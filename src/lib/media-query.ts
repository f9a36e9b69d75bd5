import { useCallback, useSyncExternalStore } from 'react';

/** Follows a media query. */
export function useMediaQuery(query: string): boolean {
  const subscribe = useCallback(
    (notify: () => void) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', notify);
      return () => list.removeEventListener('change', notify);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}

/** No movement for people who asked for none, and none while a browser is driven by a program. */
export function usePrefersStill(): boolean {
  return useMediaQuery('(prefers-reduced-motion: reduce)') || navigator.webdriver;
}
